import type { Page } from 'playwright-core';
import type { Learnt } from '@/lib/schemas/learnt';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf, viewerOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { pattern, words } from '../support/words';

const HOUR = 3_600_000;
const before = (hours: number) => new Date(Date.parse(sundayEvening) - hours * HOUR).toISOString();

/** What the pool has taught stands on its page, for everyone who may look; an owner can begin again. */
export const learning: Journey = {
  name: 'what the pool has taught',
  seconds: 120,
  async run(stage) {
    const server = await stage.server({ name: 'learning', clock: sundayEvening });
    await learningIn(stage, server);
  },
};

export async function learningIn(stage: Stage, server: Server): Promise<void> {
  const owner = new Person(server);
  await owner.signUp();
  await describePool(owner);
  // Half of the chlorine is gone each day, far more than of the usual pool.
  for (const [index, freeChlorine] of [7, 3.5, 1.8, 0.9].entries()) {
    const test = fullTest(before(24 * (4 - index)));
    await owner.must('POST', '/api/readings', { ...test, values: { ...test.values, freeChlorine } });
  }
  await stage.part('the bars', () => theBars(stage, server, owner));
  await stage.part('a viewer', () => aViewer(stage, server, owner));
  await stage.part('starting again', () => startingAgain(stage, server, owner));
}

async function poolPage(stage: Stage, server: Server, person: Person, name: string): Promise<Page> {
  const visitor = await stage.visitor(server, name, { width: 1440 });
  await enterAs(visitor, person);
  await visitor.page.goto('/pool');
  await visitor.page.getByRole('heading', { name: words('learnt.title') }).waitFor();
  return visitor.page;
}

const learntBy = (person: Person) => person.must<Learnt>('GET', '/api/learnt');
const forgetButton = (page: Page) => page.getByRole('button', { name: words('learnt.forget.open') });

async function theBars(stage: Stage, server: Server, owner: Person): Promise<void> {
  const learnt = await learntBy(owner);
  const loss = learnt.rows.find(({ thing }) => thing === 'dailyLoss');
  stage.equal('four tests were learnt from', learnt.readings, 4);
  stage.check('the daily loss lies over the usual', (loss?.learnt.p50 ?? 0) > (loss?.before.p50 ?? 9), loss);

  const page = await poolPage(stage, server, owner, 'the owner');
  await page.getByText(words('learnt.legend')).waitFor();
  const row = page.locator('section', {
    has: page.getByRole('heading', { name: words('learnt.thing.dailyLoss.name') }),
  });
  // The bars are drawn when they come near what is seen of the page.
  await row.last().scrollIntoViewIfNeeded();
  await row
    .last()
    .getByText(/^learnt: /)
    .waitFor();
  const shown = (await row.last().innerText()).replace(/\s+/g, ' ');
  const figure = (value = 0) => value.toFixed(1);
  for (const [what, range] of [
    ['before', loss?.before],
    ['learnt', loss?.learnt],
  ] as const)
    stage.check(
      `the bar ${what} says its range`,
      shown.includes(`${what}: ${figure(range?.p10)} to ${figure(range?.p90)}`),
      shown,
    );
  stage.check('and the middle in words', shown.includes(`Loses about ${figure(loss?.learnt.p50)} mg/L`), shown);
  await row
    .last()
    .getByRole('button', { name: pattern('learnt.why.openFor') })
    .click();
  await row
    .last()
    .getByText(/^4 tests so far/)
    .waitFor();
}

async function aViewer(stage: Stage, server: Server, owner: Person): Promise<void> {
  const viewer = await viewerOf(server, owner, 'Ada');

  const page = await poolPage(stage, server, viewer, 'a viewer');
  await page.getByText(words('learnt.forget.owners')).waitFor();
  await page
    .getByText(/^learnt: /)
    .first()
    .waitFor();
  stage.equal('a viewer sees the bars', (await page.getByText(/^learnt: /).count()) > 0, true);
  stage.equal('and no way to begin again', await forgetButton(page).count(), 0);
  const refused = await viewer.send('DELETE', '/api/learnt');
  stage.equal('the server refuses a viewer', refused.status, 403);
  stage.check('in words', refused.text.includes('Only an owner can let the pool be learnt anew.'), refused.text);
  stage.equal('nothing was put aside', (await learntBy(owner)).readings, 4);
}

async function startingAgain(stage: Stage, server: Server, owner: Person): Promise<void> {
  const readings = (await weekOf(owner)).lastReading;
  const page = await poolPage(stage, server, owner, 'the owner again');
  await page
    .getByText(/^learnt: /)
    .first()
    .waitFor();
  await forgetButton(page).click();
  const dialog = page.getByRole('dialog', { name: words('learnt.forget.title') });
  await dialog.getByRole('button', { name: words('learnt.forget.no') }).click();
  await dialog.waitFor({ state: 'detached' });
  stage.equal('not confirmed, nothing is put aside', (await learntBy(owner)).readings, 4);

  await forgetButton(page).click();
  await dialog.getByRole('button', { name: words('learnt.forget.yes') }).click();
  await page.getByText(/^Nothing yet\. The first test says/).waitFor();
  stage.equal('the bars are gone', await page.getByText(/^learnt: /).count(), 0);
  const learnt = await learntBy(owner);
  stage.equal('nothing is left of what was learnt', [learnt.readings, learnt.rows], [0, []]);
  const week = await weekOf(owner);
  stage.equal('the tests stay', week.lastReading, readings);
  stage.check('and there is a plan', week.plan !== null && week.planProblem === null, week.planProblem);
}
