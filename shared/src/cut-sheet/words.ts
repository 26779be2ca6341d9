/**
 * The words of a cut sheet: what a maker needs to know of a part beyond its girths. Ids are kept, labels are shown.
 * Without a schema, so that a page which only shows a cut sheet stays small.
 */

/** Where the widths of the panels are read, from the top down. */
export const panelLevels = ['bust', 'waist', 'hip', 'hem'] as const;
export type PanelLevel = (typeof panelLevels)[number];
export const levelNames: Readonly<Record<PanelLevel, string>> = {
  bust: 'Bust',
  waist: 'Waist',
  hip: 'Hip',
  hem: 'Hem',
};

/** How the thread of the cloth lies: straight runs down the piece. */
export const grains = ['straight', 'cross', 'bias', 'not-known'] as const;
export const grainLabels: Readonly<Record<(typeof grains)[number], string>> = {
  straight: 'Straight',
  cross: 'Cross',
  bias: 'Bias',
  'not-known': 'Not known',
};

/** Which layer a piece belongs to. Dress is often sewn with outside and lining mounted as one. */
export const pieceLayers = ['outside', 'outside-and-lining', 'lining', 'interlining'] as const;
export type PieceLayer = (typeof pieceLayers)[number];
export const layerLabels: Readonly<Record<PieceLayer, string>> = {
  outside: 'Outside',
  'outside-and-lining': 'Outside and lining as one',
  lining: 'Lining',
  interlining: 'Interlining',
};

export const dartCentres = ['front', 'back'] as const;
export const centreLabels: Readonly<Record<(typeof dartCentres)[number], string>> = {
  front: 'Centre front',
  back: 'Centre back',
};

export const tipSides = ['above', 'below'] as const;
export const tipSideLabels: Readonly<Record<(typeof tipSides)[number], string>> = {
  above: 'Above the waist',
  below: 'Below the waist',
};

export const fullnessKinds = ['knife', 'box', 'inverted', 'cartridge', 'gauging', 'gathers'] as const;
export type FullnessKind = (typeof fullnessKinds)[number];
export const fullnessLabels: Readonly<Record<FullnessKind, string>> = {
  knife: 'Knife pleats',
  box: 'Box pleats',
  inverted: 'Inverted pleats',
  cartridge: 'Cartridge pleats',
  gauging: 'Gauging',
  gathers: 'Gathers',
};

/** Which way pleats are laid, as worn. */
export const pleatDirections = [
  'not-said',
  'to-centre-front',
  'to-centre-back',
  'to-left',
  'to-right',
] as const;
export const directionLabels: Readonly<Record<(typeof pleatDirections)[number], string>> = {
  'not-said': 'Not said',
  'to-centre-front': 'Towards centre front',
  'to-centre-back': 'Towards centre back',
  'to-left': 'Towards the left, as worn',
  'to-right': 'Towards the right, as worn',
};

export const stitchings = [
  'hand-running',
  'hand-back',
  'hand-whip',
  'hand-mixed',
  'machine-lock',
  'machine-chain',
  'not-known',
] as const;
export const stitchingLabels: Readonly<Record<(typeof stitchings)[number], string>> = {
  'hand-running': 'Hand, running stitch',
  'hand-back': 'Hand, back stitch',
  'hand-whip': 'Hand, whip stitch',
  'hand-mixed': 'Hand, running and back stitch',
  'machine-lock': 'Machine, lock stitch',
  'machine-chain': 'Machine, chain stitch',
  'not-known': 'Not known',
};

export const edgeFinishes = [
  'raw',
  'pinked',
  'overcast',
  'bound',
  'turned-in',
  'selvedge',
  'not-known',
] as const;
export const edgeLabels: Readonly<Record<(typeof edgeFinishes)[number], string>> = {
  raw: 'Left raw',
  pinked: 'Pinked',
  overcast: 'Overcast',
  bound: 'Bound',
  'turned-in': 'Turned in',
  selvedge: 'Selvedge',
  'not-known': 'Not known',
};

/** The lengths that a part has once, in the order in which they are asked for. */
export const neckAndUnderarm = {
  neck: {
    frontWidth: 'Neck width, front',
    frontDepth: 'Neck depth, front',
    backWidth: 'Neck width, back',
    backDepth: 'Neck depth, back',
  },
  underarm: {
    belowNeckPoint: 'Underarm below the neck point',
    aboveWaist: 'Underarm above the waist',
  },
} as const;
