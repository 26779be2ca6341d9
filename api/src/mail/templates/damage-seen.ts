import type { Letter } from '../letter';
import { asMarkup, asText } from './plain-letter';

export interface DamageFacts {
  readonly to: string;
  readonly name: string;
  readonly museum: string;
  /** The part's number and name: "LH.1966.30.1, bodice". */
  readonly number: string;
  readonly part: string;
  /** Where measuring stopped, each with what was noted there. */
  readonly places: readonly { readonly point: string; readonly note: string }[];
  readonly readBy: string;
  readonly keyedBy: string;
  readonly at: Date;
  readonly link: string;
}

const moment = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone: 'UTC' });

/** Tells whoever cares for the garments that measuring was stopped because damage was seen. */
export function damageSeenLetter(facts: DamageFacts): Letter {
  const { to, name, museum, number, part, places, readBy, keyedBy, at, link } = facts;
  const keyed = keyedBy === readBy ? '' : ` ${keyedBy} wrote it down.`;
  const parts = {
    greeting: `Dear ${name},`,
    paragraphs: [
      `${readBy} stopped measuring ${number}, ${part}, because damage was seen.`,
      ...places.map(({ point, note }) => (note ? `${point}: ${note}` : `${point}. No note was made.`)),
    ],
    action: { label: 'Open the measuring sheet', href: link },
    after: [`Reported ${moment.format(at)} UTC.${keyed}`],
    sender: museum,
  };
  return {
    to,
    subject: `Damage seen on ${number}`,
    text: asText(parts),
    html: asMarkup(parts),
  };
}
