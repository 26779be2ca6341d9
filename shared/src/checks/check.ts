/**
 * A check: one rule about a measuring sheet, in one file, with its wording. It raises findings and never
 * throws; it says what it saw in figures and leaves the judgement to the people at the table.
 */
import { type PointId } from '../points/measuring-points.js';
import { type AcceptedValue } from '../readings/accepted-value.js';
import { decimalText } from '../units/format-length.js';
import { type Length, toMmString, UNITS_PER_MM } from '../units/length.js';
import { type Finding, type Severity } from './finding.js';
import { nameOf, type SheetView } from './sheet-view.js';

/** A point that is named in the sentence; `{point}` becomes its name. */
export interface Mention {
  readonly mentioned: string;
}

/** What goes into a sentence: a point's value, the name of a point, or a length that belongs to neither. */
export type Figure = AcceptedValue | Mention | Length;

export type Raise<Message extends string> = (
  message: Message,
  figures: Readonly<Record<string, Figure>>,
) => void;

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

/** A check that walks the sheet by itself. */
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
      const findings: Finding[] = [];
      facts.run(sheet, (message, figures) => {
        findings.push(finding(id, message, severityFor(message), messages[message], figures));
      });
      return findings;
    },
  };
}

/**
 * A check over named figures, each the first of its points that was read. It does not run while one of them
 * is missing.
 */
export function check<const Message extends string, const Name extends string>(
  facts: CheckFacts<Message> & {
    needs: Readonly<Record<Name, readonly PointId[]>>;
    run: (figures: Readonly<Record<Name, AcceptedValue>>, raise: Raise<Message>) => void;
  },
): Check {
  const { needs, run, ...rest } = facts;
  return sheetCheck<Message>({
    ...rest,
    run: ({ values }, raise) => {
      const found = Object.entries<readonly PointId[]>(needs).flatMap(([name, pointIds]) => {
        const pointId = pointIds.find((candidate) => values.has(candidate));
        const accepted = pointId && values.get(pointId);
        return accepted ? [[name, accepted] as const] : [];
      });
      if (found.length < Object.keys(needs).length) return;
      run(Object.fromEntries(found) as Record<Name, AcceptedValue>, raise);
    },
  });
}

function finding(
  checkId: string,
  message: string,
  severity: Severity,
  wording: string,
  given: Readonly<Record<string, Figure>>,
): Finding {
  const pointIds = [...new Set(Object.values(given).flatMap((figure) => pointOf(figure) ?? []))];
  const figures = Object.fromEntries(
    Object.entries(given).flatMap(([name, figure]) => {
      const length = lengthIn(figure);
      return length === undefined ? [] : [[name, length] as const];
    }),
  );
  return {
    key: [checkId, message, ...pointIds, ...Object.values(figures).map(toMmString)].join(':'),
    checkId,
    severity,
    sentence: fill(wording, given),
    pointIds,
    figures,
  };
}

function pointOf(figure: Figure): string | undefined {
  if (typeof figure === 'number') return undefined;
  return 'mentioned' in figure ? figure.mentioned : figure.pointId;
}

function lengthIn(figure: Figure): Length | undefined {
  if (typeof figure === 'number') return figure;
  return 'mentioned' in figure ? undefined : figure.value;
}

function fill(wording: string, given: Readonly<Record<string, Figure>>): string {
  const filled = wording.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const figure = given[name];
    return figure === undefined ? whole : figureText(figure);
  });
  return filled.charAt(0).toUpperCase() + filled.slice(1);
}

function figureText(figure: Figure): string {
  if (typeof figure === 'object' && 'mentioned' in figure) return nameOf(figure.mentioned);
  return lengthText(typeof figure === 'object' ? figure.value : figure);
}

/** Whole millimetres as they are read at the table; tenths where the length has them. */
export function lengthText(length: Length): string {
  return `${decimalText(length, 'mm', length % UNITS_PER_MM === 0 ? 0 : 1)} mm`;
}
