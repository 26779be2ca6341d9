import { markStepPx, pixelsPerMm, type PixelMark } from '@ellwand/shared/cut-sheet/pattern-scale';
import type { Image } from '@ellwand/shared/records/image';
import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { staffPicture } from '../../../config/paths.js';
import { blankRows } from '../model/blank-rows.js';
import {
  drawnWhileTyping,
  type MarkName,
  namedMarks,
  nextMark,
  pairReading,
  scaleWhileTyping,
} from '../model/marks.js';
import type { TypedSheet } from '../model/typed-sheet.js';
import { LengthBox, WordsBox } from './boxes.js';
import { MarkChoice } from './mark-choice.js';
import { MarkBoxes } from './mark-boxes.js';
import { PatternBoard } from './pattern-board.js';
import { RowList } from './row-list.js';

/** The picture with its marks at the left, scale and pairs at the right. */
export function PatternDesk({ image, disabled }: { readonly image: Image; readonly disabled: boolean }) {
  const { control, setValue } = useFormContext<TypedSheet>();
  const pattern = useWatch({ control, name: 'pattern' });
  const [asked, setAsked] = useState<MarkName>('marks.from');
  if (image.state !== 'ready' || image.widthPx === null || image.heightPx === null)
    return <p className="text-table text-ink-2">The picture is being made ready.</p>;

  const marks = namedMarks(pattern);
  const chosen = marks.some(({ name }) => name === asked) ? asked : 'marks.from';
  const size = { x: image.widthPx, y: image.heightPx };
  const move = (name: MarkName, { x, y }: PixelMark) =>
    setValue(`pattern.${name}`, { x: String(x), y: String(y) }, { shouldDirty: true });
  const tap = (at: PixelMark) => {
    move(chosen, at);
    setAsked(nextMark(marks, chosen));
  };
  return (
    <div className="grid gap-6 lg:grid-cols-[minmax(0,1fr)_24rem] lg:items-start">
      <div className="min-w-0 space-y-3">
        <MarkChoice marks={marks} chosen={chosen} disabled={disabled} onChoose={setAsked} />
        <PatternBoard
          src={staffPicture(image.id, Math.max(...image.widths))}
          alt={image.alt || 'The hand-drawn pattern'}
          size={size}
          marks={marks}
          chosen={chosen}
          disabled={disabled}
          onChoose={setAsked}
          onTap={tap}
          onMove={move}
        />
      </div>
      <PatternReadings stepPx={markStepPx(image)} onAdded={setAsked} />
    </div>
  );
}

function PatternReadings({
  stepPx,
  onAdded,
}: {
  readonly stepPx: number;
  readonly onAdded: (name: MarkName) => void;
}) {
  const { control } = useFormContext<TypedSheet>();
  const [unit, pattern] = useWatch({ control, name: ['unit', 'pattern'] });
  const scale = scaleWhileTyping(pattern, unit);
  const drawn = drawnWhileTyping(pattern, unit);
  const added = () => {
    onAdded(`pairs.${pattern.pairs.length}.from`);
    return blankRows.pairs();
  };
  return (
    <div className="space-y-5">
      <section aria-label="Scale" className="space-y-3">
        <p className="text-table font-semibold">Scale: mark A to mark B</p>
        <div className="grid grid-cols-2 items-end gap-4">
          <LengthBox name="pattern.distance" label="On the garment" />
          <LengthBox name="pattern.onPaper" label="On the paper" />
        </div>
        <MarkBoxes at="pattern.marks" letters={['A', 'B']} />
        <p role="status" className="figures text-table font-medium">
          {scale ? `1 mm = ${pixelsPerMm(scale)} px` : 'Set A and B and say how far apart they are.'}
          {drawn && `; drawn ${drawn}`}
        </p>
      </section>
      <section aria-label="Read off the pattern">
        <p className="mb-2 text-table font-semibold">Read off the pattern</p>
        <RowList name="pattern.pairs" one="pair of marks" blank={added} empty="Nothing read off it yet.">
          {(index) => {
            const pair = pattern.pairs[index];
            return (
              <div className="space-y-3">
                <WordsBox name={`pattern.pairs.${index}.name`} label="What" />
                <MarkBoxes at={`pattern.pairs.${index}`} letters={[`${index + 1}a`, `${index + 1}b`]} />
                <p role="status" className="figures text-value">
                  {(pair && pairReading(scale, pair.from, pair.to, stepPx)) ?? (
                    <span className="text-table text-ink-3">Not read yet</span>
                  )}
                </p>
              </div>
            );
          }}
        </RowList>
      </section>
    </div>
  );
}
