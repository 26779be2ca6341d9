import type { Tx } from '../common/work';
import { SettingRow } from './setting.entity';

const unnamed = 'Museum of Dress';

/** The museum's name, as pages and letters give it. */
export async function museumName(tx: Tx): Promise<string> {
  const setting = await tx.findOne(SettingRow, { where: { name: 'museum.name' } });
  return typeof setting?.value === 'string' ? setting.value : unnamed;
}
