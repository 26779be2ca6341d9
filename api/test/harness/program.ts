import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { resolve } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

const root = resolve(__dirname, '../..');

/** One of the API's programs as a process of its own. */
export class Program {
  private said = '';

  private constructor(readonly child: ChildProcess) {
    child.stdout?.on('data', (text: Buffer) => (this.said += text.toString()));
    child.stderr?.on('data', (text: Buffer) => (this.said += text.toString()));
  }

  /** @param script below api/src */
  static run(script: string, variables: NodeJS.ProcessEnv): Program {
    const flags = ['--conditions=source', resolve(__dirname, 'run-typescript.mjs')];
    const env = { PATH: process.env.PATH, NODE_ENV: 'production', ...variables };
    return new Program(spawn(process.execPath, [...flags, resolve(root, 'src', script)], { cwd: root, env }));
  }

  /** Everything printed so far, faults too. */
  get output(): string {
    return this.said;
  }

  /** @returns exit code; null where a signal ended it */
  async ended(): Promise<number | null> {
    if (this.child.exitCode !== null) return this.child.exitCode;
    if (this.child.signalCode !== null) return null;
    const [code] = (await once(this.child, 'close')) as [number | null];
    return code;
  }

  /** @throws Error with what was printed, where it does not come to that within 20 s */
  async until(happened: () => boolean | Promise<boolean>): Promise<void> {
    const deadline = Date.now() + 20_000;
    while (!(await happened())) {
      if (Date.now() > deadline || this.child.exitCode !== null) {
        throw new Error(`It did not come to that; it said:\n${this.said}`);
      }
      await wait(50);
    }
  }

  kill(): void {
    this.child.kill('SIGKILL');
  }
}
