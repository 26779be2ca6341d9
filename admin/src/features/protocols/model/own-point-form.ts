import { isPointGroup } from '@ellwand/shared/points/groups';
import { ownPointIdFor } from '@ellwand/shared/protocols/own-point-id';
import { prose } from '@ellwand/shared/records/common';
import { OwnPointView } from '@ellwand/shared/records/protocol';
import { toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';
import { z } from 'zod';
import { MOST_PLACES } from './line-edits.js';

/** A length as it is typed, in millimetres; empty for nothing. The answer is the millimetres as they travel. */
const TypedMm = z.string().transform((text, context): string | null => {
  if (text.trim() === '') return null;
  const typed = fromTyped({ text, unit: 'mm' });
  if (typed.ok) return toMmString(typed.value.length);
  context.addIssue({ code: 'custom', message: 'Write whole millimetres, for example 450' });
  return z.NEVER;
});

const facts = OwnPointView.shape;

/** Nothing in a box is told by what the box is for; anything else by the contract's own words. */
const written = (contract: z.ZodType<string, string>, missing: string) =>
  z
    .string()
    .refine((text) => text.trim() !== '', { error: missing, abort: true })
    .pipe(contract);

/** The form of an own point: as it travels, but for an id that is made from the name, and the range in two boxes. */
export const OwnPointForm = z
  .object({
    name: written(facts.name, 'Write its name'),
    group: z.string().refine(isPointGroup, 'Choose what the public searches it with'),
    definition: written(facts.definition, 'Write its definition'),
    from: written(facts.from, 'Write where the tape begins'),
    to: written(facts.to, 'Write where it ends'),
    side: facts.side,
    how: facts.how,
    handlingStep: facts.handlingStep,
    rangeFrom: TypedMm,
    rangeTo: TypedMm,
    watchFor: prose(400),
    takesTapeLengths: z.boolean(),
    levelRecorded: z.boolean(),
    paired: z.boolean(),
    line: z.object({
      view: facts.line.shape.view,
      along: z
        .array(facts.line.shape.along.element)
        .min(2, 'Draw the line: at least where it begins and where it ends')
        .max(MOST_PLACES),
    }),
  })
  .superRefine(({ rangeFrom, rangeTo }, context) => {
    if ((rangeFrom === null) === (rangeTo === null)) return;
    const path = [rangeFrom === null ? 'rangeFrom' : 'rangeTo'];
    context.addIssue({ code: 'custom', path, message: 'Write both ends of the range, or neither' });
  });
export type OwnPointTyped = z.input<typeof OwnPointForm>;
export type OwnPointRead = z.output<typeof OwnPointForm>;

/** What the form begins with: the point as it is, or an empty one with a view to draw on. */
export function typedFrom(own: OwnPointView | null, view: OwnPointView['line']['view']): OwnPointTyped {
  if (!own) return { ...emptyPoint, line: { view, along: [] } };
  const { name, group, definition, from, to, side, how, handlingStep, range, watchFor } = own;
  const { takesTapeLengths, levelRecorded, paired, line: drawn } = own;
  return {
    ...{ name, group, definition, from, to, side, how, handlingStep, watchFor },
    ...{ takesTapeLengths, levelRecorded, paired, line: drawn },
    rangeFrom: range?.fromMm ?? '',
    rangeTo: range?.toMm ?? '',
  };
}

const emptyPoint = {
  name: '',
  group: '',
  definition: '',
  from: '',
  to: '',
  side: 'inside',
  how: 'straight',
  handlingStep: 'opened-inside',
  rangeFrom: '',
  rangeTo: '',
  watchFor: '',
  takesTapeLengths: false,
  levelRecorded: false,
  paired: false,
} as const;

/** The point as it travels. @param taken ids that others have */
export function ownPointFrom(
  { rangeFrom, rangeTo, ...rest }: OwnPointRead,
  id: string | null,
  taken: readonly string[],
): OwnPointView {
  const range = rangeFrom !== null && rangeTo !== null ? { fromMm: rangeFrom, toMm: rangeTo } : null;
  return OwnPointView.parse({ ...rest, range, id: id ?? ownPointIdFor(rest.name, taken) });
}

/** The boxes that an own point's faults belong to, by the pointer's last part. */
export function boxOf(pointer: string): 'rangeTo' | 'name' | 'line.along' | null {
  const part = /^\/ownPoints\/\d+\/(\w+)/.exec(pointer)?.[1];
  if (part === 'range') return 'rangeTo';
  if (part === 'line') return 'line.along';
  return part === 'name' || part === 'id' ? 'name' : null;
}
