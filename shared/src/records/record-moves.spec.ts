import { describe, expect, it } from 'vitest';
import {
  mayMove,
  recordMoves,
  type RecordStage,
  recordStages,
  versionMoves,
  versionStates,
} from './record-moves.js';

/** Every stage that can be reached from one, by any number of moves. */
function reachable(from: RecordStage): Set<RecordStage> {
  const seen = new Set<RecordStage>();
  const next: RecordStage[] = [...recordMoves[from]];
  for (let stage = next.pop(); stage !== undefined; stage = next.pop()) {
    if (seen.has(stage)) continue;
    seen.add(stage);
    next.push(...recordMoves[stage]);
  }
  return seen;
}

describe('the stages of a record', () => {
  it('lead to the public only through review and approval', () => {
    const leadingTo = (wanted: RecordStage) => recordStages.filter((stage) => mayMove(stage, wanted));
    expect(leadingTo('published')).toEqual(['approved']);
    expect(leadingTo('approved')).toEqual(['in-review']);
    expect(leadingTo('in-review')).toEqual(['draft']);
  });

  it('are all reached from a draft, and none is a dead end', () => {
    expect(reachable('draft')).toEqual(new Set(recordStages));
    for (const stage of recordStages) expect(reachable(stage)).toContain('draft');
  });

  it('never move to themselves', () => {
    for (const stage of recordStages) expect(mayMove(stage, stage)).toBe(false);
  });
});

describe('the states of a published version', () => {
  it('never lead back to the public', () => {
    for (const state of versionStates) expect(versionMoves[state]).not.toContain('current');
    expect(versionMoves.withdrawn).toEqual([]);
  });
});
