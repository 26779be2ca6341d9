import { Fragment, type ReactNode, useState } from 'react';
import { type FieldArray, type FieldArrayPath, useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { rowWords } from '../model/box-words.js';
import type { TypedSheet } from '../model/typed-sheet.js';

type ListName = FieldArrayPath<TypedSheet>;

interface RowListProps<N extends ListName> {
  readonly name: N;
  /** "piece", "dart": what one row is called in the buttons. */
  readonly one: string;
  readonly blank: () => FieldArray<TypedSheet, N>;
  /** What is said while there is no row. */
  readonly empty: string;
  readonly children: (index: number) => ReactNode;
}

/** Rows that are added below and taken away each by itself; what was taken away can be put back at its place. */
export function RowList<N extends ListName>({ name, one, blank, empty, children }: RowListProps<N>) {
  const { control, getValues } = useFormContext<TypedSheet>();
  const rows = useFieldArray({ control, name });
  const [taken, setTaken] = useState<{ row: FieldArray<TypedSheet, N>; at: number } | null>(null);
  const word = rowWords[name.split('.').at(-1) ?? ''] ?? one;

  const remove = (at: number) => {
    const list = getValues(name) as FieldArray<TypedSheet, N>[];
    const row = list[at];
    if (row) setTaken({ row: structuredClone(row), at });
    rows.remove(at);
  };
  const putBack = () => {
    if (taken) rows.insert(taken.at, taken.row);
    setTaken(null);
  };
  const undo = taken && (
    <li className="flex flex-wrap items-center gap-2 border-l-4 border-rule pl-3 text-table text-ink-2">
      <span role="status">
        {word} {taken.at + 1} removed.
      </span>
      {/* The button that was pressed is gone: the focus goes to the one that undoes it. */}
      <Button autoFocus height="dense" tone="quiet" className="px-2" onClick={putBack}>
        Put it back
      </Button>
    </li>
  );
  return (
    <div>
      {rows.fields.length === 0 && <p className="text-table text-ink-3">{empty}</p>}
      <ul className="space-y-4">
        {rows.fields.map((field, index) => (
          <Fragment key={field.id}>
            {taken?.at === index && undo}
            <li className="rounded-sm border border-hair bg-sheet p-4">
              <div className="mb-2 flex items-center justify-between gap-3">
                <p className="text-label font-medium text-ink-3">
                  {word} {index + 1}
                </p>
                <Button height="dense" tone="quiet" className="-mr-2 px-2" onClick={() => remove(index)}>
                  Remove{' '}
                  <span className="sr-only">
                    {one} {index + 1}
                  </span>
                </Button>
              </div>
              {children(index)}
            </li>
          </Fragment>
        ))}
        {taken && taken.at >= rows.fields.length && undo}
      </ul>
      <Button
        className="mt-3"
        onClick={() => {
          setTaken(null);
          rows.append(blank());
        }}
      >
        Add a {one}
      </Button>
    </div>
  );
}
