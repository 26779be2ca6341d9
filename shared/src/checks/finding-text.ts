/** From a check's wording and its figures to a finding: the sentence, the key that an answer holds to, the points named. */
import { type Protocol, pointIn } from '../protocols/protocol.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { type WornSide, wornSideLabels } from '../readings/worn-side.js';
import { readMm } from '../units/format-length.js';
import { type Length, toMmString } from '../units/length.js';
import type { Finding, Severity } from './finding.js';

/** A point that is named in the sentence; `{point}` becomes its name. */
export interface Mention {
  readonly mentioned: string;
  /** Where it is a matter of one side of a pair, which. */
  readonly worn?: WornSide;
}

/** Several points in one place of the sentence, with their values where they have any. */
export interface Listed {
  readonly listed: readonly (AcceptedValue | Mention)[];
}

/** What is neither a point nor a length: a count, digits as they were keyed. */
export interface Words {
  readonly text: string;
  /** Said, but not what the finding is about: an answer holds when it changes. */
  readonly inPassing?: boolean;
}

/** What goes into a sentence: a point's value, the name of a point, a length that belongs to neither, or words. */
export type Figure = AcceptedValue | Mention | Listed | Words | Length;

export type Figures = Readonly<Record<string, Figure>>;

/** Whose points may be named. */
export type Naming = Pick<Protocol, 'ownPoints'>;

interface Said {
  readonly checkId: string;
  readonly message: string;
  readonly severity: Severity;
  readonly wording: string;
  readonly given: Figures;
}

/** An answer is kept beside its key, in a column of this width. */
const LONGEST_KEY = 200;

export function findingOf({ checkId, message, severity, wording, given }: Said, naming: Naming): Finding {
  const parts = Object.entries(given).flatMap(([name, figure]) => partsOf(name, figure));
  const points = [...new Set(parts.flatMap(({ point }) => point ?? []))];
  const lengths = parts.flatMap(({ name, length }) =>
    length === undefined ? [] : [[name, length] as const],
  );
  const texts = parts.flatMap(({ text }) => text ?? []);
  const figures = lengths.map(([, length]) => toMmString(length));
  return {
    key: shortened([checkId, message, ...points, ...figures, ...texts].join(':')),
    checkId,
    severity,
    sentence: sentenceOf(wording, given, naming),
    pointIds: [...new Set(parts.flatMap(({ pointId }) => pointId ?? []))],
    figures: Object.fromEntries(lengths),
  };
}

interface Part {
  readonly name: string;
  readonly pointId?: string;
  /** The point as the key names it: with its side, for left and right may have the same figures. */
  readonly point?: string;
  readonly length?: Length;
  readonly text?: string;
}

function partsOf(name: string, figure: Figure): readonly Part[] {
  if (typeof figure === 'number') return [{ name, length: figure }];
  if ('text' in figure) return figure.inPassing ? [] : [{ name, text: figure.text }];
  if ('listed' in figure) return figure.listed.flatMap((one, index) => partsOf(`${name}${index + 1}`, one));
  const pointId = 'mentioned' in figure ? figure.mentioned : figure.pointId;
  const point = figure.worn ? `${pointId}@${figure.worn}` : pointId;
  return [{ name, pointId, point, ...('mentioned' in figure ? {} : { length: figure.value }) }];
}

function sentenceOf(wording: string, given: Figures, naming: Naming): string {
  const side = sideOf(given);
  const begun = side ? `${wornSideLabels[side]}: ${lowerFirst(wording)}` : wording;
  const filled = begun.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const figure = given[name];
    return figure === undefined ? whole : textOf(figure, naming);
  });
  return filled.charAt(0).toUpperCase() + filled.slice(1);
}

/** The one side that the values were read on, where no name in the sentence says it. */
function sideOf(given: Figures): WornSide | undefined {
  const figures = Object.values(given).filter((figure) => typeof figure !== 'number');
  if (figures.some((figure) => 'mentioned' in figure && figure.worn)) return undefined;
  const sides = new Set(figures.flatMap((figure) => ('pointId' in figure && figure.worn) || []));
  return sides.size === 1 ? [...sides][0] : undefined;
}

function lowerFirst(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}

function textOf(figure: Figure, naming: Naming): string {
  if (typeof figure === 'number') return readMm(figure);
  if ('text' in figure) return figure.text;
  if ('listed' in figure) return inWords(figure.listed.map((one) => listedText(one, naming)));
  return 'mentioned' in figure ? mentionText(figure, naming) : readMm(figure.value);
}

function listedText(figure: AcceptedValue | Mention, naming: Naming): string {
  if ('mentioned' in figure) return mentionText(figure, naming);
  const { pointId: mentioned, worn, value } = figure;
  return `${mentionText(worn ? { mentioned, worn } : { mentioned }, naming)} (${readMm(value)})`;
}

function mentionText({ mentioned, worn }: Mention, naming: Naming): string {
  const name = nameOf(mentioned, naming);
  return worn ? `${worn} ${name}` : name;
}

/** The point's name for the middle of a sentence; its id where nothing knows it. */
export function nameOf(pointId: string, naming: Naming): string {
  const name = pointIn(naming, pointId)?.name;
  return name === undefined ? pointId : lowerFirst(name);
}

function inWords(parts: readonly string[]): string {
  const last = parts.at(-1) ?? '';
  return parts.length < 2 ? last : `${parts.slice(0, -1).join(', ')} and ${last}`;
}

/** A key that would not fit ends in a fingerprint of the whole (FNV-1a, 64 bit). */
function shortened(key: string): string {
  if (key.length <= LONGEST_KEY) return key;
  let hash = 0xcbf29ce484222325n;
  for (const character of key) {
    hash = BigInt.asUintN(64, (hash ^ BigInt(character.codePointAt(0) ?? 0)) * 0x100000001b3n);
  }
  const mark = `:${hash.toString(16).padStart(16, '0')}`;
  return `${key.slice(0, LONGEST_KEY - mark.length)}${mark}`;
}
