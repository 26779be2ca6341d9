import { Menu, MenuButton, MenuItem, MenuItems } from '@headlessui/react';
import { useState } from 'react';
import { spreadOf, type SheetRow } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { NotTakenQuestion } from './not-taken-question.js';
import { rowLabel } from './reading-row.js';

/** What else can be done with a point: to say why it is not taken, or to read it once more. */
export function RowMenu({ desk, row }: { readonly desk: SheetDesk; readonly row: SheetRow }) {
  const [asking, setAsking] = useState(false);
  const again = !row.covered && row.reading !== null && row.reading.reason === null && isLastRound(desk, row);
  const apart = spreadOf(desk.rows, row.point.id);
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
          <MenuItem>
            <button
              type="button"
              onClick={() => setAsking(true)}
              className="block min-h-12 w-full px-4 text-left text-table data-focus:bg-indigo-tint"
            >
              Cannot be taken
            </button>
          </MenuItem>
          <MenuItem disabled={!again}>
            <button
              type="button"
              onClick={() => desk.readAgain(row.point.id)}
              className="block min-h-12 w-full px-4 text-left text-table data-disabled:text-ink-3 data-focus:bg-indigo-tint"
            >
              {apart ? 'Read once more' : 'Read a second time, blind'}
            </button>
          </MenuItem>
        </MenuItems>
      </Menu>
      <NotTakenQuestion
        open={asking}
        label={rowLabel(row)}
        onClose={() => setAsking(false)}
        onSaid={(reason, note) => {
          setAsking(false);
          desk.setAside(row, reason, note);
        }}
      />
    </>
  );
}

const isLastRound = (desk: SheetDesk, row: SheetRow): boolean =>
  !desk.rows.some(({ point, round }) => point.id === row.point.id && round > row.round);
