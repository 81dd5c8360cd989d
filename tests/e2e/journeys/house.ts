import type { Page } from 'playwright-core';
import { join } from 'node:path';
import type { HouseNotes } from '@/lib/schemas/house-note';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { enterAs } from '../support/enter';
import { choice } from '../support/first-run';
import { describePool, fullTest, sundayEvening, weekOf, viewerOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { shotsFolder } from '../support/place';
import type { Server } from '../support/server';
import { pattern, words } from '../support/words';

/** Going away: the notes, the page for whoever looks after the pool, a visit, and what of a shop slip the week needs. */
export const house: Journey = {
  name: 'house sheet',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'house', clock: sundayEvening });
    const owner = new Person(server);
    await owner.signUp();
    await describePool(owner);
    await owner.must('POST', '/api/readings', fullTest(sundayEvening));
    const visitor = await stage.visitor(server, 'the owner', { width: 390, touch: true });
    await enterAs(visitor, owner);
    const { page } = visitor;
    await stage.part('the notes', () => theNotes(stage, page, owner));
    await stage.part('the sheet', () => theSheet(stage, page, weekOf(owner)));
    await stage.part('on paper', () => onPaper(stage, page));
    await stage.part('a visit', () => aVisit(stage, page));
    await stage.part('a viewer', () => aViewer(stage, server, owner));
    await stage.part('a shop slip', () => aSlip(stage, page));
  },
};

const field = (page: Page, name: string) => page.getByLabel(words(`house.field.${name}`), { exact: true });
const notesOf = (person: Person) => person.must<HouseNotes>('GET', '/api/house-notes');

async function theNotes(stage: Stage, page: Page, owner: Person): Promise<void> {
  await page.goto('/house');
  await field(page, 'gate').fill('Key on the hook by the back door; lift the latch, push.');
  await field(page, 'neighbourPhone').fill('Ada, 555 0142');
  await page.getByRole('button', { name: words('house.save') }).click();
  await page.getByText(/A phone number has digits/).waitFor();
  stage.equal(
    'a phone with letters is kept on the screen',
    await field(page, 'neighbourPhone').inputValue(),
    'Ada, 555 0142',
  );
  stage.equal('and nothing is saved', (await notesOf(owner)).notes, {});
  await field(page, 'neighbourPhone').fill('555 0142');
  await field(page, 'neighbourName').fill('Ada');
  await field(page, 'ourPhone').fill('+1 555 0100');
  await field(page, 'professionalName').fill('The pool firm in the lane');
  await field(page, 'professionalPhone').fill('(555) 0199');
  await field(page, 'pumpSwitch').fill('Grey box left of the shed door');
  await field(page, 'chemicals').fill('Green locker behind the shed, key with Ines');
  await page.getByRole('button', { name: words('house.save') }).click();
  await page.getByText(words('house.kept')).waitFor();
  await page.reload();
  await field(page, 'gate').waitFor();
  stage.equal('after a reload the notes are there', await field(page, 'neighbourName').inputValue(), 'Ada');
}

async function theSheet(stage: Stage, page: Page, week: Promise<WeekSheet>): Promise<void> {
  await page.getByRole('link', { name: words('house.toSheet') }).click();
  const doses = page.getByRole('region', { name: words('house.sheet.doses.title') });
  await doses.getByText(words('house.sheet.doses.nobody')).waitFor();
  const main = page.locator('main');
  stage.check('no chemicals for whoever is not named', !(await main.innerText()).includes('Green locker'));
  stage.equal(
    'the neighbour is one tap away',
    await page.getByRole('link', { name: 'Ada, 555 0142' }).getAttribute('href'),
    'tel:5550142',
  );

  await page.getByRole('link', { name: 'Ines', exact: true }).click();
  await doses.getByText('Only Ines,').waitFor();
  const text = (await doses.innerText()).replace(/\s+/g, ' ');
  const { doses: planned, plan, now } = await week;
  const granules = planned.find((dose) => dose.status === 'planned' && dose.unit === 'g' && dose.at > now);
  stage.check('there is a dose of granules to be measured', granules !== undefined, planned);
  const scoops = (granules?.amount ?? 0) / 50;
  stage.check(
    'granules are counted in scoops of the marked measure',
    text.includes(
      `${scoops} level scoop${scoops === 1 ? '' : 's'} of granules, 50 g each, ${granules?.amount} g in all`,
    ),
    text,
  );
  stage.check('nothing goes into the skimmer', text.includes('Nothing goes into the skimmer,'), text);
  const lead = (await main.innerText()).replace(/\s+/g, ' ');
  stage.check(
    'it says when it was made, and until when it holds',
    /Made Sunday, July 5.*Good until Sunday, July 12/.test(lead),
    {
      lead: lead.slice(0, 300),
      endsAt: plan?.endsAt,
    },
  );
  stage.check('nothing is called safe', !/\bsafe\b/i.test(lead), lead.match(/.{30}\bsafe\b.{30}/i));
}

