/** What a museum's own measuring point must be: told apart from every other, and drawn on the garment. */
import { kindLabels } from '../points/kinds.js';
import { isPointId } from '../points/measuring-points.js';
import { isLonger } from '../units/length.js';
import { askablePoints, type OwnPoint, type Protocol } from './protocol.js';
import type { ProtocolFault } from './protocol-fault.js';
import { viewBounds, viewsOf } from './view-bounds.js';

/** @param made see `protocolFaults` */
export function ownPointFaults(draft: Protocol, index: number, made: readonly Protocol[]): ProtocolFault[] {
  const point = draft.ownPoints[index];
  if (!point) return [];
  const found = [
    ...idFaults(draft, point, index),
    ...nameFaults(draft, point, index),
    ...meaningFaults(point, made),
    ...rangeFaults(point),
    ...lineFaults(draft, point),
  ];
  return found.map(({ pointer, detail }) => ({ pointer: `/ownPoints/${index}${pointer}`, detail }));
}

function idFaults(draft: Protocol, { id, name }: OwnPoint, index: number): ProtocolFault[] {
  const pointer = '/id';
  if (isPointId(id)) {
    return [{ pointer, detail: `“${id}” is a point of the catalogue: an own point needs an id of its own.` }];
  }
  if (draft.ownPoints.findIndex((other) => other.id === id) < index) {
    return [{ pointer, detail: `Two own points have the id “${id}”.` }];
  }
  if (draft.points.some(({ pointId }) => pointId === id)) return [];
  return [{ pointer, detail: `“${name}” is made here, but asked for nowhere.` }];
}

/** Two rows of one name cannot be told apart at the table. */
function nameFaults(draft: Protocol, { name }: OwnPoint, index: number): ProtocolFault[] {
  const sameName = (other: { readonly name: string }) => other.name.toLowerCase() === name.toLowerCase();
  const pointer = '/name';
  if (askablePoints(draft).some(sameName)) {
    return [{ pointer, detail: `The catalogue has a point called “${name}”: give yours another name.` }];
  }
  if (draft.ownPoints.findIndex(sameName) === index) return [];
  return [{ pointer, detail: `Two own points are called “${name}”.` }];
}

/** What makes a reading comparable with another. Line, usual range and advice may be bettered. */
const meaning = {
  name: 'name',
  group: 'group',
  definition: 'definition',
  from: 'where it begins',
  to: 'where it ends',
  side: 'side',
  how: 'how the tape goes',
  handlingStep: 'handling step',
  takesTapeLengths: 'tape lengths',
  levelRecorded: 'level',
  paired: 'left and right',
} as const satisfies Partial<Record<keyof OwnPoint, string>>;
const meaningKeys = Object.keys(meaning) as (keyof typeof meaning)[];

/** Which facts of an own point's meaning two definitions disagree on, in words. */
export function differingMeaning(one: OwnPoint, other: OwnPoint): readonly string[] {
  return meaningKeys.filter((key) => one[key] !== other[key]).map((key) => meaning[key]);
}

function meaningFaults(point: OwnPoint, made: readonly Protocol[]): ProtocolFault[] {
  for (const earlier of made) {
    const before = earlier.ownPoints.find(({ id }) => id === point.id);
    const differing = before ? differingMeaning(before, point) : [];
    if (differing.length === 0) continue;
    const detail =
      `“${before?.name}” was made in version ${earlier.version} of the protocol for ` +
      `${kindLabels[earlier.kind].plural.toLowerCase()} and keeps its meaning. Different here: ` +
      `${differing.join(', ')}. Make a new point instead.`;
    return [{ pointer: '/id', detail }];
  }
  return [];
}

function rangeFaults({ softRange }: OwnPoint): ProtocolFault[] {
  if (isLonger(softRange.to, softRange.from)) return [];
  return [{ pointer: '/range', detail: 'The usual range ends where it begins, or before.' }];
}

function lineFaults(draft: Protocol, { line }: OwnPoint): ProtocolFault[] {
  const bounds = viewBounds(draft.kind, line.view);
  if (!bounds) {
    const views = viewsOf(draft.kind).join(', ');
    return [{ pointer: '/line/view', detail: `The diagram has no view “${line.view}”; it has ${views}.` }];
  }
  const { left, right, top, bottom } = bounds;
  const outside = line.along.flatMap(([x, y], index): ProtocolFault[] => {
    if (x >= left && x <= right && y >= top && y <= bottom) return [];
    const detail =
      `Place ${index + 1} lies off the drawing, at ${x}, ${y} mm: across, it goes from ${left} to ${right} mm; ` +
      `down, from ${top} to ${bottom} mm.`;
    return [{ pointer: `/line/along/${index}`, detail }];
  });
  const standstill = line.along.findIndex(
    ([x, y], index) => index > 0 && line.along[index - 1]?.[0] === x && line.along[index - 1]?.[1] === y,
  );
  if (standstill > 0) {
    const detail = `Places ${standstill} and ${standstill + 1} are the same.`;
    outside.push({ pointer: `/line/along/${standstill}`, detail });
  }
  return outside;
}
