import type { Weight } from './faces';

/** A way of setting text: weight, size in points, colour. The colours are the look's, for paper. */
export interface Style {
  readonly weight: Weight;
  readonly size: number;
  readonly colour: string;
  /** Between lines, beyond the typeface's own. */
  readonly lead: number;
}

export const ink = '#17212B';
export const inkSoft = '#414D58';
export const madder = '#A12830';
export const rule = '#76817A';
export const hair = '#D3D9D3';
export const well = '#ECEFEB';
export const madderTint = '#FBE9E8';

const style = (weight: Weight, size: number, colour = ink, lead = 0): Style => ({
  weight,
  size,
  colour,
  lead,
});

export const styles = {
  title: style('title', 24),
  lead: style('sans', 11),
  heading: style('title', 15),
  strong: style('sans-semibold', 9.5),
  body: style('sans', 9.5, ink, 1),
  small: style('sans', 8, inkSoft, 0.5),
  label: style('sans-semibold', 8, inkSoft),
  figure: style('sans-semibold', 10.5),
  letter: style('sans-semibold', 9, madder),
  warning: style('sans-semibold', 9.5, madder),
  foot: style('sans', 7.5, inkSoft),
} as const;
