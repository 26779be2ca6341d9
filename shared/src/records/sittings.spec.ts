import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Sitting, sittingsOf } from './sittings.js';
import type { StoredTableNote } from './table-note.js';

const day = (time: string) => `2026-11-20T${time}:00.000Z`;
const said = (about: 'begun' | 'paused', time: string): StoredTableNote => ({
  id: '0190f3b0-0000-7000-8000-000000000000',
  device: 'Tablet 7c1d',
  by: '0190f3b0-0000-7000-8000-000000000001',
  byName: 'Odile Marsh',
  saidAt: day(time),
  receivedAt: day('23:00'),
  ...(about === 'begun' ? { about } : { about, reason: 'The light is going' }),
});
const keyed = (time: string) => ({ keyedAt: day(time) });

const morning = [said('begun', '09:00'), said('paused', '12:00')];
const afternoon = [said('begun', '14:00')];

describe('the sittings of a sheet', () => {
  it('go from opening the box until it is put away', () => {
    expect(sittingsOf([...morning, ...afternoon], [keyed('09:30'), keyed('10:00'), keyed('14:10')])).toEqual([
      { begunAt: day('09:00'), pausedAt: day('12:00'), pausedBecause: 'The light is going', readings: 2 },
      { begunAt: day('14:00'), pausedAt: null, pausedBecause: '', readings: 1 },
    ]);
  });

  it('are there for readings of which nobody said that a sitting had begun', () => {
    expect(sittingsOf([], [keyed('09:30'), keyed('09:40')])).toMatchObject([
      { begunAt: day('09:30'), pausedAt: null, readings: 2 },
    ]);
  });

  it('are none before anything was said or read; putting away what was not out makes none', () => {
    expect(sittingsOf([], [])).toEqual([]);
    expect(sittingsOf([said('paused', '09:00')], [])).toEqual([]);
  });

  it('begin once, however often it is said', () => {
    expect(sittingsOf([said('begun', '09:00'), said('begun', '09:05')], [])).toHaveLength(1);
  });

  it('do not depend on the order in which tablets find the network, and hold every reading once', () => {
    const times = fc.integer({ min: 0, max: 1439 }).map((minute) => {
      const two = (value: number) => String(value).padStart(2, '0');
      return `${two(Math.floor(minute / 60))}:${two(minute % 60)}`;
    });
    const notes = fc.array(fc.tuple(fc.constantFrom('begun' as const, 'paused' as const), times), {
      maxLength: 12,
    });
    fc.assert(
      fc.property(notes, fc.array(times, { maxLength: 20 }), (asSaid, readAt) => {
        const made = asSaid.map(([about, time]) => said(about, time));
        const readings = readAt.map(keyed);
        const sittings: readonly Sitting[] = sittingsOf(made, readings);
        expect(sittingsOf(made.toReversed(), readings.toReversed())).toEqual(sittings);
        expect(sittings.reduce((sum, sitting) => sum + sitting.readings, 0)).toBe(readings.length);
        expect(sittings.slice(0, -1).every(({ pausedAt }) => pausedAt !== null)).toBe(true);
      }),
    );
  });
});
