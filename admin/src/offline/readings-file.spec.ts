import { describe, expect, it } from 'vitest';
import { newId } from '../lib/ids.js';
import { MemoryStore } from './memory-store.js';
import type { Operation } from './operation.js';
import { bringIn, crc32, readingsFile, readReadingsFile } from './readings-file.js';

const note = (text: string): Operation => {
  const id = newId();
  const carried = { id, device: 'Tablet 1', saidAt: '2026-12-01T09:00:00.000Z' };
  return {
    ...{ id, sheetId: newId(), by: newId(), byName: 'Odile Marsh', state: 'waiting' },
    kind: 'note',
    note: { ...carried, about: 'described', thing: 'label', text },
  };
};
const now = new Date('2026-12-01T09:30:00.000Z');
const draft = { sheetId: newId(), row: 'hip:1', draft: { text: '98', unit: 'mm', count: '', level: null } };
const file = (operations: readonly Operation[]) =>
  readingsFile(operations, [draft], { device: 'Tablet 1', now });

describe('readings in a file', () => {
  it('come back as they were, with what was only typed', async () => {
    const operations = [note('Woven: Verrault, Larkmoor'), note('Zwölf Häkchen, “gold”')];
    const { name, text } = file(operations);
    expect(name).toBe('readings-2026-12-01-09-30.json');
    const read = readReadingsFile(text);
    if (!read.ok) throw new Error(read.sentence);
    const store = new MemoryStore();
    expect(await bringIn(store, read.content)).toEqual({ added: 2, alreadyHere: 0 });
    expect((await store.operations()).map(({ operation }) => operation)).toEqual(operations);
    expect(await store.drafts()).toEqual([draft]);
  });

  it('are brought in once, and never over what was typed here', async () => {
    const operations = [note('Woven')];
    const store = new MemoryStore();
    await store.append({ operation: operations[0]! });
    const key = `${draft.sheetId} ${draft.row}`;
    await store.setDraft(key, { ...draft, draft: { text: '980' } });
    const read = readReadingsFile(file(operations).text);
    if (!read.ok) throw new Error(read.sentence);
    expect(await bringIn(store, read.content)).toEqual({ added: 0, alreadyHere: 1 });
    expect(await store.drafts()).toEqual([{ ...draft, draft: { text: '980' } }]);
  });

  it.each([
    ['a file cut short', (text: string) => text.slice(0, -20), /not whole/],
    ['a changed figure', (text: string) => text.replace('"98"', '"89"'), /changed after it was saved/],
    ['another format', (text: string) => text.replace('ellwand-readings-1', 'other'), /no file of readings/],
    ['something else', () => '[1, 2]', /no file of readings/],
    ['a lost field', (text: string) => text.replace('"sheetId"', '"sheet"'), /cannot be read, at content/],
  ])('are refused with a sentence: %s', (_name, spoil, sentence) => {
    const read = readReadingsFile(spoil(file([note('Woven')]).text));
    expect(read.ok ? '' : read.sentence).toMatch(sentence);
  });

  it('carry a checksum as others reckon it', () => {
    // The check value of CRC-32 (ISO 3309), as the catalogue of CRC algorithms gives it for "123456789".
    expect(crc32('123456789')).toBe('cbf43926');
  });
});
