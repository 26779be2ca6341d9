import { setTimeout as wait } from 'node:timers/promises';

export interface Person {
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

export const reader: Person = {
  name: 'Odile Marsh',
  email: 'odile.marsh@larkmoor.example',
  password: 'oyster thimble lantern',
};
const administrator: Person = {
  name: 'Tamsin Hale',
  email: 'tamsin.hale@larkmoor.example',
  password: 'copper bobbin weather',
};

/** A conversation with the API, with the cookies of whoever signed in. */
class Caller {
  private cookies = '';

  constructor(private readonly url: string) {}

  async post(path: string, body: object): Promise<Record<string, unknown>> {
    const answer = await fetch(`${this.url}/api/v1${path}`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', Origin: this.url, Cookie: this.cookies },
      body: JSON.stringify(body),
    });
    const given = answer.headers.getSetCookie().map((cookie) => cookie.split(';')[0] ?? '');
    if (given.length > 0) this.cookies = given.join('; ');
    const text = await answer.text();
    if (!answer.ok) throw new Error(`POST ${path} answered ${answer.status}: ${text}`);
    return text ? (JSON.parse(text) as Record<string, unknown>) : {};
  }
}

/** The newest letter's link, as the mail drop shows it. */
async function invitationToken(inboxUrl: string): Promise<string> {
  for (let attempt = 0; attempt < 100; attempt++) {
    const list = await (await fetch(inboxUrl)).text();
    for (const [, href] of list.matchAll(/href="([^"]+)"/g)) {
      const letter = await (await fetch(new URL(href ?? '', inboxUrl))).text();
      const token = /invitation#([\w-]{43})/.exec(letter)?.[1];
      if (token) return token;
    }
    await wait(200);
  }
  throw new Error('No invitation came to the mail drop within 20 s');
}

export interface Table {
  readonly sheetId: string;
}

/** An empty house with its people, one dress of a bodice, and an open sheet. */
export async function layTheTable(
  url: string,
  { inboxUrl, firstAdministrator }: { readonly inboxUrl: string; readonly firstAdministrator: string },
): Promise<Table> {
  const first = new Caller(url);
  const token = /#([\w-]+)$/.exec(firstAdministrator)?.[1] ?? '';
  await first.post('/first-administrator', { token, ...administrator });
  const { name, email, password } = reader;
  await first.post('/workroom/invitations', { name, email, roles: ['recorder'] });
  const recorder = new Caller(url);
  const accepted = await recorder.post('/invitations/accept', {
    token: await invitationToken(inboxUrl),
    name,
    password,
  });
  const readerId = (accepted['user'] as { id: string }).id;
  const garment = await recorder.post('/workroom/garments', {
    record: {
      ownNumber: 'LH.2026.1',
      title: 'Day dress of grey wool',
      kind: 'dress',
      date: '1885~',
      creditLine: 'Larkmoor House',
    },
    parts: [{ kind: 'bodice', name: 'Bodice', suffix: '.1' }],
  });
  const [part] = garment['parts'] as { id: string }[];
  const sheet = await recorder.post(`/workroom/parts/${part?.id}/sheets`, {
    facts: {
      people: [{ userId: readerId, duty: 'read' }],
      aloneBecause: 'A drill without garments',
      measuredOn: new Date().toISOString().slice(0, 10),
      place: 'Textile room',
      support: 'flat',
      tape: 'Tape 3',
    },
  });
  return { sheetId: sheet['id'] as string };
}
