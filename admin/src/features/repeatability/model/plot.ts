/** Where things lie in a plot of difference against mean; plain geometry in the plot's own units. */
import type { RepeatabilityPoint } from '@ellwand/shared/records/repeatability';

export const PLOT = { width: 400, height: 250, left: 52, right: 22, top: 12, bottom: 50 } as const;

export interface Scale {
  readonly from: number;
  readonly to: number;
  readonly ticks: readonly number[];
  readonly at: (value: number) => number;
}

export interface Plot {
  readonly x: Scale;
  readonly y: Scale;
  readonly dots: readonly { readonly x: number; readonly y: number }[];
}

type Plotted = Pick<RepeatabilityPoint, 'pairs' | 'limitsMm'>;

/** Nothing where there are no pairs. Nought is always in sight, and so are the limits. */
export function plotOf({ pairs, limitsMm }: Plotted): Plot | undefined {
  if (pairs.length === 0) return undefined;
  const means = pairs.map(({ meanMm }) => meanMm);
  const limits = limitsMm ? [limitsMm.lower, limitsMm.upper] : [];
  const differences = [0, ...pairs.map(({ differenceMm }) => differenceMm), ...limits];
  const x = scale(means, 5, [PLOT.left, PLOT.width - PLOT.right], 1);
  const y = scale(differences, 5, [PLOT.height - PLOT.bottom, PLOT.top], 1);
  const dots = pairs.map(({ meanMm, differenceMm }) => ({ x: x.at(meanMm), y: y.at(differenceMm) }));
  return { x, y, dots };
}

function scale(
  values: readonly number[],
  wanted: number,
  [start, end]: readonly [number, number],
  leastStep: number,
): Scale {
  const [least, most] = [Math.min(...values), Math.max(...values)];
  const step = Math.max(niceStep((most - least) / wanted), leastStep);
  // A little air, so that no dot lies on the frame.
  const from = Math.floor((least - step * 0.25) / step) * step;
  const to = Math.ceil((most + step * 0.25) / step) * step;
  const count = Math.round((to - from) / step);
  return {
    from,
    to,
    ticks: Array.from({ length: count + 1 }, (_, index) => from + index * step),
    at: (value) => start + ((value - from) / (to - from)) * (end - start),
  };
}

/** 1, 2 or 5 times a power of ten, the least that is not below. */
export function niceStep(raw: number): number {
  if (!(raw > 0)) return 1;
  const power = 10 ** Math.floor(Math.log10(raw));
  const factor = [1, 2, 5, 10].find((candidate) => candidate * power >= raw * 0.999) ?? 10;
  return factor * power;
}
