import { protocolAdvice } from '@ellwand/shared/protocols/protocol-advice';
import { protocolChanges } from '@ellwand/shared/protocols/protocol-changes';
import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { type ProtocolHistory, type ProtocolVersion, toProtocol } from '@ellwand/shared/records/protocol';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary, type FormMistake } from '../../../components/ui/error-summary.js';
import { TextArea } from '../../../components/ui/field.js';
import { isProblem } from '../../../lib/problem-error.js';
import { makeProtocol, protocolHistoryQuery, protocolsQuery } from '../api/protocols.js';
import { protocolOf, ready } from '../model/draft.js';
import { mistakesAt, mistakesIn } from '../model/faults.js';
import type { DraftDesk } from '../model/use-draft.js';
import { MeanwhileNotice } from './meanwhile-notice.js';

interface MakeVersionProps {
  /** The version that the draft was made from. */
  readonly base: ProtocolVersion;
  readonly history: ProtocolHistory;
  readonly desk: DraftDesk;
  /** Takes another version for the draft to be made from, or begins again from it. */
  readonly onBase: (version: ProtocolVersion, keepsDraft: boolean) => void;
}

/** What would change, why, and the one button that makes it so. */
export function MakeVersion({ base, history, desk, onBase }: MakeVersionProps) {
  const queries = useQueryClient();
  const [note, setNote] = useState('');
  const [mistakes, setMistakes] = useState<readonly FormMistake[]>([]);
  const [attempt, setAttempt] = useState(0);
  const [isSending, setSending] = useState(false);
  const [made, setMade] = useState<number | null>(null);
  const draft = ready(desk.draft);
  const protocol = protocolOf(draft);
  const changes = protocolChanges(toProtocol(base), protocol);
  const newest = history.versions[0];
  const next = history.version + 1;

  const refuse = (found: readonly FormMistake[]) => {
    setMistakes(found);
    setAttempt(attempt + 1);
  };
  const make = async () => {
    const found = mistakesAt(draft, protocolFaults(protocol, history.versions.map(toProtocol)));
    if (note.trim() === '')
      found.push({ fieldId: 'version-note', message: 'Say why there is a new version' });
    if (found.length > 0) return refuse(found);
    setSending(true);
    try {
      const { points, ownPoints } = draft;
      const answer = await makeProtocol(history, base.version, { points, ownPoints, note });
      setMistakes([]);
      setNote('');
      setMade(answer.version);
      onBase(answer, false);
    } catch (error) {
      if (!isProblem(error, 'version.stale')) refuse(mistakesIn(draft, error));
    } finally {
      setSending(false);
      await queries.invalidateQueries({ queryKey: protocolHistoryQuery(history).queryKey });
      await queries.invalidateQueries({ queryKey: protocolsQuery.queryKey, exact: true });
    }
  };

  return (
    <section aria-labelledby="make-title" className="space-y-4 border-t border-ink pt-6">
      <h2 id="make-title" className="title text-title-25">
        What changes in version {next}
      </h2>
      {newest && newest.version > base.version && (
        <MeanwhileNotice base={base} newest={newest} onBase={onBase} />
      )}
      <ErrorSummary mistakes={mistakes} attempt={attempt} />
      {changes.length === 0 ? (
        <p className="text-table text-ink-2">Nothing yet.</p>
      ) : (
        <ul className="list-disc space-y-0.5 pl-5 text-table">
          {changes.map((change) => (
            <li key={change}>{change}</li>
          ))}
        </ul>
      )}
      {protocolAdvice(protocol).map((sentence) => (
        <p key={sentence} className="max-w-text border-l-2 border-logwood pl-3 text-table">
          <span className="font-medium text-logwood">To think over: </span>
          {sentence}
        </p>
      ))}
      {changes.length > 0 && (
        <>
          <div className="max-w-text">
            <TextArea
              id="version-note"
              label="Why there is a new version"
              hint="For whoever wonders years from now."
              value={note}
              error={mistakes.find(({ fieldId }) => fieldId === 'version-note')?.message}
              onChange={({ target }) => setNote(target.value)}
            />
          </div>
          <Button tone="action" disabled={isSending} onClick={() => void make()}>
            Make version {next}
          </Button>
        </>
      )}
      <p role="status" className="text-table text-ink-2">
        {made !== null && changes.length === 0 ? `Version ${made} is made. New sheets are taken by it.` : ''}
      </p>
    </section>
  );
}
