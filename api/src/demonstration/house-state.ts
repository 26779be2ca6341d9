import type { Work } from '../common/work';
import { SettingRow } from '../users/setting.entity';
import { UserRow } from '../users/user.entity';

const mark = 'demonstration';

export type HouseState = 'new' | 'unfinished' | 'filled' | 'in-use';

/** Whether the house is new, was left half filled by an interrupted start, is filled, or is somebody's own. */
export async function houseState({ reader }: Work): Promise<HouseState> {
  const setting = await reader.findOne(SettingRow, { where: { name: mark } });
  if (setting?.value === 'finished') return 'filled';
  if (setting?.value === 'begun') return 'unfinished';
  return (await reader.count(UserRow)) === 0 ? 'new' : 'in-use';
}

export async function markHouse(work: Work, value: 'begun' | 'finished', museum: string): Promise<void> {
  const rows = [
    { name: mark, value },
    { name: 'museum.name', value: museum },
  ];
  await work.reader.upsert(SettingRow, rows, ['name']);
}

const workroom = [
  'finding_answer',
  'table_note',
  'reading',
  'sheet_person',
  'sheet',
  'cut_sheet',
  'protocol',
  'image',
  'revision',
  'part',
  'garment_editor',
  'garment',
];
const people = ['session', 'invitation', 'mail_outbox', 'user', 'setting'];
const published = ['change', 'image', 'text', 'facet', 'measurement', 'version', 'garment'];

/** Clears away a filling that was interrupted; only ever called for a house that is marked as unfinished. */
export async function clearUnfinished(work: Work): Promise<void> {
  await work.run(async (tx) => {
    for (const table of published) await tx.query(`DELETE FROM ellwand_catalogue.published_${table}`);
    await tx.query('UPDATE ellwand.reading SET replaces = NULL');
    for (const table of [...workroom, ...people]) await tx.query(`DELETE FROM ellwand.${table}`);
  });
}
