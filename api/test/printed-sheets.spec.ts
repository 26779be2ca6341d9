import type { Garment } from '@ellwand/shared/records/garment';
import type { SheetFindings } from '@ellwand/shared/records/sheet';
import { pointsOf, type Protocol } from '@ellwand/shared/protocols/protocol';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { kindIds } from '@ellwand/shared/points/kinds';
import { v7 as uuidv7 } from 'uuid';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import {
  factsWith,
  makeDress,
  notTaken,
  openSheet,
  reading,
  type SheetShown,
  soundSheet,
} from './support/garments';
import { type PdfRead, readPdf } from './support/pdf';

describe('measuring sheets on paper', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let table: Agent;
  let dress: Garment;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    reader = await house.person('recorder', 'Odile Marsh');
    holder = await house.person('curator', 'Ines Thorne');
    table = await house.signInAs(reader);
    dress = await makeDress(table);
  });

  const partOf = (kind: string) => dress.parts.find((part) => part.kind === kind)?.id ?? '';
  const print = async (address: string): Promise<PdfRead> => {
    const answer = await table.get(`/api/v1/workroom/${address}`).buffer(true);
    expect([answer.status, answer.headers['content-type'], answer.headers['cache-control']]).toEqual([
      200,
      'application/pdf',
      'no-store',
    ]);
    return readPdf(answer.body as Buffer);
  };
  const send = async (sheet: SheetShown, readings: object[]) => {
    const answer = await table.post(`/api/v1/workroom/sheets/${sheet.id}/readings`).send({ readings });
    const { results } = answer.body as { results: { outcome: string }[] };
    expect(results.filter(({ outcome }) => outcome !== 'kept')).toEqual([]);
  };
  const expectSound = ({ check, fonts, info, structure }: PdfRead) => {
    expect(check).toContain('No syntax or stream encoding errors found');
    expect(fonts.filter(({ embedded, unicode }) => !embedded || !unicode)).toEqual([]);
    expect(fonts.length).toBeGreaterThan(0);
    expect(info).toMatchObject({ Tagged: 'yes' });
    expect(structure).toEqual(
      expect.arrayContaining(['Document', 'H1', 'Table', 'TR', 'TH', 'TD', 'Figure']),
    );
  };

  it('hold every reading of a skirt as it was keyed, its value, and what follows', async () => {
    const sheet = await openSheet(table, partOf('skirt'), factsWith(reader, holder));
    const sent = soundSheet(sheet, reader.id);
    await send(sheet, sent);
    const printed = await print(`sheets/${sheet.id}/sheet.pdf`);
    expectSound(printed);
    expect(printed.info['Page size']).toBe('595.276 x 841.89 pts (A4)');
    for (const point of pointsOf(protocolFor('skirt'))) expect(printed.text).toContain(point.name);
    for (const one of sent) {
      if (!('typed' in one) || one.pointId === 'hem') continue;
      expect(printed.text).toContain(`${one.typed} mm`);
    }
    expect(printed.text).toContain('3 × 1500 mm + 742 mm');
    // 3 × 1500 + 742 = 5242 mm; 5242 ÷ 25.4 = 206.378 in, 206 3/8 to the nearest eighth.
    expect(printed.text).toContain('5242 mm (206 3/8 in)');
    const { derived } = (await table.get(`/api/v1/workroom/sheets/${sheet.id}/findings`))
      .body as SheetFindings;
    expect(derived.length).toBeGreaterThan(0);
    for (const value of derived) expect(printed.text).toContain(value.worked);
    for (const said of [
      'LH.1966.30.2',
      'Odile Marsh',
      'Ines Thorne',
      'Fibreglass tape 3',
      '20 November 2026',
    ])
      expect(printed.text).toContain(said);
    expect(printed.text).toContain(`/workroom/garments/${dress.id}`);
  });

  it('keep corrected readings, reasons, second rounds and both sleeves apart', async () => {
    const sheet = await openSheet(
      table,
      partOf('bodice'),
      factsWith(reader, holder, { repeatPoints: ['waist'] }),
    );
    const slip = reading('waist', '621', reader.id);
    await send(sheet, [slip]);
    await send(sheet, [
      reading('waist', '612', reader.id, { replaces: slip.id }),
      reading('waist', '24 1/4', reader.id, { round: 2, unit: 'in' }),
      reading('sleeve-outer', '588', reader.id, { worn: 'left' }),
      reading('sleeve-outer', '592', reader.id, { worn: 'right' }),
      { ...notTaken('neck', 'too-fragile', reader.id), note: 'The lace is torn at the nape' },
    ]);
    const { text } = await print(`sheets/${sheet.id}/sheet.pdf`);
    expect(text).toContain('621 mm (corrected since)');
    expect(text).toContain('reading 2: 24 1/4 in');
    expect(text).toContain('mean of 2');
    expect(text).toContain('left, as worn: 588 mm');
    expect(text).toContain('right, as worn: 592 mm');
    expect(text).toContain('not taken: too fragile to handle');
    expect(text).toContain('The lace is torn at the nape');
    expect(text).toContain('Not complete yet');
    expect(text).toContain('not read yet');
  });

  it('hold each finding with its answer, and what was said at the table', async () => {
    const sheet = await openSheet(table, partOf('bodice'), factsWith(reader, holder));
    await send(sheet, [
      ...soundSheet(sheet, reader.id).filter((one) => one.pointId !== 'waist'),
      reading('waist', '61', reader.id),
    ]);
    const sheetPath = `/api/v1/workroom/sheets/${sheet.id}`;
    const { findings } = (await table.get(`${sheetPath}/findings`)).body as SheetFindings;
    const [asked] = findings.filter(({ severity }) => severity === 'question');
    expect(asked).toBeDefined();
    await table.post(`${sheetPath}/findings/answers`).send({ key: asked?.key, reason: 'A doll’s bodice' });
    const seen = { id: uuidv7(), device: 'tablet 1', saidAt: '2026-11-20T10:00:00.000Z', about: 'described' };
    await table
      .post(`${sheetPath}/table-notes`)
      .send({ notes: [{ ...seen, thing: 'label', text: 'Woven: Żółta Łódź, Ёлка, Ωμέγα, 測' }] });
    const printed = await print(`sheets/${sheet.id}/sheet.pdf`);
    expectSound(printed);
    for (const { sentence } of findings) expect(printed.text).toContain(sentence);
    expect(printed.text).toContain('A doll’s bodice');
    // What no typeface has is written as its number: nothing is lost.
    expect(printed.text).toContain('Woven: Żółta Łódź, Ёлка, Ωμέγα, [U+6E2C]');
  });

  it('are blank for one part, with its cautions, and its garment’s square and address', async () => {
    const printed = await print(`parts/${partOf('bodice')}/blank-sheet.pdf?paper=letter`);
    expectSound(printed);
    expect(printed.info['Page size']).toBe('612 x 792 pts (letter)');
    expect(printed.text).toContain('LH.1966.30.1');
    expect(printed.text).toContain('Weighted silk: suspected, not tested');
    expect(printed.text).toContain('Splits along the folds.');
    expect(printed.text).toContain('PRIVATE-HANDLING two people lift the skirt');
    expect(printed.text).toContain(`/workroom/garments/${dress.id}`);
  });

  it.each(kindIds)('are blank for any %s, every point in handling order', async (kind) => {
    const printed = await print(`kinds/${kind}/blank-sheet.pdf`);
    expectSound(printed);
    expect(inOrder(printed.text, protocolFor(kind))).toBe(true);
    expect(printed.text).toContain('This bar is 100 mm');
    expect(printed.text).toContain('ask a qualified person');
  });

  it('say what was wanted where there is no such sheet, kind or paper', async () => {
    const answers = await Promise.all(
      [`sheets/${uuidv7()}/sheet.pdf`, `parts/${uuidv7()}/blank-sheet.pdf`, 'kinds/ruff/blank-sheet.pdf'].map(
        (address) => table.get(`/api/v1/workroom/${address}`),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 400]);
    const odd = await table.get('/api/v1/workroom/kinds/skirt/blank-sheet.pdf?paper=a3');
    expect([odd.status, odd.body.code]).toEqual([400, 'request.invalid']);
  });
});

/** Whether the names of the points follow one another as they are measured: by step, then as the protocol says. */
function inOrder(text: string, protocol: Protocol): boolean {
  const steps = ['opened-inside', 'front-up', 'back-up'] as const;
  const names = steps.flatMap((step) =>
    pointsOf(protocol)
      .filter(({ handlingStep }) => handlingStep === step)
      .map(({ name }) => name),
  );
  let from = 0;
  return names.every((name) => {
    const at = text.indexOf(name, from);
    from = at + name.length;
    return at >= 0;
  });
}
