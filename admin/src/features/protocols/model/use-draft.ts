import type { ProtocolVersion } from '@ellwand/shared/records/protocol';
import { useState } from 'react';
import type { Draft } from './draft.js';

export interface DraftDesk {
  readonly draft: Draft;
  /** @param said what was done, for the line beside "Undo" */
  readonly change: (next: Draft, said: string) => void;
  readonly undo: () => void;
  /** What undoing takes back; null where nothing was done. */
  readonly last: string | null;
  /** Begins again from another version. */
  readonly begin: (version: ProtocolVersion, known?: Draft['ownPoints']) => void;
}

interface Step {
  readonly draft: Draft;
  readonly said: string;
}

/** Own points of earlier versions are known too: a house that dropped one may want it back. */
export function draftFrom(version: ProtocolVersion, known: Draft['ownPoints'] = []): Draft {
  const { kind, wornTogether, points, ownPoints } = version;
  const others = known.filter(({ id }) => ownPoints.every((own) => own.id !== id));
  const once = [...new Map(others.map((own) => [own.id, own])).values()];
  return { kind, wornTogether, version: version.version, points, ownPoints: [...ownPoints, ...once] };
}

/** A draft with every step taken since, so that each can be taken back. */
export function useDraft(version: ProtocolVersion, known: Draft['ownPoints']): DraftDesk {
  const [draft, setDraft] = useState(() => draftFrom(version, known));
  const [steps, setSteps] = useState<readonly Step[]>([]);
  return {
    draft,
    change: (next, said) => {
      setSteps([...steps, { draft, said }]);
      setDraft(next);
    },
    undo: () => {
      const last = steps.at(-1);
      if (!last) return;
      setDraft(last.draft);
      setSteps(steps.slice(0, -1));
    },
    last: steps.at(-1)?.said ?? null,
    begin: (from, knownNow) => {
      setDraft(draftFrom(from, knownNow));
      setSteps([]);
    },
  };
}
