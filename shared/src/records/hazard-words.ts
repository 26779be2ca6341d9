import { hazardIds } from './garment.js';

export type HazardId = (typeof hazardIds)[number];

export const hazardLabels: Readonly<Record<HazardId, string>> = {
  arsenic: 'Arsenic (greens, dyes, paints)',
  lead: 'Lead (paints, weights, greens)',
  mercury: 'Mercury (fur felt)',
  pesticide: 'Old pesticide (wool, fur, feather)',
  'cellulose-nitrate': 'Cellulose nitrate (buttons, combs, sequins)',
  'weighted-silk': 'Weighted silk',
  asbestos: 'Asbestos (theatre pieces)',
  mould: 'Mould or dust',
  sharp: 'Sharp: pins, wires, steels',
};

/** The usual caution, in the museum's own words; the institution's and the country's rules come first. */
export const hazardCautions: Readonly<Record<HazardId, string>> = {
  arsenic:
    'Disposable gloves; wash hands afterwards. Do not brush, steam or iron. Keep it covered when not in use.',
  lead: 'Disposable gloves; wash hands afterwards. Do not rub or brush painted places.',
  mercury:
    'Disposable gloves and an airy room: handling and warmth let vapour out, and a dust mask does not stop it. Never steam.',
  pesticide: 'Disposable gloves and a covered work table. Do not brush or shake. Air the room.',
  'cellulose-nitrate':
    'Keep away from heat and metal; a sharp smell or stickiness means decay. Set it apart and tell a conservator.',
  'weighted-silk':
    'It splits under its own weight. Support it on a board, never lift it by the shoulders, never fold it.',
  asbestos: 'Do not open the bag. Stop, close the room’s air, and call a qualified person.',
  mould:
    'Disposable gloves and a mask against dust. Keep it bagged and away from other pieces until it is dry and clean.',
  sharp: 'Look before you reach inside. Cut-resistant gloves where steels or wires show.',
};

export const standingLabels = {
  suspected: 'Suspected, not tested',
  'tested-present': 'Tested: present',
  'tested-absent': 'Tested: absent',
} as const;

export const isHazardId = (id: string): id is HazardId => (hazardIds as readonly string[]).includes(id);
