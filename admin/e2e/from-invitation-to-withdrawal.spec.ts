import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, type Page, test } from '@playwright/test';
import { expectAccessible } from './support/axe.js';
import { emptyHouse } from './support/house.js';
import {
  acceptByLetter,
  type Colleague,
  invite,
  openTheHouse,
  type Seat,
  signIn,
  signOut,
  takeSeat,
} from './support/people.js';
import { answerFinding, completeSheet, type Keyed, keySheet, showTab } from './support/table.js';

const password = 'brass hooks and linen tape';
const administrator: Colleague = {
  name: 'Owen Tarrant',
  email: 'owen.tarrant@larkmoor.example',
  password,
  role: 'Administrator',
};
const recorder: Colleague = {
  name: 'Odile Marsh',
  email: 'odile.marsh@larkmoor.example',
  password,
  role: 'Recorder',
};
const holder: Colleague = {
  name: 'Ines Thorne',
  email: 'ines.thorne@larkmoor.example',
  password,
  role: 'Curator',
};
const reviewer: Colleague = {
  name: 'Hal Brandreth',
  email: 'hal.brandreth@larkmoor.example',
  password,
  role: 'Curator',
};

const picturesFolder = fileURLToPath(new URL('../../media-samples/pictures/', import.meta.url));
const pictures = [
  { file: 'lh-1966-30-front.jpg', view: 'front', words: 'The dress from the front.' },
  { file: 'lh-1966-30-back.jpg', view: 'back', words: 'The dress from the back.' },
] as const;
const title = 'Day dress of slate-blue silk';
const number = 'LH.2026.7';
const publicPath = '/g/lh-2026-7';

/** The bodice, in handling order. The reading across the back is out on purpose: a question comes of it. */
const bodice: Readonly<Record<string, Keyed>> = {
  'Bust or chest': '872',
  Waist: '606',
  'Inner waist band': '592',
  Neck: '372',
  'Side seam': '188',
  Armscye: '424',
  Cuff: '228',
  'Neck to hem, front': '458',
  'Waist to hem, front': '118',
  'Depth of the point': '62',
  'Shoulder seam': '104',
  'Across the front': '322',
  'Sleeve, outer length': '588',
  'Sleeve, under length': '438',
  'Sleeve at its widest': '186',
  Elbow: { notTaken: 'Too fragile to handle' },
  'Across the back': '404',
  'Underarm to underarm, back': '392',
  'Neck to hem, back': '498',
  'Waist to hem, back': '112',
};

/** The skirt: the hem is three tapes and 742 mm. */
const skirt: Readonly<Record<string, Keyed>> = {
  Waistband: '612',
  Hip: { notTaken: 'Does not apply to this cut' },
  Hem: { tapes: '3', rest: '742' },
  'Hem depth': '94',
  'Waist to hem, front': '1020',
  'Waist to hem, side': '1048',
  'Waist to hem, back': '1184',
  Opening: '262',
};

test.describe.configure({ mode: 'serial' });

test('a dress goes from the invitation of its measurers to the public, and is withdrawn', async ({
  browser,
}) => {
  test.setTimeout(300_000);
  const house = emptyHouse();

  const owen = await takeSeat(browser, administrator);
  await openTheHouse(owen, house);
  await expectAccessible(owen.page, 'people');
  for (const colleague of [recorder, holder, reviewer]) await invite(owen, colleague);

  const odile = await takeSeat(browser, recorder);
  const ines = await takeSeat(browser, holder);
  const hal = await takeSeat(browser, reviewer);
  for (const seat of [odile, ines, hal]) await acceptByLetter(seat, house);
  await expectAccessible(odile.page, 'an empty list of garments');
  await signOut(odile);
  await signIn(odile, house);

  await makeTheDress(odile);
  await addPictures(odile);
  await measure(odile, 'Bodice', bodice);
  await expectWorkedOut(odile.page, 'Neck to waist, front', '458 mm − 118 mm = 340 mm');
  await answerFinding(odile.page, /across the back/i, 'Dropped shoulders: the seams sit far down the arms.');
  await answerFinding(odile.page, /tissue lay inside/i, 'The tissue was taken out of the sleeves first.');
  await completeSheet(odile.page);
  await backToTheGarment(odile.page);
  await measure(odile, 'Skirt', skirt);
  await expectWorkedOut(odile.page, 'Back longer than front by', '1184 mm − 1020 mm = 164 mm');
  await expectWorkedOut(odile.page, 'Hem to waist', '8.57');
  await completeSheet(odile.page);
  await backToTheGarment(odile.page);
  await odile.page.getByRole('button', { name: 'Send to review' }).click();
  await expect(stage(odile.page, 'In review')).toBeVisible();

  await refusedToWhoeverHeldTheTape(ines);
  await returnedOnce(hal, odile);
  await approveAndPublish(hal);

  const visitor = await (await browser.newContext({ viewport: { width: 1280, height: 900 } })).newPage();
  await findByWaist(visitor, house.url);
  await readInInches(visitor);
  await withdraw(hal);
  await findWithdrawn(visitor, house.url);
});

