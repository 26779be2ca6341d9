/**
 * The protocols the house begins with. Each line is one handling step, in order: opened and inside, front
 * up, back up, so that the garment is turned over once. What can be worked out is not asked: neck to waist
 * follows from neck to hem and waist to hem.
 */
import type { GarmentKind } from '../points/kinds.js';
import type { PointId } from '../points/measuring-points.js';
import type { Protocol, ProtocolPoint } from './protocol.js';

interface Steps {
  readonly inside: readonly ProtocolPoint[];
  readonly front: readonly ProtocolPoint[];
  readonly back: readonly ProtocolPoint[];
}

function must(...ids: readonly PointId[]): readonly ProtocolPoint[] {
  return ids.map((pointId) => ({ pointId, required: true, rounds: 1 }));
}

function may(...ids: readonly PointId[]): readonly ProtocolPoint[] {
  return ids.map((pointId) => ({ pointId, required: false, rounds: 1 }));
}

const bodice: Steps = {
  inside: [
    ...must('bust', 'waist'),
    ...may('inner-waist-band', 'neck', 'side-seam'),
    ...may('armscye', 'cuff'),
  ],
  front: [
    ...must('neck-to-hem-front', 'waist-to-hem-front'),
    ...may('point-depth'),
    ...must('shoulder-seam', 'across-front'),
    ...may('sleeve-outer', 'sleeve-under', 'sleeve-widest', 'elbow'),
  ],
  back: [
    ...must('across-back'),
    ...may('underarm-to-underarm-back'),
    ...must('neck-to-hem-back', 'waist-to-hem-back'),
  ],
};

const skirt: Steps = {
  inside: [...must('waistband'), ...may('hip'), ...must('hem'), ...may('hem-depth')],
  front: [...must('waist-to-hem-front'), ...may('waist-to-hem-side')],
  back: [...must('waist-to-hem-back'), ...may('opening')],
};

const dress: Steps = {
  inside: [
    ...must('bust'),
    ...may('under-bust'),
    ...must('waist'),
    ...may('inner-waist-band', 'neck', 'side-seam', 'armscye', 'cuff', 'hip'),
    ...must('hem'),
  ],
  front: bodice.front,
  back: [...bodice.back, ...may('opening')],
};

const jacket: Steps = {
  inside: [...must('bust', 'waist'), ...may('neck', 'side-seam', 'armscye', 'cuff')],
  front: [
    ...must('neck-to-hem-front', 'shoulder-seam', 'across-front', 'sleeve-outer'),
    ...may('sleeve-under', 'sleeve-widest', 'elbow'),
  ],
  back: [...must('across-back'), ...may('underarm-to-underarm-back'), ...must('neck-to-hem-back')],
};

const coat: Steps = {
  inside: [...must('coat-chest', 'coat-waist'), ...may('armscye', 'cuff')],
  front: [
    ...must('shoulder-seam'),
    ...may('across-front'),
    ...must('sleeve-outer'),
    ...may('sleeve-under', 'elbow'),
  ],
  back: [
    ...must('across-back', 'coat-back-waist', 'coat-full-back'),
    ...may('centre-back-to-cuff', 'coat-skirt-sweep'),
  ],
};

const waistcoat: Steps = {
  inside: [...must('waistcoat-chest', 'waist'), ...may('side-seam', 'armscye')],
  front: must('shoulder-seam', 'waistcoat-front'),
  back: [...must('across-back'), ...may('underarm-to-underarm-back'), ...must('waistcoat-back')],
};

const trousers: Steps = {
  inside: must('trouser-waistband'),
  front: [...must('seat', 'outside-leg', 'inside-leg'), ...may('trouser-knee'), ...must('leg-hem')],
  back: [],
};

const shirt: Steps = {
  inside: [...must('neckband'), ...may('cuff')],
  front: [
    ...may('shoulder-seam'),
    ...must('shirt-body', 'shirt-front', 'sleeve-outer'),
    ...may('sleeve-widest'),
  ],
  back: [...may('across-back', 'centre-back-to-cuff'), ...must('shirt-back')],
};

const stepsByKind: Readonly<Record<GarmentKind, Steps>> = {
  dress,
  bodice,
  skirt,
  coat,
  jacket,
  waistcoat,
  trousers,
  breeches: trousers,
  cape: { inside: [], front: must('cape-neck', 'cape-sweep'), back: must('cape-back-length') },
  shirt,
  chemise: {
    inside: [...may('neck'), ...must('hem')],
    front: [...must('shirt-body', 'shirt-front'), ...may('sleeve-outer')],
    back: must('shirt-back'),
  },
  corset: {
    inside: must('corset-waist-closed', 'corset-top', 'corset-bottom'),
    front: must('busk'),
    back: may('lacing-gap'),
  },
  crinoline: {
    inside: must('waistband'),
    front: [
      ...may('crinoline-top-hoop-round', 'crinoline-middle-hoop-round'),
      ...must(
        'crinoline-base-round',
        'crinoline-base-depth',
        'crinoline-base-width',
        'crinoline-front-length',
      ),
    ],
    back: must('crinoline-back-length'),
  },
  bustle: {
    inside: must('bustle-band'),
    front: [],
    back: must('bustle-width', 'bustle-depth', 'bustle-length'),
  },
  petticoat: skirt,
  'child-dress': {
    inside: [...must('child-chest', 'child-waist'), ...may('neck'), ...must('hem')],
    front: [...must('shoulder-seam'), ...may('sleeve-outer')],
    back: must('across-back', 'child-length'),
  },
  hat: {
    inside: must('head-opening'),
    front: must('crown-height', 'brim-front', 'brim-left', 'brim-right'),
    back: must('brim-back'),
  },
  glove: { inside: [], front: must('palm', 'glove-length'), back: [] },
  shoe: { inside: [], front: must('heel'), back: must('sole', 'tread') },
};

const STANDARD_VERSION = 1;

/** The house's first protocol for a kind of part. */
export function protocolFor(kind: GarmentKind): Protocol {
  const { inside, front, back } = stepsByKind[kind];
  return {
    kind,
    version: STANDARD_VERSION,
    wornTogether: false,
    points: [...inside, ...front, ...back],
    ownPoints: [],
  };
}

/** For a bodice and skirt laid together as worn. */
export const wornTogetherProtocol: Protocol = {
  kind: 'dress',
  version: STANDARD_VERSION,
  wornTogether: true,
  points: must('worn-neck-to-hem-front', 'worn-neck-to-hem-back'),
  ownPoints: [],
};
