import { describe, expect, it } from 'vitest';
import { toMm } from '../units/length.js';
import type { GarmentKind } from './kinds.js';
import { measuringPoint, measuringPoints, type PointId, softRangeFor } from './measuring-points.js';
import { handlingSteps, type MeasuringHow } from './point.js';

type Side = 'I' | 'O';
const ways: Readonly<Record<string, MeasuringHow>> = {
  R: 'round',
  S: 'straight',
  C: 'curve',
  F2: 'flat-doubled',
};

/**
 * The points of the trade as a table for the workroom wall, written apart from the catalogue: inside or outside, how
 * the tape goes, the kind of part that is looked at, the least range in mm that must not be asked about. Common
 * practice of the trade, without a published source; body data behind girths and widths: ANSUR II (US Army, 2012).
 */
const table: readonly (readonly [PointId, Side, keyof typeof ways, GarmentKind, number, number])[] = [
  ['bust', 'I', 'R', 'bodice', 700, 1150],
  ['under-bust', 'I', 'R', 'dress', 600, 1000],
  ['waist', 'I', 'R', 'bodice', 460, 1100],
  ['inner-waist-band', 'I', 'R', 'bodice', 440, 1000],
  ['neck', 'I', 'C', 'dress', 330, 1200],
  ['neck-to-waist-back', 'O', 'C', 'bodice', 100, 470],
  ['neck-to-waist-front', 'O', 'C', 'bodice', 80, 450],
  ['point-depth', 'O', 'S', 'bodice', 0, 200],
  ['shoulder-seam', 'O', 'C', 'coat', 20, 220],
  ['across-back', 'O', 'S', 'jacket', 180, 430],
  ['underarm-to-underarm-back', 'O', 'C', 'waistcoat', 300, 620],
  ['across-front', 'O', 'S', 'bodice', 220, 430],
  ['side-seam', 'I', 'S', 'waistcoat', 50, 250],
  ['armscye', 'I', 'C', 'coat', 330, 560],
  ['sleeve-outer', 'O', 'C', 'dress', 60, 900],
  ['sleeve-under', 'O', 'S', 'bodice', 20, 520],
  ['sleeve-widest', 'O', 'F2', 'bodice', 240, 1600],
  ['elbow', 'O', 'F2', 'coat', 220, 450],
  ['cuff', 'I', 'R', 'shirt', 140, 360],
  ['neck-to-hem-back', 'O', 'C', 'dress', 850, 3500],
  ['neck-to-hem-back', 'O', 'C', 'bodice', 300, 800],
  ['neck-to-hem-front', 'O', 'C', 'dress', 850, 1600],
  ['neck-to-hem-front', 'O', 'C', 'bodice', 300, 800],
  ['waistband', 'I', 'R', 'petticoat', 460, 900],
  ['high-hip', 'I', 'R', 'skirt', 600, 1200],
  ['hip', 'I', 'R', 'skirt', 750, 1350],
  ['waist-to-hem-front', 'O', 'C', 'skirt', 450, 1300],
  ['waist-to-hem-front', 'O', 'C', 'bodice', 0, 400],
  ['waist-to-hem-back', 'O', 'C', 'dress', 450, 3000],
  ['waist-to-hem-back', 'O', 'C', 'bodice', 0, 400],
  ['waist-to-hem-side', 'O', 'C', 'skirt', 850, 1200],
  ['hem', 'I', 'C', 'dress', 900, 5800],
  ['hem-depth', 'I', 'S', 'skirt', 3, 400],
  ['cloth-width', 'I', 'S', 'dress', 400, 1500],
  ['opening', 'O', 'S', 'skirt', 120, 500],
  ['coat-chest', 'I', 'R', 'coat', 800, 1300],
  ['coat-waist', 'I', 'R', 'coat', 650, 1250],
  ['coat-back-waist', 'O', 'C', 'coat', 350, 520],
  ['coat-full-back', 'O', 'C', 'coat', 600, 1250],
  ['centre-back-to-cuff', 'O', 'C', 'shirt', 700, 1000],
  ['coat-skirt-sweep', 'O', 'C', 'coat', 600, 4000],
  ['waistcoat-chest', 'I', 'R', 'waistcoat', 780, 1300],
  ['waistcoat-back', 'O', 'S', 'waistcoat', 380, 800],
  ['waistcoat-front', 'O', 'S', 'waistcoat', 420, 950],
  ['trouser-waistband', 'I', 'R', 'breeches', 600, 1200],
  ['seat', 'O', 'F2', 'trousers', 850, 1350],
  ['outside-leg', 'O', 'S', 'trousers', 500, 1200],
  ['inside-leg', 'O', 'S', 'trousers', 250, 900],
  ['trouser-knee', 'O', 'F2', 'trousers', 300, 560],
  ['leg-hem', 'O', 'F2', 'trousers', 260, 700],
  ['cape-neck', 'O', 'C', 'cape', 330, 600],
  ['cape-back-length', 'O', 'C', 'cape', 200, 1500],
  ['cape-sweep', 'O', 'C', 'cape', 800, 6000],
  ['neckband', 'I', 'S', 'shirt', 330, 480],
  ['shirt-body', 'O', 'F2', 'shirt', 900, 2000],
  ['shirt-back', 'O', 'S', 'shirt', 600, 1300],
  ['shirt-front', 'O', 'S', 'shirt', 600, 1300],
  ['child-chest', 'I', 'R', 'child-dress', 380, 780],
  ['child-waist', 'I', 'R', 'child-dress', 380, 720],
  ['child-length', 'O', 'C', 'child-dress', 300, 1500],
  ['head-opening', 'I', 'R', 'hat', 480, 640],
  ['crown-height', 'O', 'S', 'hat', 20, 300],
  ['brim-front', 'O', 'S', 'hat', 0, 300],
  ['brim-back', 'O', 'S', 'hat', 0, 300],
  ['brim-left', 'O', 'S', 'hat', 0, 300],
  ['brim-right', 'O', 'S', 'hat', 0, 300],
  ['palm', 'O', 'F2', 'glove', 140, 260],
  ['glove-length', 'O', 'S', 'glove', 180, 750],
  ['sole', 'O', 'S', 'shoe', 110, 320],
  ['tread', 'O', 'S', 'shoe', 40, 115],
  ['heel', 'O', 'S', 'shoe', 0, 120],
  ['corset-waist-closed', 'I', 'R', 'corset', 430, 800],
  ['corset-top', 'I', 'R', 'corset', 650, 1100],
  ['corset-bottom', 'I', 'R', 'corset', 600, 1200],
  ['busk', 'O', 'S', 'corset', 150, 450],
  ['lacing-gap', 'O', 'S', 'corset', 0, 150],
  ['crinoline-top-hoop-round', 'O', 'R', 'crinoline', 600, 2000],
  ['crinoline-middle-hoop-round', 'O', 'R', 'crinoline', 900, 3000],
  ['crinoline-base-round', 'O', 'R', 'crinoline', 1200, 3700],
  ['crinoline-base-depth', 'O', 'S', 'crinoline', 400, 1200],
  ['crinoline-base-width', 'O', 'S', 'crinoline', 400, 1200],
  ['crinoline-front-length', 'O', 'C', 'crinoline', 600, 1000],
  ['crinoline-back-length', 'O', 'C', 'crinoline', 600, 1000],
  ['bustle-band', 'I', 'R', 'bustle', 460, 1000],
  ['bustle-depth', 'O', 'S', 'bustle', 50, 450],
  ['bustle-width', 'O', 'S', 'bustle', 150, 500],
  ['bustle-length', 'O', 'C', 'bustle', 150, 900],
  ['worn-neck-to-hem-back', 'O', 'C', 'dress', 850, 3500],
  ['worn-neck-to-hem-front', 'O', 'C', 'dress', 850, 1600],
];

