import { describe, expect, it } from 'vitest';
import { cutSheet, piece } from '../testing/sample-cut-sheets.js';
import { findMeasuringPoint } from '../points/measuring-points.js';
import { mm } from '../units/length.js';
import { levelPoints, panelNotes } from './panel-notes.js';

const eight = (width: string) =>
  cutSheet({ pieces: [piece('Panel', { count: 8, widths: { waist: width } })] });
const waistRead = [{ level: 'waist', label: 'Waist', value: mm(612) }] as const;
const said = (sheet: ReturnType<typeof cutSheet>, rounds = waistRead as Parameters<typeof panelNotes>[1]) =>
  panelNotes(sheet, rounds).map(({ says, sentence }) => `${says}: ${sentence}`);

describe('what panels say beside the round that was read', () => {
  it('is that they lie apart, by how much, and how much is allowed', () => {
    expect(said(eight('78.5'))).toEqual([
      'apart: The panels’ sum at the waist is 16 mm more than the waist that was read: 8 panels, 628 mm, against 612 mm; 11 mm is allowed.',
    ]);
    expect(said(eight('74.5'))).toEqual([
      'apart: The panels’ sum at the waist is 16 mm less than the waist that was read: 8 panels, 596 mm, against 612 mm; 11 mm is allowed.',
    ]);
  });

  it('is that they agree where each panel is a millimetre over and no more', () => {
    expect(said(eight('77.5'))).toEqual([
      'agrees: The panels’ sum at the waist agrees with the waist that was read: 8 panels, 620 mm, against 612 mm.',
    ]);
  });

  it('is nothing to go by while a panel is missing, or while no round was read', () => {
    const pieces = [
      piece('Front', { widths: { bust: '300', waist: '306' } }),
      piece('Back', { widths: { bust: '290' } }),
    ];
    expect(said(cutSheet({ pieces }))).toEqual([
      'open: 2 panels, 590 mm at the bust. No round was read to compare.',
      'open: 1 panel, 306 mm so far at the waist. Not read there: Back.',
    ]);
  });

  it('is silent where no panel was read', () => {
    expect(said(cutSheet({ pieces: [piece('Collar')] }))).toEqual([]);
  });

  it('is held against points that go round', () => {
    const points = Object.values(levelPoints).flat();
    for (const pointId of points)
      expect(['round', 'curve', 'flat-doubled'], pointId).toContain(findMeasuringPoint(pointId)?.how);
  });
});
