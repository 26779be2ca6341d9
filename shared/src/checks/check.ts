/**
 * A check: one rule about a measuring sheet, in one file, with its wording. It raises findings and never
 * throws; it says what it saw in figures and leaves the judgement to the people at the table.
 */
import type { PointId } from '../points/measuring-points.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { wornSides } from '../readings/worn-side.js';
import type { Finding, Severity } from './finding.js';
import { type Figures, findingOf } from './finding-text.js';
import type { SheetView } from './sheet-view.js';

export type Raise<Message extends string> = (message: Message, figures: Figures) => void;

interface CheckFacts<Message extends string> {
  readonly id: string;
  /** The name of its page. */
  readonly title: string;
  /** What it looks for, in one sentence. */
  readonly about: string;
  readonly severity: Severity | Readonly<Record<Message, Severity>>;
  /** Sentences with `{figure}` where a figure goes; the first letter is put in capitals. */
  readonly messages: Readonly<Record<Message, string>>;
}

export interface Check {
  readonly id: string;
  readonly title: string;
  readonly about: string;
  readonly messages: Readonly<Record<string, string>>;
  readonly severityOf: (message: string) => Severity;
  readonly run: (sheet: SheetView) => readonly Finding[];
}

/** A check that walks the sheet by itself. What it raises twice in the same words is said once. */
export function sheetCheck<const Message extends string>(
  facts: CheckFacts<Message> & { run: (sheet: SheetView, raise: Raise<Message>) => void },
): Check {
  const { id, title, about, messages } = facts;
  const severityFor = (message: Message): Severity =>
    typeof facts.severity === 'string' ? facts.severity : facts.severity[message];
  return {
    id,
    title,
    about,
    messages,
    severityOf: (message) => severityFor(message as Message),
    run: (sheet) => {
      const findings = new Map<string, Finding>();
      facts.run(sheet, (message, given) => {
        const said = {
          checkId: id,
          message,
          severity: severityFor(message),
          wording: messages[message],
          given,
        };
        const finding = findingOf(said, sheet.protocol);
        if (!findings.has(finding.key)) findings.set(finding.key, finding);
      });
      return [...findings.values()];
    },
  };
}

type Values = ReadonlyMap<string, AcceptedValue>;

/**
 * A check over named figures, each the first of its points that was read. It does not run while one of them
 * is missing. Where a point was read on both sides it runs for each: the left is never held against the right.
 */
export function check<const Message extends string, const Name extends string>(
  facts: CheckFacts<Message> & {
    needs: Readonly<Record<Name, readonly PointId[]>>;
    run: (figures: Readonly<Record<Name, AcceptedValue>>, raise: Raise<Message>) => void;
  },
): Check {
  const { needs, run, ...rest } = facts;
  const figuresIn = (values: Values): Readonly<Record<Name, AcceptedValue>> | undefined => {
    const found = Object.entries<readonly PointId[]>(needs).flatMap(([name, pointIds]) => {
      const accepted = pointIds.map((pointId) => values.get(pointId)).find((value) => value !== undefined);
      return accepted ? [[name, accepted] as const] : [];
    });
    if (found.length < Object.keys(needs).length) return undefined;
    return Object.fromEntries(found) as Record<Name, AcceptedValue>;
  };
  return sheetCheck<Message>({
    ...rest,
    run: ({ values, valuesOn }, raise) => {
      for (const source of [values, ...wornSides.map((side) => valuesOn[side])]) {
        const figures = figuresIn(source);
        if (figures && onOneSide(Object.values(figures))) run(figures, raise);
      }
    },
  });
}

function onOneSide(figures: readonly AcceptedValue[]): boolean {
  return new Set(figures.flatMap(({ worn }) => worn ?? [])).size < 2;
}
