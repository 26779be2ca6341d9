import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { FieldError, TextField } from '../../../components/ui/field.js';
import { colleaguesQuery } from '../api/colleagues.js';
import { type Hands, holderOf, readerOf } from '../model/hands.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { PeopleChoice } from './people-choice.js';

function handsWords(hands: Hands, nameOf: (userId: string) => string): string {
  const reader = readerOf(hands);
  const holder = holderOf(hands);
  const wrote = hands.people.find(({ duty, userId }) => duty === 'wrote' && userId !== reader)?.userId;
  if (!reader) return 'Nobody is named yet';
  return [
    `${nameOf(reader)} reads`,
    holder ? `${nameOf(holder)} holds` : `alone: ${hands.aloneBecause || 'no reason given'}`,
    ...(wrote ? [`${nameOf(wrote)} writes`] : []),
  ].join(', ');
}

/** Whose hands are at the garment just now, and the way to say that others take over. */
export function HandsBar({ desk }: { readonly desk: SheetDesk }) {
  const [open, setOpen] = useState(false);
  const words = handsWords(desk.hands.now, desk.hands.nameOf);
  if (desk.locked) return <p className="text-label text-ink-2">{words}</p>;
  return (
    <div className="flex flex-wrap items-center gap-x-2 text-label text-ink-2">
      <span>{words}</span>
      <button
        type="button"
        onClick={() => setOpen(true)}
        className="min-h-11 text-label text-indigo underline underline-offset-2 sm:min-h-8"
      >
        Change hands
      </button>
      {open && <HandsQuestion desk={desk} onClose={() => setOpen(false)} />}
    </div>
  );
}

function mistakeIn(hands: Hands): string | null {
  if (!readerOf(hands)) return 'Say who reads the tape.';
  if (!holderOf(hands) && hands.aloneBecause.trim() === '')
    return 'Say who holds the tape, or why one person measures alone.';
  return null;
}

function HandsQuestion({ desk, onClose }: { readonly desk: SheetDesk; readonly onClose: () => void }) {
  const colleagues = useQuery(colleaguesQuery);
  const [hands, setHands] = useState<Hands>(desk.hands.now);
  const [tried, setTried] = useState(false);
  const mistake = tried ? mistakeIn(hands) : null;
  const keep = () => {
    setTried(true);
    if (mistakeIn(hands)) return;
    desk.hands.change(hands);
    onClose();
  };
  return (
    <Question
      open
      onClose={onClose}
      title="Whose hands are at it now?"
      actions={
        <>
          <Button tone="action" height="table" onClick={keep}>
            From now on
          </Button>
          <Button height="table" onClick={onClose}>
            Back to the sheet
          </Button>
        </>
      }
    >
      <PeopleChoice
        id="hands"
        colleagues={colleagues.data ?? []}
        people={hands.people}
        onChange={(people) => setHands({ ...hands, people: [...people] })}
      />
      <TextField
        id="hands-alone"
        optional
        label="Why one person measures alone"
        value={hands.aloneBecause}
        maxLength={500}
        onChange={(event) => setHands({ ...hands, aloneBecause: event.target.value })}
      />
      {mistake && <FieldError id="hands-mistake">{mistake}</FieldError>}
    </Question>
  );
}
