/** What a version changed, in words, for the list of versions and before one is made. */
import { differingMeaning } from './own-point-rules.js';
import { type OwnPoint, pointIn, type Protocol, type ProtocolPoint, protocolPointIds } from './protocol.js';

/** One sentence for each change, in the order: asked, dropped, moved, changed, drawn. Empty where nothing differs. */
export function protocolChanges(before: Protocol, after: Protocol): readonly string[] {
  return [
    ...after.points.filter(missingFrom(before)).map((point) => asked(after, point)),
    ...before.points.filter(missingFrom(after)).map(({ pointId }) => `${named(before, pointId)} dropped.`),
    ...moves(before, after),
    ...after.points.flatMap((point) => asking(before, after, point)),
    ...after.ownPoints.flatMap((point) => redefined(before, point)),
  ];
}

const missingFrom =
  (protocol: Protocol) =>
  ({ pointId }: ProtocolPoint): boolean =>
    !protocolPointIds(protocol).includes(pointId);

const named = (protocol: Protocol, pointId: string): string =>
  `“${pointIn(protocol, pointId)?.name ?? pointId}”`;

function asked(after: Protocol, { pointId, required, rounds }: ProtocolPoint): string {
  const isOwn = after.ownPoints.some(({ id }) => id === pointId);
  const name = `${isOwn ? 'Own point ' : ''}${named(after, pointId)}`;
  return `${name} asked for, ${required ? 'required' : 'may be left out'}${rounds > 1 ? `, ${rounds} rounds` : ''}.`;
}

/** The fewest points whose moving explains the new order: those outside the longest run that kept its order. */
function moves(before: Protocol, after: Protocol): string[] {
  const order = protocolPointIds(before);
  const ids = protocolPointIds(after);
  const shared = ids.filter((id) => order.includes(id));
  const kept = new Set(longestRising(shared.map((id) => order.indexOf(id))).map((at) => shared[at]));
  return ids.flatMap((id, index) => {
    if (!shared.includes(id) || kept.has(id)) return [];
    const previous = ids[index - 1];
    return [
      `${named(after, id)} moved ${previous === undefined ? 'to the front' : `after ${named(after, previous)}`}.`,
    ];
  });
}

/** Places of a longest rising run within some numbers. */
function longestRising(numbers: readonly number[]): readonly number[] {
  const runs: (readonly number[])[] = [];
  numbers.forEach((number, place) => {
    const best = runs
      .filter((run) => (numbers[run.at(-1) ?? 0] ?? 0) < number)
      .reduce<readonly number[]>((longest, run) => (run.length > longest.length ? run : longest), []);
    runs.push([...best, place]);
  });
  return runs.reduce<readonly number[]>((longest, run) => (run.length > longest.length ? run : longest), []);
}

function asking(before: Protocol, after: Protocol, { pointId, required, rounds }: ProtocolPoint): string[] {
  const was = before.points.find((point) => point.pointId === pointId);
  if (!was) return [];
  const name = named(after, pointId);
  return [
    ...(was.required === required ? [] : [`${name} ${required ? 'required now' : 'may be left out now'}.`]),
    ...(was.rounds === rounds
      ? []
      : [`${name} read in ${rounds} ${rounds === 1 ? 'round' : 'rounds'}, not ${was.rounds}.`]),
  ];
}

function redefined(before: Protocol, point: OwnPoint): string[] {
  const was = before.ownPoints.find(({ id }) => id === point.id);
  if (!was) return [];
  const { line, softRange, watchFor } = point;
  const differing = differingMeaning(was, point);
  return [
    ...(differing.length > 0 ? [`“${point.name}”: ${differing.join(', ')} changed.`] : []),
    ...(JSON.stringify(was.line) === JSON.stringify(line) ? [] : [`Line of “${point.name}” drawn anew.`]),
    ...(was.softRange.from === softRange.from && was.softRange.to === softRange.to
      ? []
      : [`Usual range of “${point.name}” changed.`]),
    ...(was.watchFor === watchFor ? [] : [`What to watch for at “${point.name}” changed.`]),
  ];
}