/** The mark that says where the record stands. */
const stage = (page: Page, word: string) => page.getByRole('main').getByText(word, { exact: true }).first();

async function makeTheDress({ page }: Seat): Promise<void> {
  await page
    .getByRole('link', { name: /new garment/i })
    .first()
    .click();
  await page.getByRole('radio', { name: 'Two parts: a bodice and a skirt' }).check();
  await page.getByRole('button', { name: 'Make the garment' }).click();
  // Nothing is lost, and the summary says what is wanted.
  await expect(page.getByRole('group', { name: /things to mend/ })).toBeFocused();
  await expectAccessible(page, 'a new garment that is not complete');
  await page.getByLabel('Own number').fill(number);
  await page.getByLabel('Title').fill(title);
  await page.getByLabel('Kind of garment').selectOption('dress');
  await page.getByLabel('Date').fill('1884/1886');
  await page.getByLabel('Made for').selectOption('woman');
  await page.getByLabel(/^Public description/).fill('Bodice and draped skirt, hand finished.');
  await page.getByLabel(/^Materials/).fill('silk\ncotton');
  await page.getByLabel(/^Colours/).fill('blue');
  await page.getByLabel(/^Handling notes/).fill('Two people lift the skirt.');
  await page.getByLabel(/^Store location/).fill('Bay 4, shelf 2');
  await page.getByLabel('Credit line').fill('Larkmoor House Museum of Dress');
  await page.getByRole('button', { name: 'Make the garment' }).click();
  await expect(page.getByRole('heading', { name: title, level: 1 })).toBeVisible();
  await expectAccessible(page, 'the garment');
}

async function addPictures({ page }: Seat): Promise<void> {
  await page
    .getByLabel('Pictures to add')
    .setInputFiles(pictures.map(({ file }) => join(picturesFolder, file)));
  const panel = page.getByRole('region', { name: 'Pictures' });
  for (const { file, view, words } of pictures) {
    const card = panel.getByRole('listitem').filter({ hasText: file });
    await card.getByRole('button', { name: /^Describe|^Edit|^Change/ }).click();
    await card.getByLabel('View').selectOption(view);
    await card.getByLabel('Description in words').fill(words);
    await card.getByRole('button', { name: /^Save|^Keep/ }).click();
    // The words are shown with the picture, once its smaller forms are made.
    await expect(card).toContainText(words, { timeout: 60_000 });
  }
  await expectAccessible(page, 'the garment with pictures');
}

async function measure({ page }: Seat, part: string, keyed: Readonly<Record<string, Keyed>>): Promise<void> {
  await page.getByRole('link', { name: `New measuring sheet for ${part}` }).click();
  await page
    .getByRole('checkbox', { name: `${holder.name}: Held the tape and steadied the garment` })
    .check();
  await page.getByLabel('Place').fill('Measuring table, east room');
  await page.getByLabel('Tape', { exact: true }).fill('Fibreglass tape 3');
  await page.getByLabel('How the garment lay').selectOption('flat-tissue');
  await expectAccessible(page, 'the facts of a new sheet');
  await page.getByRole('button', { name: 'Open the sheet' }).click();
  await expect(page.getByRole('heading', { name: 'Before you open the box' })).toBeVisible();
  await expectAccessible(page, 'the cautions');
  await page.getByRole('button', { name: 'We have read this: open the sheet' }).click();
  await keySheet(page, keyed);
  await expectAccessible(page, `the sheet of the ${part}`);
}

async function expectWorkedOut(page: Page, label: string, working: string): Promise<void> {
  await showTab(page, 'Worked out');
  await expect(page.getByRole('listitem').filter({ hasText: label }).first()).toContainText(working);
  await expectAccessible(page, 'what is worked out');
}

async function backToTheGarment(page: Page): Promise<void> {
  await page
    .getByRole('link', { name: /back to the garment|garment/i })
    .first()
    .click();
  await expect(page.getByRole('heading', { name: title, level: 1 })).toBeVisible();
}

async function chooseForReview({ page }: Seat): Promise<void> {
  await page.getByRole('link', { name: 'Review', exact: true }).click();
  await page.getByRole('link', { name: new RegExp(number.replaceAll('.', '\\.')) }).click();
  await expect(page.getByRole('article', { name: 'As the public will see it' })).toContainText(title);
}

async function refusedToWhoeverHeldTheTape(ines: Seat): Promise<void> {
  await chooseForReview(ines);
  await expectAccessible(ines.page, 'the review');
  await expect(ines.page.getByText('You cannot approve this.')).toBeVisible();
  await expect(ines.page.getByRole('button', { name: 'Approve' })).toHaveCount(0);
  // The screen offers nothing, and neither does the API behind it.
  const status = await ines.page.evaluate(async () => {
    const id = location.pathname.split('/').at(-2) ?? '';
    const garment = (await (await fetch(`/api/v1/workroom/garments/${id}`)).json()) as { version: number };
    const headers = { 'If-Match': `"${garment.version}"` };
    const answer = await fetch(`/api/v1/workroom/garments/${id}/approve`, { method: 'POST', headers });
    return { status: answer.status, code: ((await answer.json()) as { code: string }).code };
  });
  expect(status).toEqual({ status: 403, code: 'review.own-measuring' });
}

