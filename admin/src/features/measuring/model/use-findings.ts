import type { FindingView, Sheet, SheetFindings } from '@ellwand/shared/records/sheet';
import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { useSettled } from '../../../lib/use-settled.js';
import { useReachable } from '../../../offline/context.js';
import { findingsQuery } from '../api/findings.js';
import type * as LocalFindings from './local-findings.js';
import { useOutbox, useOutboxView } from './use-outbox.js';

const none: readonly FindingView[] = [];

export interface FindingsSeen {
  readonly data: SheetFindings | undefined;
  /** True where they were worked out on this device. */
  readonly local: boolean;
  readonly isPending: boolean;
  readonly error: Error | null;
  readonly refetch: () => void;
}

type Rules = typeof LocalFindings;

/** The checks, fetched when this device must work by them itself: nobody waits for them before the first figure. */
function useRules(wanted: boolean): Rules | null {
  const [rules, setRules] = useState<Rules | null>(null);
  useEffect(() => {
    if (!wanted || rules) return;
    let gone = false;
    // Where they cannot be had, the museum's findings stand until they can.
    void import('./local-findings.js').then(
      (module) => !gone && setRules(module),
      () => undefined,
    );
    return () => {
      gone = true;
    };
  }, [wanted, rules]);
  return rules;
}

/** The findings of a sheet: the museum's while all is sent and it answers, else this device's own. */
export function useFindings(sheet: Sheet): FindingsSeen {
  const asked = useQuery(findingsQuery(sheet.id));
  const outbox = useOutbox(sheet.id);
  // The checks wait until the row that was typed into is drawn.
  const now = useOutboxView(outbox);
  const view = useSettled(now) ?? now;
  const reachable = useReachable();
  const pending = view.entries.filter(({ state }) => state === 'waiting');
  const isLocal = pending.length > 0 || view.notes.length > 0 || !reachable || asked.isError;
  const rules = useRules(isLocal);
  const local = useMemo(() => {
    if (!isLocal || !rules) return null;
    const answers = view.notes.flatMap(({ note, byName }) =>
      note.about === 'answer' ? [{ key: note.key, reason: note.reason, by: byName, at: note.saidAt }] : [],
    );
    const readings = view.entries.filter(({ state }) => state === 'waiting').map(({ reading }) => reading);
    return rules.localFindings(sheet, readings, {
      by: readings[0]?.readBy ?? '',
      answers,
      known: asked.data?.findings ?? none,
    });
  }, [isLocal, rules, sheet, view, asked.data]);
  return {
    data: local ?? asked.data,
    local: local !== null,
    isPending: local === null && asked.isPending,
    error: local === null ? asked.error : null,
    refetch: () => void asked.refetch(),
  };
}