const pagesIn = (file: Buffer) => file.toString('latin1').match(/\/Type\s*\/Page\b/g)?.length ?? 0;

/** One page of A4 and of Letter, with every note and dose, without the bars of the screen. */
async function onPaper(stage: Stage, page: Page): Promise<void> {
  const rows = page
    .getByRole('region', { name: words('house.sheet.doses.title') })
    .getByRole('list')
    .first();
  // A full week has twice as many doses as this one.
  await rows.evaluate((list) => list.append(...[...list.children].map((row) => row.cloneNode(true))));
  for (const format of ['A4', 'Letter'] as const) {
    const path = join(shotsFolder, `house-sheet-${format}.pdf`);
    const margin = { top: '12mm', bottom: '12mm', left: '12mm', right: '12mm' };
    stage.equal(`one page of ${format}`, pagesIn(await page.pdf({ format, margin, path })), 1);
  }
  await page.reload();
  await page.emulateMedia({ media: 'print' });
  await page.setViewportSize({ width: 703, height: 1030 });
  stage.equal('no bar on paper', await page.getByRole('button', { name: words('navigation.more') }).isVisible(), false);
  stage.equal('nor the question for whom it is', await page.getByText(words('house.sheet.for.ask')).isVisible(), false);
  const coloured = await page.locator('main *').evaluateAll((found) =>
    found
      .map((each) => getComputedStyle(each))
      .flatMap(({ color, backgroundColor }) => [color, backgroundColor])
      .filter((colour) => !['rgb(0, 0, 0)', 'rgb(255, 255, 255)', 'rgba(0, 0, 0, 0)'].includes(colour)),
  );
  stage.none('black on white', [...new Set(coloured)]);
  await page.screenshot({ path: join(shotsFolder, 'house-sheet-print.png'), fullPage: true });
  await page.emulateMedia({ media: 'screen' });
  await page.setViewportSize({ width: 390, height: 844 });
}

async function aVisit(stage: Stage, page: Page): Promise<void> {
  await page.goto('/rounds');
  const section = page.getByRole('region', { name: words('house.visits.title') });
  await section.getByRole('link', { name: /The pool firm in the lane/ }).waitFor();
  await section.locator('summary', { hasText: words('house.visits.writeDown') }).click();
  await section.getByLabel(words('house.visits.note')).fill('New seal on the pump');
  await section.getByRole('button', { name: words('house.visits.save') }).click();
  await section.getByText(words('house.visits.kept')).waitFor();
  await section.getByText('Last visit July 5, 2026').waitFor();
  await page.getByRole('button', { name: `${words('rounds.item.pump-seal.name')}: not fine` }).click();
  const row = page.locator('li', { hasText: words('rounds.item.pump-seal.off') });
  stage.equal(
    'the phone stands beside the advice',
    await row.getByRole('link', { name: /The pool firm/ }).getAttribute('href'),
    'tel:5550199',
  );
}

async function aViewer(stage: Stage, server: Server, owner: Person): Promise<void> {
  const viewer = await viewerOf(server, owner, 'Kit');
  const visitor = await stage.visitor(server, 'a viewer', { width: 1440 });
  await enterAs(visitor, viewer);
  const { page } = visitor;
  await page.goto('/house');
  await page.getByText(words('house.mayNot')).waitFor();
  stage.equal('a viewer sees the notes', await field(page, 'neighbourName').inputValue(), 'Ada');
  stage.check('and cannot write in them', !(await field(page, 'gate').isEditable()));
  const refused = await viewer.send('PUT', '/api/house-notes', {});
  stage.equal('the server refuses a viewer', refused.status, 403);
  stage.equal('and nothing is lost', (await notesOf(owner)).notes.neighbourName, 'Ada');
}

/** A test from a shop slip: what the shop said is held against the week. */
async function aSlip(stage: Stage, page: Page): Promise<void> {
  await page.goto('/test?kind=quick');
  await choice(page, words('readings.kind.quick')).first().click();
  await choice(page, words('readings.method.slip')).click();
  await page.locator('#value-freeChlorine').fill('2.9');
  await page.locator('#value-pH').fill('7.5');
  await page.locator('#value-pH').blur();
  await page.getByRole('button', { name: words('readings.save.quick') }).click();
  const section = page.getByRole('region', { name: words('house.shop.title') });
  await section.getByText(words('house.shop.buyNothing')).waitFor();
  for (const product of ['calcium-hypochlorite', 'sodium-bicarbonate', 'copper'])
    await section.getByRole('button', { name: words(`house.shop.product.${product}`) }).click();
  await section.getByText(pattern('house.shop.haveEnough')).waitFor();
  const said = (await section.innerText()).replace(/\s+/g, ' ');
  stage.check('what the week does not need is said so', said.includes('This week does not need it.'), said);
  stage.check('copper is kept away', said.includes(words('house.shop.keepAway')), said);
  await page.screenshot({ path: join(shotsFolder, 'house-slip.png'), fullPage: true });
}
