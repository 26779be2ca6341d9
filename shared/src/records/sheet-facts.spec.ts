import { describe, expect, it } from 'vitest';
import { SheetFacts } from './sheet.js';

const [odile, ines] = ['01930000-0000-7000-8000-000000000001', '01930000-0000-7000-8000-000000000002'];
const problems = (
  ...people: readonly (readonly [string, 'read' | 'held' | 'wrote'])[]
): readonly unknown[] => {
  const read = SheetFacts.safeParse({
    people: people.map(([userId, duty]) => ({ userId, duty })),
    ...{ measuredOn: '2026-11-20', place: 'Long table', support: 'flat', tape: 'Tape 3' },
  });
  return read.success ? [] : read.error.issues.map(({ path }) => path.join('.'));
};

describe('who measures', () => {
  it('are one who reads and one who holds', () => {
    expect(problems([odile, 'read'], [ines, 'held'])).toEqual([]);
    expect(problems([odile, 'held'])).toContain('people');
  });

  it('may take turns: both read and both hold', () => {
    const turns = [odile, ines].flatMap((who) => [[who, 'read'] as const, [who, 'held'] as const]);
    expect(problems(...turns)).toEqual([]);
  });

  it('are not one person holding the tape for themselves without a reason', () => {
    expect(problems([odile, 'read'], [odile, 'held'])).toEqual(['aloneBecause']);
    expect(problems([odile, 'read'], [ines, 'wrote'])).toEqual(['aloneBecause']);
  });
});
