import fs from 'node:fs';

/** The API's process of the house in this data folder. */
function apiProcess(dataFolder: string): number | undefined {
  const processes = fs.readdirSync('/proc').filter((name) => /^\d+$/.test(name));
  const found = processes.find((pid) => {
    const command = readQuietly(`/proc/${pid}/cmdline`);
    const [program = ''] = command.split('\0');
    return (
      program.endsWith('node') &&
      command.includes('api/dist/main.js') &&
      readQuietly(`/proc/${pid}/environ`).includes(`ELLWAND_DATA=${dataFolder}\0`)
    );
  });
  return found === undefined ? undefined : Number(found);
}

function readQuietly(path: string): string {
  try {
    return fs.readFileSync(path, 'utf8');
  } catch {
    return '';
  }
}

/** Ends the API as a power cut would: at once, whatever it is doing. The house starts another. */
export function killApi(dataFolder: string): Promise<void> {
  const pid = apiProcess(dataFolder);
  if (pid !== undefined) process.kill(pid, 'SIGKILL');
  return Promise.resolve();
}
