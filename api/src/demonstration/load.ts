import 'reflect-metadata';
import { writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import type { INestApplicationContext } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { ENVIRONMENT } from '../common/environment.token';
import { Work } from '../common/work';
import type { Environment } from '../config/environment';
import { FormsMaker } from '../media/forms/forms-maker';
import { type Demonstration, type DemonstrationGarment, readDemonstration } from './demonstration-data';
import { DemonstrationGarments, type FilledGarment } from './demonstration-garments';
import { DemonstrationProtocols, keepsFirstProtocols } from './demonstration-protocols';
import { type DemonstrationAccount, DemonstrationStaff } from './demonstration-staff';
import { DemonstrationModule } from './demonstration.module';
import { clearUnfinished, houseState, markHouse } from './house-state';

const mediaSamples = resolve(__dirname, '../../../media-samples');
const say = (line: string) => process.stdout.write(`${line}\n`);

/** Fills a new house with the demonstration, once; a house that is filled or in use stays as it is. */
async function load(): Promise<void> {
  const house = await NestFactory.createApplicationContext(DemonstrationModule, {
    logger: ['error', 'warn'],
  });
  try {
    const work = house.get(Work);
    const state = await houseState(work);
    if (state === 'filled' || state === 'in-use') return;
    if (state === 'unfinished') await clearUnfinished(work);
    const demonstration = await readDemonstration(mediaSamples);
    await markHouse(work, 'begun', demonstration.museum);
    const accounts = await fill(house, demonstration);
    await writeAccounts(house.get<Environment>(ENVIRONMENT), accounts);
    await markHouse(work, 'finished', demonstration.museum);
  } finally {
    await house.close();
  }
}

async function fill(
  house: INestApplicationContext,
  demonstration: Demonstration,
): Promise<DemonstrationAccount[]> {
  const { staff, accounts } = await house.get(DemonstrationStaff).arrive(demonstration);
  const garments = house.get(DemonstrationGarments);
  const filled: FilledGarment[] = [];
  const fillIn = async (some: readonly DemonstrationGarment[]) => {
    for (const data of some) {
      filled.push(await garments.fill(data, demonstration, staff));
      say(`Demonstration: ${filled.length} of ${demonstration.garments.length} garments measured`);
    }
  };
  await fillIn(demonstration.garments.filter(keepsFirstProtocols));
  const protocols = house.get(DemonstrationProtocols);
  for (const protocol of demonstration.protocols) await protocols.make(protocol, staff);
  await fillIn(demonstration.garments.filter((garment) => !keepsFirstProtocols(garment)));
  say('Demonstration: making the smaller forms of its pictures');
  await house.get(FormsMaker).drain();
  for (const garment of filled) await garments.stage(garment, staff);
  say('Demonstration: reviewed and published');
  return accounts;
}

/** For whoever started this house, and nobody else on the machine. */
async function writeAccounts(
  environment: Environment,
  accounts: readonly DemonstrationAccount[],
): Promise<void> {
  const { publicUrl: url, dataFolder } = environment;
  const text = JSON.stringify({ url: `${url}/`, workroomUrl: `${url}/workroom/`, accounts }, null, 2);
  await writeFile(join(dataFolder, 'demonstration.json'), `${text}\n`, { mode: 0o600 });
}

load().catch((fault: unknown) => {
  process.stderr.write(
    `The demonstration could not be loaded: ${fault instanceof Error ? (fault.stack ?? fault.message) : String(fault)}\n`,
  );
  process.exitCode = 1;
});
