import { Menu, MenuButton, MenuItem, MenuItems } from '@headlessui/react';
import { useRef, useState } from 'react';
import { today } from '../../../lib/moments.js';
import type { Again, SheetRow } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { NotTakenQuestion } from './not-taken-question.js';
import { rowLabel } from './row-label.js';

interface RowMenuProps {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  /** Whether the point may be read again here, and whether that settles two that lie apart. */
  readonly again: Again;
  readonly onGap: () => void;
}

/** What else can be done with a point. */
export function RowMenu({ desk, row, again, onGap }: RowMenuProps) {
  const [asking, setAsking] = useState(false);
  const camera = useRef<HTMLInputElement>(null);
  const { point, worn } = row;
  const isRound = point.point.how === 'round';
  const photograph = (file: File) =>
    void desk.outbox.photograph(
      { garmentId: desk.sheet.garmentId, view: 'tape', pointId: point.id, takenOn: today() },
      file,
    );
  return (
    <>
      <Menu as="div" className="relative">
        <MenuButton
          aria-label={`More for ${rowLabel(row)}`}
          className="grid size-12 place-items-center rounded-sm border border-rule bg-sheet text-ink hover:bg-well"
        >
          <svg viewBox="0 0 20 20" className="size-5 fill-current" aria-hidden="true">
            <circle cx="4" cy="10" r="1.6" />
            <circle cx="10" cy="10" r="1.6" />
            <circle cx="16" cy="10" r="1.6" />
          </svg>
        </MenuButton>
        {/* In its place and not over the page: the sheet stays there for everybody, also while a menu is open. */}
        <MenuItems
          modal={false}
          className="absolute top-full right-0 z-20 mt-1 w-max rounded-sm border border-rule bg-sheet py-1 shadow-dialog focus:outline-none"
        >
          <Choice onChoose={() => setAsking(true)}>Cannot be taken</Choice>
          <Choice disabled={again === 'no'} onChoose={() => desk.readAgain(row)}>
            {again === 'once-more' ? 'Read once more' : 'Read a second time, blind'}
          </Choice>
          {point.point.paired && worn === null && (
            <Choice onChoose={() => desk.tellSides(row)}>Tell left from right</Choice>
          )}
          {isRound && <Choice onChoose={onGap}>The tape crossed a gap</Choice>}
          {isRound && <Choice onChoose={() => desk.type(row, { doubled: true })}>Read flat, doubled</Choice>}
          <Choice onChoose={() => camera.current?.click()}>Photograph the tape here</Choice>
        </MenuItems>
      </Menu>
      <input
        ref={camera}
        type="file"
        accept="image/*"
        capture="environment"
        aria-label={`Picture of the tape at ${rowLabel(row)}`}
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          event.target.value = '';
          if (file) photograph(file);
        }}
      />
      <NotTakenQuestion
        open={asking}
        label={rowLabel(row)}
        onClose={() => setAsking(false)}
        onSaid={(reason, note) => {
          setAsking(false);
          desk.setAside(row, reason, note);
          if (reason === 'stopped-damage-seen') desk.setPausing(`Damage seen: ${note}`);
        }}
      />
    </>
  );
}

interface ChoiceProps {
  readonly disabled?: boolean;
  readonly onChoose: () => void;
  readonly children: string;
}

function Choice({ disabled = false, onChoose, children }: ChoiceProps) {
  return (
    <MenuItem disabled={disabled}>
      <button
        type="button"
        onClick={onChoose}
        className="block min-h-12 w-full px-4 text-left text-table data-disabled:text-ink-3 data-focus:bg-indigo-tint"
      >
        {children}
      </button>
    </MenuItem>
  );
}
