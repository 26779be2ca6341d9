import type { NewReading } from '@ellwand/shared/records/sheet';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { readingAloud, sayNext, sayReading } from './read-aloud.js';

const taken: NewReading = {
  id: '0193a0b0-0000-7000-8000-000000000001',
  pointId: 'hem',
  round: 1,
  worn: null,
  state: 'taken',
  typed: '742',
  unit: 'mm',
  tapeCount: 3,
  gapTyped: null,
  depthTyped: null,
  method: null,
  levelFoundBy: null,
  replaces: null,
  note: '',
  readBy: '0193a0b0-0000-7000-8000-000000000002',
  heldBy: null,
  device: 'tablet 1',
  keyedAt: '2026-11-20T09:30:00.000Z',
};

describe('a reading read aloud', () => {
  afterEach(() => vi.unstubAllGlobals());

  it('names its point, whole tapes, figure and unit, or that it was not taken', () => {
    expect(readingAloud('Hem', taken)).toBe('Hem, 3 tapes and 742 millimetres');
    expect(readingAloud('Hem', { ...taken, tapeCount: 1 })).toBe('Hem, 1 tape and 742 millimetres');
    expect(readingAloud('Waist', { ...taken, typed: '24 1/8', unit: 'in', tapeCount: 0 })).toBe(
      'Waist, 24 1/8 inches',
    );
  });

  it('takes the place of what was still being said; what comes next is said after it', () => {
    const said: string[] = [];
    vi.stubGlobal(
      'SpeechSynthesisUtterance',
      class {
        constructor(readonly text: string) {}
      },
    );
    vi.stubGlobal('speechSynthesis', {
      cancel: () => said.splice(0),
      speak: ({ text }: { text: string }) => said.push(text),
    });
    sayNext('Hem');
    sayReading('Hem', taken);
    sayNext('Opening');
    expect(said).toEqual(['Hem, 3 tapes and 742 millimetres', 'Next: Opening']);
  });
});
