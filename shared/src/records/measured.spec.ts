import { describe, expect, it } from 'vitest';
import { isTaken } from '../readings/reading.js';
import { fromMmString, toMmString } from '../units/length.js';
import { derivedViews, toReading } from './measured.js';
import type { StoredReading } from './sheet.js';

function stored(pointId: string, valueMm: string | null, more: Partial<StoredReading> = {}): StoredReading {
  return {
    id: '01930000-0000-7000-8000-000000000001',
    pointId,
    round: 1,
    state: valueMm === null ? 'not-taken' : 'taken',
    valueMm,
    typed: valueMm,
    unit: valueMm === null ? null : 'mm',
    tapeCount: 0,
    tapeLengthMm: null,
    worn: null,
    gapTyped: null,
    gapMm: null,
    method: null,
    depthTyped: null,
    depthMm: null,
    heldBy: null,
    levelFoundBy: null,
    reason: valueMm === null ? 'absent' : null,
    replaces: null,
    stands: true,
    note: '',
    readBy: '01930000-0000-7000-8000-000000000002',
    recordedBy: '01930000-0000-7000-8000-000000000002',
    device: 'tablet',
    keyedAt: '2026-11-20T10:00:00.000Z',
    receivedAt: '2026-11-20T10:00:01.000Z',
    ...more,
  };
}

describe('a reading as it is kept', () => {
  it('keeps its exact value and the text that was keyed', () => {
    // 36 1/4 in = 920.75 mm exactly: international yard and pound agreement, 1959.
    const reading = toReading(stored('bust', '920.75', { typed: '36 1/4', unit: 'in' }));
    expect(reading).toMatchObject({
      state: 'taken',
      length: fromMmString('920.75'),
      typed: '36 1/4',
      unit: 'in',
    });
  });

  it('keeps whole tapes and the rest apart', () => {
    const reading = toReading(stored('hem', '5242', { typed: '742', tapeCount: 3, tapeLengthMm: '1500' }));
    if (!isTaken(reading) || !reading.tapeLengths) throw new Error('no tape lengths');
    const { count, tape, rest } = reading.tapeLengths;
    expect([count, toMmString(tape), toMmString(rest)]).toEqual([3, '1500', '742']);
  });

  it('has a reason where it was not taken', () => {
    expect(toReading(stored('hip', null))).toMatchObject({ state: 'not-taken', notTakenReason: 'absent' });
  });
});

describe('derived values as they are shown', () => {
  it('carry formula, working, uncertainty and the figures that were put in', () => {
    const readings = [stored('waist-to-hem-front', '1117.6'), stored('waist-to-hem-back', '1168.4')];
    // A skirt of about 1865, 44 in front and 46 in back: 2 in = 50.8 mm.
    expect(derivedViews('skirt', readings)).toEqual([
      expect.objectContaining({
        id: 'back-over-front-excess',
        valueMm: '50.8',
        ratio: null,
        trace: [
          expect.objectContaining({ pointId: 'waist-to-hem-back', valueMm: '1168.4' }),
          expect.objectContaining({ pointId: 'waist-to-hem-front', valueMm: '1117.6' }),
        ],
      }),
    ]);
  });

  it('take the other parts of the garment with them', () => {
    const otherParts = [{ kind: 'bodice', name: 'Day bodice', readings: [stored('waist', '630')] }] as const;
    const views = derivedViews('skirt', [stored('waistband', '640')], { otherParts });
    expect(views.map(({ id, worked }) => [id, worked])).toEqual([
      ['smallest-girth', 'smallest of 640 mm, 630 mm = 630 mm: Waist, day bodice'],
      ['ease-between-layers', '630 mm − 640 mm = −10 mm'],
    ]);
  });
});
