import type { FindingView, Sheet, SheetFindings } from '@ellwand/shared/records/sheet';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useReachable } from '../../../offline/context.js';
import { findingsQuery } from '../api/findings.js';
import { localFindings } from './local-findings.js';
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

/** The findings of a sheet: the museum's while all is sent and it answers, else this device's own. */
export function useFindings(sheet: Sheet): FindingsSeen {
  const asked = useQuery(findingsQuery(sheet.id));
  const outbox = useOutbox(sheet.id);
  const view = useOutboxView(outbox);
  const reachable = useReachable();
  const pending = view.entries.filter(({ state }) => state === 'waiting');
  const isLocal = pending.length > 0 || view.notes.length > 0 || !reachable || asked.isError;
  const local = useMemo(() => {
    if (!isLocal) return null;
    const answers = view.notes.flatMap(({ note, byName }) =>
      note.about === 'answer' ? [{ key: note.key, reason: note.reason, by: byName, at: note.saidAt }] : [],
    );
    const readings = view.entries.filter(({ state }) => state === 'waiting').map(({ reading }) => reading);
    return localFindings(sheet, readings, {
      by: readings[0]?.readBy ?? '',
      answers,
      known: asked.data?.findings ?? none,
    });
  }, [isLocal, sheet, view, asked.data]);
  return {
    data: local ?? asked.data,
    local: local !== null,
    isPending: local === null && asked.isPending,
    error: local === null ? asked.error : null,
    refetch: () => void asked.refetch(),
  };
}
