/** What the public searches by: one group gathers the points that answer the same question on different garments. */
export const groupLabels = {
  bust: 'Bust or chest',
  'under-bust': 'Under-bust',
  waist: 'Waist',
  neck: 'Neck',
  'back-length': 'Back length',
  'front-length': 'Front length',
  'point-depth': 'Depth of the point',
  shoulder: 'Shoulder',
  'back-width': 'Back width',
  'front-width': 'Front width',
  'side-seam': 'Side seam',
  armscye: 'Armscye',
  sleeve: 'Sleeve length',
  'sleeve-width': 'Sleeve width',
  cuff: 'Cuff',
  hip: 'Hip or seat',
  'skirt-length': 'Skirt length',
  hem: 'Hem',
  'hem-depth': 'Hem depth',
  'cloth-width': 'Cloth width',
  opening: 'Opening',
  leg: 'Leg length',
  knee: 'Knee',
  'leg-hem': 'Leg hem',
  head: 'Head opening',
  crown: 'Crown',
  brim: 'Brim',
  palm: 'Palm',
  'glove-length': 'Glove length',
  sole: 'Sole',
  tread: 'Tread',
  heel: 'Heel',
  busk: 'Busk',
  'lacing-gap': 'Lacing gap',
  hoop: 'Hoop',
  'crinoline-base': 'Crinoline base',
  bustle: 'Bustle',
} as const;

export type PointGroup = keyof typeof groupLabels;

export interface GroupEntry {
  readonly id: PointGroup;
  readonly label: string;
}

export const groups: readonly GroupEntry[] = Object.entries(groupLabels).map(([id, label]) => ({
  id: id as PointGroup,
  label,
}));

export function isPointGroup(text: string): text is PointGroup {
  return Object.hasOwn(groupLabels, text);
}