async function returnedOnce(hal: Seat, odile: Seat): Promise<void> {
  const reason = 'Say in the description where the skirt opens.';
  await chooseForReview(hal);
  await hal.page.getByRole('button', { name: 'Return with a reason' }).click();
  await hal.page.getByLabel('What should be done').fill(reason);
  await expectAccessible(hal.page, 'the question why a record is returned');
  await hal.page.getByRole('button', { name: 'Return it' }).click();
  await expect(stage(hal.page, 'Draft')).toBeVisible();

  await odile.page.reload();
  await expect(odile.page.getByText(reason)).toBeVisible();
  await odile.page
    .getByLabel(/^Public description/)
    .fill('Bodice and draped skirt, hand finished. The skirt opens at the left back.');
  await odile.page.getByRole('button', { name: /^Save/ }).click();
  await expect(odile.page.getByText(/^Saved/).first()).toBeVisible();
  await odile.page.getByRole('button', { name: 'Send to review' }).click();
  await expect(stage(odile.page, 'In review')).toBeVisible();
}

async function approveAndPublish(hal: Seat): Promise<void> {
  await chooseForReview(hal);
  await hal.page.getByRole('button', { name: 'Approve' }).click();
  await hal.page.getByRole('button', { name: 'Publish version 1' }).click();
  const question = hal.page.getByRole('dialog', { name: 'Publish version 1?' });
  await expectAccessible(hal.page, 'the question before publishing');
  await question.getByRole('button', { name: 'Publish version 1' }).click();
  await expect(question).toBeHidden();
  await expect(stage(hal.page, 'Published')).toBeVisible();
}

async function findByWaist(page: Page, url: string): Promise<void> {
  await page.goto(`${url}/`);
  await expectAccessible(page, 'the public home');
  await page.goto(`${url}/search`);
  const waist = page.getByRole('group', { name: 'Waist', exact: true });
  await waist.getByLabel(/From/).fill('560');
  await waist.getByLabel(/To \(mm/).fill('620');
  await page.getByRole('button', { name: 'Show these measurements' }).click();
  await expect(page).toHaveURL(/measure=waist(%3A|:)560\.\.620/);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('1');
  await expectAccessible(page, 'the search by waist');
  await page.getByRole('link', { name: title }).click();
  await expect(page.getByRole('heading', { name: title, level: 1 })).toBeVisible();
  await expectAccessible(page, 'the public garment');
}

async function readInInches(page: Page): Promise<void> {
  const waist = page.getByRole('row').filter({ hasText: 'Waistband' });
  await expect(waist).toContainText('612');
  await page.getByRole('link', { name: /inches/ }).click();
  // 612 mm = 24.094 in: 24 1/8 at eighths.
  await expect(waist.getByText('24 1/8', { exact: true }).first()).toBeVisible();
  await page.emulateMedia({ media: 'print' });
  await expect(page.getByText(/check: this line is 10 cm/i)).toBeVisible();
  const paper = await page.pdf({ format: 'A4', printBackground: true });
  expect(paper.subarray(0, 5).toString()).toBe('%PDF-');
  await page.emulateMedia({ media: 'screen' });
}

async function withdraw(hal: Seat): Promise<void> {
  await hal.page.getByRole('button', { name: 'Withdraw' }).click();
  const question = hal.page.getByRole('dialog', { name: 'Withdraw from the public?' });
  await question.getByLabel('What the public reads').fill('Withdrawn while its history is looked into.');
  await question.getByLabel(/^Inner reason/).fill('A letter from the family.');
  await expectAccessible(hal.page, 'the question before withdrawing');
  await question.getByRole('button', { name: 'Withdraw' }).click();
  await expect(question).toBeHidden();
  await expect(stage(hal.page, 'Withdrawn')).toBeVisible();
}

async function findWithdrawn(page: Page, url: string): Promise<void> {
  const picture = await page.locator('picture img').first().getAttribute('src');
  const answer = await page.goto(`${url}${publicPath}`);
  expect(answer?.status()).toBe(410);
  await expect(page.getByText('Withdrawn while its history is looked into.')).toBeVisible();
  await expect(page.getByRole('main')).not.toContainText('A letter from the family.');
  await expectAccessible(page, 'the withdrawal notice');
  for (const path of [`${publicPath}/v/1`, '/api/v1/catalogue/garments/lh-2026-7', picture ?? '']) {
    expect({ path, status: (await page.request.get(`${url}${path}`)).status() }).toEqual({
      path,
      status: 410,
    });
  }
}
