import { In } from 'typeorm';
import { z } from 'zod';
import type { Tx } from '../common/work';
import { SettingRow } from './setting.entity';
import { UserRow } from './user.entity';

export const DAMAGE_REPORTED_TO = 'measuring.damage-reported-to';

/** Whoever the museum named to be told of damage; an empty list where it named nobody. */
export async function namedForDamage(tx: Tx): Promise<string[]> {
  const setting = await tx.findOneBy(SettingRow, { name: DAMAGE_REPORTED_TO });
  const named = z.array(z.string()).safeParse(setting?.value);
  return named.success ? named.data : [];
}

/**
 * Who is told: the named ones who work here, else every curator, else every administrator. Damage is never told to
 * nobody while anybody is there to read of it.
 */
export async function damageReportedTo(tx: Tx): Promise<UserRow[]> {
  const named = await namedForDamage(tx);
  const chosen = named.length > 0 ? await tx.findBy(UserRow, { id: In(named), active: true }) : [];
  if (chosen.length > 0) return chosen;
  const active = await tx.findBy(UserRow, { active: true });
  const curators = active.filter(({ roles }) => roles.includes('curator'));
  return curators.length > 0 ? curators : active.filter(({ roles }) => roles.includes('administrator'));
}
