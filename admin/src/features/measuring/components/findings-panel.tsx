import type { FindingView } from '@ellwand/shared/records/sheet';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { FieldError } from '../../../components/ui/field.js';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import { momentText } from '../../../lib/moments.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

const severityWords = { stop: 'Stop', question: 'Question', note: 'Note' } as const;
const looks = {
  stop: 'border-l-madder',
  question: 'border-l-weld',
  note: 'border-l-hair',
} as const;
const order = { stop: 0, question: 1, note: 2 } as const;

/** What the checks have to say, in sentences. Stops and questions are answered by reading again or by a reason. */
export function FindingsPanel({
  desk,
  onPoint,
}: {
  readonly desk: SheetDesk;
  readonly onPoint: (pointId: string) => void;
}) {
  const { findings } = desk;
  if (findings.isPending)
    return (
      <div className="p-4">
        <Waiting label="Checking the sheet" rows={3} />
      </div>
    );
  if (!findings.data)
    return (
      <div className="p-4">
        <Failed error={findings.error} onRetry={findings.refetch} />
      </div>
    );
  const sorted = findings.data.findings.toSorted(
    (first, second) => order[first.severity] - order[second.severity],
  );
  return (
    <div className="p-4">
      <h2 className="title mb-3 text-title-25">Findings</h2>
      {findings.local && (
        <p className="mb-3 text-table text-ink-2">
          Worked out on this tablet. What needs the other part or other garments is asked once all is sent.
        </p>
      )}
      {sorted.length === 0 ? (
        <Empty title="The checks have nothing to say">They run again with every reading that is kept.</Empty>
      ) : (
        <ul className="space-y-3">
          {sorted.map((finding) => (
            <FindingCard key={finding.key} finding={finding} desk={desk} onPoint={onPoint} />
          ))}
        </ul>
      )}
    </div>
  );
}

interface FindingCardProps {
  readonly finding: FindingView;
  readonly desk: SheetDesk;
  readonly onPoint: (pointId: string) => void;
}

function FindingCard({ finding, desk, onPoint }: FindingCardProps) {
  const { severity, sentence, pointIds, answer } = finding;
  const unread = (id: string) => !desk.rows.some(({ point, reading }) => point.id === id && reading !== null);
  // What was never read is mended by reading it, or by saying at its row why it cannot be taken.
  const answerable =
    severity !== 'note' && !answer && !desk.locked && !(pointIds.length > 0 && pointIds.every(unread));
  const nameOf = (id: string) => desk.points.find((point) => point.id === id)?.point.name ?? id;
  return (
    <li className={`rounded-sm border border-l-4 border-hair bg-sheet p-3 ${looks[severity]}`}>
      <p className="text-label font-semibold text-ink-2">
        {answer ? `${severityWords[severity]}, answered` : severityWords[severity]}
      </p>
      <p className="text-body">{sentence}</p>
      {answer && (
        <p className="mt-1 text-table text-ink-2">
          “{answer.reason}”, {answer.by}, {momentText(answer.at)}
        </p>
      )}
      {!desk.locked && (
        <div className="mt-2 flex flex-wrap gap-2">
          {pointIds.map((id) => (
            <Button key={id} className="min-h-11" onClick={() => onPoint(id)}>
              Read {nameOf(id)}
              {unread(id) ? '' : ' again'}
            </Button>
          ))}
        </div>
      )}
      {answerable && <AnswerForm finding={finding} desk={desk} />}
    </li>
  );
}

/** Kept on this tablet at once, and sent like a reading. */
function AnswerForm({ finding, desk }: { readonly finding: FindingView; readonly desk: SheetDesk }) {
  const [reason, setReason] = useState('');
  const [tried, setTried] = useState(false);
  const id = `answer-${finding.key.replace(/\W/g, '-')}`;
  const missing = tried && reason.trim() === '';
  return (
    <form
      noValidate
      className="mt-3"
      onSubmit={(event) => {
        event.preventDefault();
        setTried(true);
        if (reason.trim() !== '') desk.answer(finding.key, reason.trim());
      }}
    >
      <label htmlFor={id} className="text-table font-medium">
        Or say why it is right
      </label>
      <div className="mt-1 flex flex-wrap gap-2">
        <input
          id={id}
          value={reason}
          maxLength={500}
          onChange={(event) => setReason(event.target.value)}
          aria-invalid={missing || undefined}
          aria-describedby={missing ? `${id}-error` : undefined}
          className="box min-h-11 w-auto min-w-48 grow"
        />
        <Button type="submit" className="min-h-11">
          Keep the reason
        </Button>
      </div>
      {missing && <FieldError id={`${id}-error`}>Write the reason, or read the point again.</FieldError>}
    </form>
  );
}
