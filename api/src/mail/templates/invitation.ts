import { type Role, roleLabels } from '@ellwand/shared/records/roles';
import type { Letter } from '../letter';
import { asMarkup, asText } from './plain-letter';

export interface InvitationFacts {
  readonly to: string;
  readonly name: string;
  readonly museum: string;
  readonly invitedBy: string;
  readonly roles: readonly Role[];
  /** Holds the secret behind `#`. */
  readonly link: string;
  readonly expiresAt: Date;
}

const list = new Intl.ListFormat('en-GB', { type: 'conjunction' });
const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** Asks somebody into the Workroom. */
export function invitationLetter(facts: InvitationFacts): Letter {
  const roles = list.format(facts.roles.map((role) => roleLabels[role].toLowerCase()));
  const parts = {
    greeting: `Dear ${facts.name},`,
    paragraphs: [`${facts.invitedBy} invites you to work in the catalogue of ${facts.museum}, as ${roles}.`],
    action: { label: 'Choose a password and begin', href: facts.link },
    after: [
      `The link is good once, until ${day.format(facts.expiresAt)}. It is meant for you alone: please do not pass it on.`,
      'If you did not expect this letter, you need do nothing.',
    ],
    sender: facts.museum,
  };
  return {
    to: facts.to,
    subject: `Your invitation to the Workroom: ${facts.museum}`,
    text: asText(parts),
    html: asMarkup(parts),
  };
}