describe('the catalogue against the table of the trade', () => {
  it.each(table)('%s: %s %s on a %s', (id, side, way, kind, fromMm, toMmWanted) => {
    const point = measuringPoint(id);
    expect(point.side).toBe(side === 'I' ? 'inside' : 'outside');
    expect(point.how).toBe(ways[way]);
    expect(point.kinds).toContain(kind);
    const { from, to } = softRangeFor(point, kind);
    expect(toMm(from)).toBeLessThanOrEqual(fromMm);
    expect(toMm(to)).toBeGreaterThanOrEqual(toMmWanted);
    expect(handlingSteps).toContain(point.handlingStep);
  });

  it('has every point of the catalogue', () => {
    const named = new Set<string>(table.map(([id]) => id));
    expect(measuringPoints.map(({ id }) => id).filter((id) => !named.has(id))).toEqual([]);
  });

  it('lets left and right be read of what there is on both sides, and of nothing else', () => {
    const single = measuringPoints.filter(({ paired }) => !paired).map(({ id }) => id);
    const paired = measuringPoints.filter((point) => point.paired).map(({ id }) => id);
    expect(paired.sort()).toEqual(
      [
        ...['shoulder-seam', 'side-seam', 'armscye', 'sleeve-outer', 'sleeve-under', 'sleeve-widest'],
        ...['elbow', 'cuff', 'centre-back-to-cuff', 'waist-to-hem-side', 'waistcoat-front'],
        ...['outside-leg', 'inside-leg', 'trouser-knee', 'leg-hem'],
        ...['palm', 'glove-length', 'sole', 'tread', 'heel'],
      ].sort(),
    );
    for (const id of single) expect(id).not.toMatch(/sleeve|cuff|leg|glove/);
  });
});
