import type { SheetDesk } from '../model/use-sheet-desk.js';

const keys = ['7', '8', '9', '4', '5', '6', '1', '2', '3', '0', '.'] as const;
const look =
  'grid min-h-14 place-items-center rounded-sm border border-rule bg-sheet text-title-25 figures hover:bg-well active:bg-weld-tint';

/** Big keys for a gloved finger. They leave the focus in the row's box, where a keyboard would be. */
export function Keypad({ desk }: { readonly desk: SheetDesk }) {
  const row = desk.current;
  const draft = desk.draftOf(row);
  const field = desk.box === 'count' && row.point.point.takesTapeLengths ? 'count' : 'text';
  const put = (text: string) => desk.type(row, { [field]: text });
  const value = draft[field];
  const stay = (event: { preventDefault(): void }) => event.preventDefault();
  return (
    <div
      role="group"
      aria-label="Keypad"
      className="grid grid-cols-4 gap-2 border-t border-hair bg-well p-3"
      onPointerDown={stay}
      onMouseDown={stay}
    >
      <div className="col-span-3 grid grid-cols-3 gap-2">
        {keys.map((key) => (
          <button key={key} type="button" className={look} onClick={() => put(value + key)}>
            {key}
          </button>
        ))}
        <button
          type="button"
          aria-label="Delete the last figure"
          className={`${look} text-table`}
          onClick={() => put(value.slice(0, -1))}
        >
          Delete
        </button>
      </div>
      <div className="grid gap-2">
        {draft.unit === 'in' && field === 'text' ? (
          <>
            <button
              type="button"
              aria-label="Space"
              className={`${look} text-table`}
              onClick={() => put(`${value} `)}
            >
              Space
            </button>
            <button
              type="button"
              aria-label="Fraction stroke"
              className={look}
              onClick={() => put(`${value}/`)}
            >
              /
            </button>
          </>
        ) : (
          <button type="button" className={`${look} row-span-2 text-table`} onClick={() => put('')}>
            Clear
          </button>
        )}
        <button
          type="button"
          className="row-span-2 min-h-14 rounded-sm border border-indigo bg-indigo text-body font-medium text-on-indigo hover:bg-indigo-deep"
          onClick={() => (field === 'count' ? desk.go(row.key) : desk.next())}
        >
          Next
        </button>
      </div>
    </div>
  );
}
