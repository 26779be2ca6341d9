import { killApi } from './api-process.js';
import type { BreakingProxy } from './breaking-proxy.js';
import type { Entry } from './ledger.js';
import { points, type Tablet } from './table.js';

/** Where a tab may be killed: between two keys, after Enter, or not at all. */
type Blow = 'typed' | 'entered' | 'none';

interface Trial {
  readonly tablet: Tablet;
  readonly proxy: BreakingProxy;
  readonly dataFolder: string;
  /** Everything typed so far, in order. */
  readonly typed: Entry[];
}

/** A plain linear congruential generator (Numerical Recipes): the same drill each time. */
export function dice(seed: number): (sides: number) => number {
  let state = seed >>> 0;
  return (sides) => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return Math.floor((state / 2 ** 32) * sides);
  };
}

const scenes = ['no-network', 'no-network', 'lost-answer', 'api-killed', 'fair'] as const;
const blows: readonly Blow[] = ['typed', 'entered', 'none'];

/** One round: a few figures typed in bad weather, a tab killed, the network back, everything sent. */
export async function playRound(trial: Trial, roll: (sides: number) => number): Promise<string> {
  const { tablet, proxy, dataFolder } = trial;
  const scene = scenes[roll(scenes.length)]!;
  if (scene === 'no-network') proxy.turn('down');
  const times = 1 + roll(3);
  for (let time = 0; time < times; time++) {
    const entry = { point: points[roll(points.length)]!, figure: String(10_000 + trial.typed.length) };
    const blow = blows[roll(blows.length)]!;
    if (scene === 'lost-answer') proxy.weather = 'lose-answer';
    await keyIn(trial, entry, blow, async () => {
      if (scene === 'api-killed' && time === 0) await killApi(dataFolder);
    });
    if (scene === 'lost-answer') proxy.turn('through');
  }
  proxy.turn('through');
  await tablet.allSent();
  return scene;
}

/** Types a figure and commits it, whatever happens in between; what was only typed is found again and committed. */
async function keyIn(
  { tablet, proxy, typed }: Trial,
  entry: Entry,
  blow: Blow,
  meanwhile: () => Promise<void>,
): Promise<void> {
  typed.push(entry);
  await tablet.type(entry);
  if (blow === 'typed') {
    await revive(tablet, proxy);
    await tablet.comesBack(entry);
  }
  const committing = tablet.enter(entry.point);
  await meanwhile();
  await committing.catch(() => undefined);
  if (blow !== 'entered') return;
  await revive(tablet, proxy);
  // Killed so soon after Enter, the figure may still have been a draft: it must then come back in its box, as it
  // does where it was committed. Entered once more, what was committed stays as it is.
  if (await tablet.comesBack(entry)) await tablet.enter(entry.point);
}

/** A killed tab is opened again; where answers are being lost, pages must at least arrive. */
async function revive(tablet: Tablet, proxy: BreakingProxy): Promise<void> {
  await tablet.kill();
  if (proxy.weather === 'lose-answer') proxy.turn('through');
  await tablet.openSheet();
}
