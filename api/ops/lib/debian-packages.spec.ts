import { describe, expect, it } from 'vitest';
import { CHROMIUM, installDebianPackages, MARIADB } from './debian-packages.mjs';

const step = <T>(_label: string, work: () => Promise<T>) => work();

interface Machine {
  has?: string[];
  isRoot?: boolean;
  maySudo?: boolean;
  /** Exit codes of the commands, in order; 0 once they are used up. */
  codes?: number[];
}

/** A machine with these programs and rights that writes down what it is told to run. */
function machine({ has = ['apt-get'], isRoot = false, maySudo = false, codes = [] }: Machine) {
  const told: string[] = [];
  const left = [...codes];
  const run = (program: string, args: readonly string[]) => {
    told.push([program, ...args].join(' '));
    return Promise.resolve({ code: left.shift() ?? 0, output: 'E: no such thing' });
  };
  const findProgram = (name: string) => (has.includes(name) ? `/usr/bin/${name}` : undefined);
  return { told, system: { findProgram, run, isRoot, maySudo: () => maySudo } };
}

describe("Debian's packages", () => {
  it('are left alone where the programs are there', async () => {
    const { told, system } = machine({ has: ['apt-get', 'mariadbd', 'chromium'], isRoot: true });
    await installDebianPackages([MARIADB, CHROMIUM], step, system);
    expect(told).toEqual([]);
  });

  it('are installed by root, those that are missing', async () => {
    const { told, system } = machine({ has: ['apt-get', 'chromium'], isRoot: true });
    await installDebianPackages([MARIADB, CHROMIUM], step, system);
    expect(told).toHaveLength(1);
    expect(told[0]).toMatch(/^env .*apt-get .* install -y --no-install-recommends mariadb-server$/);
  });

  it('are installed through a sudo that asks for no password', async () => {
    const { told, system } = machine({ maySudo: true });
    await installDebianPackages([MARIADB], step, system);
    expect(told[0]).toMatch(/^sudo -n env DEBIAN_FRONTEND=noninteractive apt-get .*mariadb-server$/);
  });

  it('are tried again after the lists were renewed', async () => {
    const { told, system } = machine({ isRoot: true, codes: [100] });
    await installDebianPackages([MARIADB], step, system);
    expect(told.map((line) => /(install|update)/.exec(line)?.[0])).toEqual(['install', 'update', 'install']);
  });

  it('come with the one command to run where this account may not install them', async () => {
    const { told, system } = machine({});
    await expect(installDebianPackages([MARIADB, CHROMIUM], step, system)).rejects.toThrow(
      'Missing on this machine: mariadb-server and chromium. This account may not install packages. Run: sudo apt-get install mariadb-server chromium',
    );
    expect(told).toEqual([]);
  });

  it('are asked for in a sentence where installing fails twice', async () => {
    const { system } = machine({ isRoot: true, codes: [100, 0, 100] });
    await expect(installDebianPackages([MARIADB], step, system)).rejects.toMatchObject({
      message: 'mariadb-server could not be installed. Try: sudo apt-get install mariadb-server',
      detail: 'E: no such thing',
    });
  });
});
