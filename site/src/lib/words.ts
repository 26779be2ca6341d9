import { isGarmentKind, kindLabels } from '@ellwand/shared/points/kinds';

export { isGarmentKind as isKind } from '@ellwand/shared/points/kinds';

/** "Dress", "Gloves"; a set of garments is a kind of its own, and an unknown id stands for itself. */
export function kindName(kind: string): string {
  if (isGarmentKind(kind)) return kindLabels[kind].singular;
  return kind === 'set' ? 'Set' : kind;
}

/** "Dresses", for headings and lists. */
export function kindsName(kind: string): string {
  if (isGarmentKind(kind)) return kindLabels[kind].plural;
  return kind === 'set' ? 'Sets' : kind;
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** "1 garment", "24 garments". */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${count.toLocaleString('en-GB')} ${count === 1 ? one : many}`;
}

const dayFormat = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});

/** "14 March 2026", from a calendar day or a moment in UTC. */
export function dayText(iso: string): string {
  return dayFormat.format(new Date(iso.length === 10 ? `${iso}T00:00:00Z` : iso));
}
