/** The kinds of part that have measuring points of their own. A `set` joins garments and is never measured itself. */
export const kindIds = [
  'dress',
  'bodice',
  'skirt',
  'coat',
  'jacket',
  'waistcoat',
  'trousers',
  'breeches',
  'cape',
  'shirt',
  'chemise',
  'corset',
  'crinoline',
  'bustle',
  'petticoat',
  'child-dress',
  'hat',
  'glove',
  'shoe',
] as const;

export type GarmentKind = (typeof kindIds)[number];

export interface KindLabel {
  readonly singular: string;
  readonly plural: string;
}

/** In sentence case, as they stand alone; `lowerKind` for the middle of a sentence. */
export const kindLabels: Readonly<Record<GarmentKind, KindLabel>> = {
  dress: { singular: 'Dress', plural: 'Dresses' },
  bodice: { singular: 'Bodice', plural: 'Bodices' },
  skirt: { singular: 'Skirt', plural: 'Skirts' },
  coat: { singular: 'Coat', plural: 'Coats' },
  jacket: { singular: 'Jacket', plural: 'Jackets' },
  waistcoat: { singular: 'Waistcoat', plural: 'Waistcoats' },
  trousers: { singular: 'Trousers', plural: 'Trousers' },
  breeches: { singular: 'Breeches', plural: 'Breeches' },
  cape: { singular: 'Cape', plural: 'Capes' },
  shirt: { singular: 'Shirt', plural: 'Shirts' },
  chemise: { singular: 'Chemise', plural: 'Chemises' },
  corset: { singular: 'Corset', plural: 'Corsets' },
  crinoline: { singular: 'Crinoline', plural: 'Crinolines' },
  bustle: { singular: 'Bustle', plural: 'Bustles' },
  petticoat: { singular: 'Petticoat', plural: 'Petticoats' },
  'child-dress': { singular: 'Child’s dress', plural: 'Children’s dresses' },
  hat: { singular: 'Hat', plural: 'Hats' },
  glove: { singular: 'Gloves', plural: 'Gloves' },
  shoe: { singular: 'Shoes', plural: 'Shoes' },
};

export function isGarmentKind(text: string): text is GarmentKind {
  return kindIds.some((kind) => kind === text);
}

export function lowerKind(kind: GarmentKind): string {
  return kindLabels[kind].singular.toLowerCase();
}
