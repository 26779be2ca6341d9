import { Moment } from '@ellwand/shared/records/common';
import { z } from 'zod';
import type { KeptDraft } from './database.js';
import { Operation } from './operation.js';
import type { OfflineStore } from './store.js';

const FORMAT = 'ellwand-readings-1';

const Content = z.object({
  operations: z.array(Operation),
  drafts: z.array(z.object({ sheetId: z.string(), row: z.string(), draft: z.unknown() })),
});
type Content = z.infer<typeof Content>;

const ReadingsFile = z.object({
  format: z.literal(FORMAT),
  savedAt: Moment,
  device: z.string(),
  content: Content,
  /** CRC-32 of the content as it stands in the file: a file cut short is told from a whole one. */
  checksum: z.string(),
});

/** CRC-32 as in ISO 3309 and PNG, over UTF-8. */
export function crc32(text: string): string {
  let crc = 0xffffffff;
  for (const byte of new TextEncoder().encode(text)) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = crc & 1 ? (crc >>> 1) ^ 0xedb88320 : crc >>> 1;
  }
  return ((crc ^ 0xffffffff) >>> 0).toString(16).padStart(8, '0');
}

/** Everything keyed on this device that the museum has not got, as a file. Pictures stay: their bytes are not text. */
export function readingsFile(
  operations: readonly Operation[],
  drafts: readonly KeptDraft[],
  { device, now = new Date() }: { readonly device: string; readonly now?: Date },
): { readonly name: string; readonly text: string } {
  const content = {
    operations: operations.filter(({ kind }) => kind !== 'picture'),
    drafts: drafts.map(({ sheetId, row, draft }) => ({ sheetId, row, draft })),
  };
  const file = {
    format: FORMAT,
    savedAt: now.toISOString(),
    device,
    content,
    checksum: crc32(JSON.stringify(content)),
  };
  const stamp = now.toISOString().slice(0, 16).replaceAll(/[T:]/g, '-');
  return { name: `readings-${stamp}.json`, text: JSON.stringify(file, null, 1) };
}

export type ReadFile =
  { readonly ok: true; readonly content: Content } | { readonly ok: false; readonly sentence: string };

/** Reads such a file; or says in a sentence what is wrong with it. */
export function readReadingsFile(text: string): ReadFile {
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    return {
      ok: false,
      sentence: 'This file is not whole, or it is no file of readings: it cannot be read.',
    };
  }
  const raw = z.object({ format: z.string(), content: z.unknown() }).safeParse(json);
  if (!raw.success || raw.data.format !== FORMAT) {
    return { ok: false, sentence: `This is no file of readings: wanted the format ${FORMAT}.` };
  }
  const parsed = ReadingsFile.safeParse(json);
  if (!parsed.success) {
    const where = parsed.error.issues[0]?.path.join('/') ?? '';
    return { ok: false, sentence: `Something in this file cannot be read, at ${where}.` };
  }
  if (parsed.data.checksum !== crc32(JSON.stringify(raw.data.content))) {
    return { ok: false, sentence: 'This file was changed after it was saved, or it is damaged.' };
  }
  return { ok: true, content: parsed.data.content };
}

export interface BroughtIn {
  readonly added: number;
  readonly alreadyHere: number;
}

/** Brings a file's readings in. What is here already stays as it is; drafts never overwrite what was typed here. */
export async function bringIn(store: OfflineStore, { operations, drafts }: Content): Promise<BroughtIn> {
  const here = new Set((await store.operations()).map(({ operation }) => operation.id));
  const fresh = operations.filter(({ id }) => !here.has(id));
  for (const operation of fresh) await store.append({ operation });
  const typed = new Set((await store.drafts()).map(({ sheetId, row }) => `${sheetId} ${row}`));
  for (const draft of drafts) {
    const key = `${draft.sheetId} ${draft.row}`;
    if (!typed.has(key)) await store.setDraft(key, draft);
  }
  return { added: fresh.length, alreadyHere: operations.length - fresh.length };
}
