import type { Page } from '@playwright/test';

interface Asked {
  readonly path: string;
  readonly body: object;
}

/** Asks the API as the page's own scripts would, in the name of whoever is signed in there. */
async function ask<T>(page: Page, path: string, body: object): Promise<T> {
  return page.evaluate(
    async ({ path: address, body: sent }: Asked) => {
      const answer = await fetch(`/api/v1${address}`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify(sent),
      });
      const text = await answer.text();
      if (!answer.ok) throw new Error(`${address} answered ${answer.status}: ${text}`);
      return JSON.parse(text) as T;
    },
    { path, body },
  );
}

interface Made {
  readonly id: string;
  readonly parts: readonly { readonly id: string; readonly name: string }[];
}

/** A new dress of a bodice and a skirt, with an open sheet for each: their ids by the part's name. */
export async function newSheets(page: Page): Promise<Readonly<Record<string, string>>> {
  const ownNumber = `LH.2026.${Date.now()}`;
  const record = { ownNumber, title: 'Walking dress of brown wool', kind: 'dress', date: '1886~' };
  const garment = await ask<Made>(page, '/workroom/garments', {
    record: { ...record, creditLine: 'Larkmoor House Museum of Dress' },
    parts: [
      { kind: 'bodice', name: 'Bodice', suffix: '.1' },
      { kind: 'skirt', name: 'Skirt', suffix: '.2' },
    ],
  });
  const me = await page.evaluate(async () => {
    const answer = await fetch('/api/v1/session');
    return ((await answer.json()) as { user: { id: string } }).user.id;
  });
  const facts = {
    people: [{ userId: me, duty: 'read' }],
    aloneBecause: 'The other pair of hands is away today',
    measuredOn: new Date().toISOString().slice(0, 10),
    place: 'Textile room, long table',
    support: 'flat',
    tape: 'White tape, no. 2',
  };
  const opened: Record<string, string> = {};
  for (const { id, name } of garment.parts) {
    opened[name] = (await ask<{ id: string }>(page, `/workroom/parts/${id}/sheets`, { facts })).id;
  }
  return opened;
}
