import type { Layer, View } from '../diagram/model.js';

/** A kind's front in few lines, in millimetres: small, and at one scale with all the others. */
export const silhouette = (...layers: readonly Layer[]): View => ({
  name: 'front',
  caption: '',
  anchors: {},
  layers,
});

const OUTLINES: ReadonlySet<Layer['role']> = new Set(['cloth', 'lining', 'piece', 'piece-lining']);

/**
 * A diagram's view without its seams and folds, which would run together when small, but for the few lines
 * added here.
 */
export const outlinesOf = (view: View, ...added: readonly Layer[]): View => ({
  ...view,
  layers: [...view.layers.filter((layer) => OUTLINES.has(layer.role)), ...added],
});
