import { notTakenReasonIds, notTakenReasons } from '@ellwand/shared/readings/reading';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { FieldError, TextField } from '../../../components/ui/field.js';
import type { NotTakenReason } from '../model/use-sheet-desk.js';

interface NotTakenQuestionProps {
  readonly open: boolean;
  readonly label: string;
  readonly onClose: () => void;
  readonly onSaid: (reason: NotTakenReason, note: string) => void;
}

/** Blank, zero and "not taken" differ: what is not taken has a reason. */
export function NotTakenQuestion({ open, label, onClose, onSaid }: NotTakenQuestionProps) {
  const [reason, setReason] = useState<NotTakenReason | null>(null);
  const [note, setNote] = useState('');
  const [asked, setAsked] = useState(false);
  const isDamage = reason === 'stopped-damage-seen';
  const noteMissing = isDamage && note.trim() === '';
  const say = () => {
    if (reason && !noteMissing) onSaid(reason, note.trim());
    else setAsked(true);
  };
  return (
    <Question
      open={open}
      onClose={onClose}
      title={`${label}: why is it not taken?`}
      actions={
        <>
          <Button tone="action" height="table" onClick={say}>
            Keep the reason
          </Button>
          <Button height="table" onClick={onClose}>
            Back to the sheet
          </Button>
        </>
      }
    >
      <fieldset aria-describedby={asked && !reason ? 'reason-missing' : undefined}>
        <legend className="sr-only">Reason</legend>
        {notTakenReasonIds.map((id) => (
          <label key={id} className="flex min-h-11 items-center gap-3">
            <input
              type="radio"
              name="not-taken"
              value={id}
              checked={reason === id}
              onChange={() => setReason(id)}
              className="size-6 shrink-0 accent-indigo"
            />
            {notTakenReasons[id]}
          </label>
        ))}
        {asked && !reason && <FieldError id="reason-missing">Choose the reason that fits best.</FieldError>}
      </fieldset>
      {isDamage && (
        <p className="border-l-4 border-madder bg-madder-tint p-3">
          Stop here and leave it as it lies. The curators are told as soon as this is sent; follow your own
          museum’s rules, and let a conservator look before anybody goes on.
        </p>
      )}
      <TextField
        id="not-taken-note"
        optional={!isDamage}
        label={isDamage ? 'What was seen, and where' : 'Note'}
        error={asked && noteMissing ? 'Say what was seen, and where.' : undefined}
        value={note}
        maxLength={500}
        onChange={(event) => setNote(event.target.value)}
      />
    </Question>
  );
}
