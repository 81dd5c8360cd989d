import type { Page } from 'playwright-core';
import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import type { TryOutStart } from '@/lib/schemas/try-out';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf, viewerOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { shotsFolder } from '../support/place';
import type { Server } from '../support/server';
import { words } from '../support/words';

/** A party is tried on Saturday: what becomes of the water, into the plan, and back out of it. */
export const tryIt: Journey = {
  name: 'try it',
  seconds: 180,
  async run(stage) {
    const server = await stage.server({ name: 'try-it', clock: sundayEvening });
    const owner = new Person(server);
    await owner.signUp();
    await describePool(owner);
    await owner.must('POST', '/api/readings', fullTest(sundayEvening));
    const visitor = await stage.visitor(server, 'the owner', { width: 1440, height: 1900 });
    await enterAs(visitor, owner);
    const { page } = visitor;
    await stage.part('nothing before it is touched', () => untouched(stage, page));
    await stage.part('a party', () => aParty(stage, page));
    await stage.part('in the plan', () => inThePlan(stage, page, owner));
    await stage.part('and back', () => putBack(stage, page, owner));
    await stage.part('a dose on another evening', () => anotherEvening(stage, page));
    await stage.part('on a phone', () => onPhone(stage, server, owner));
    await stage.part('a viewer', () => aViewer(stage, server, owner));
  },
};

const SATURDAY = '2026-07-11';
const sectionOf = (page: Page) =>
  page.locator('section', { has: page.getByRole('heading', { name: words('try-out.title') }) });
const fieldOf = (page: Page) => page.getByRole('textbox', { name: 'Swimmer-hours on Saturday' });
const lineOf = (page: Page) => page.locator('path[data-tried]').last().getAttribute('d');
const saturday = async (page: Page) => {
  await listening(page);
  await page.getByRole('combobox', { name: words('try-out.day') }).selectOption(SATURDAY);
};

/** Until React listens nobody can get at the fields; a script of ours could. */
const listening = (page: Page) => sectionOf(page).locator('fieldset:not([inert])').first().waitFor();

async function untouched(stage: Stage, page: Page): Promise<void> {
  const asked: string[] = [];
  page.on('request', (request) => asked.push(request.url()));
  page.on('worker', (worker) => asked.push(`worker ${worker.url()}`));
  await page.goto('/week');
  await sectionOf(page).waitFor();
  await page.waitForLoadState('networkidle');
  const early = asked.filter((url) => url.includes('/api/try-outs') || url.startsWith('worker'));
  stage.none('neither asked for nor started before it is touched', early);
}

async function aParty(stage: Stage, page: Page): Promise<void> {
  await saturday(page);
  await fieldOf(page).fill('12');
  await page.getByText(/^With 12 swimmer-hours on Saturday, /).waitFor();
  await fieldOf(page).press('ArrowUp');
  await page.getByText(/^With 13 swimmer-hours on Saturday, /).waitFor();
  await page.evaluate(() => performance.clearMarks());
  await fieldOf(page).fill('60');
  const said = page.getByText(/^With 60 swimmer-hours on Saturday, /);
  await said.waitFor();
  stage.check('it says what becomes of the week', /free chlorine/.test(await said.innerText()), await said.innerText());
  await page.getByText(/ask for a test before anyone swims again\./).waitFor();
  // The line of what was tried before may be drawn only now, on a slow machine.
  await page.waitForFunction(() => {
    const input = performance.getEntriesByName('try-it:input')[0]?.startTime ?? Infinity;
    return performance.getEntriesByName('try-it:curve').some(({ startTime }) => startTime > input);
  });
  const [curve = '', start] = [(await lineOf(page)) ?? '', await page.locator('path[data-tried]').last().boundingBox()];
  stage.check('the line is drawn hour by hour', curve.split('L').length > 30, curve);
  const lane = await page
    .getByRole('img', { name: /^Free chlorine/ })
    .first()
    .boundingBox();
  const share = lane && start ? (start.x - lane.x) / lane.width : 0;
  stage.check('it leaves the curve on Saturday, the last of seven days', share > 6 / 7 - 0.02, { share });
  const marks = await page.evaluate(() => {
    const input = performance.getEntriesByName('try-it:input')[0]?.startTime ?? -1;
    const after = (name: string) =>
      performance.getEntriesByName(name).find(({ startTime }) => startTime > input)?.startTime ?? -1;
    return [input, after('try-it:sentence'), after('try-it:curve')];
  });
  const [input = -1, sentence = -1, line = -1] = marks;
  stage.check('marks stand for measuring, in their order', input >= 0 && sentence > input && line > input, marks);
  console.log(`try it: sentence after ${Math.round(sentence - input)} ms, line after ${Math.round(line - input)} ms`);
  await usable(page);
  // A picture of more than the window would lay the sheet out anew, and with it the line.
  await page.screenshot({ path: join(shotsFolder, 'try-it-1440.png') });
  await page.emulateMedia({ colorScheme: 'dark' });
  await page.screenshot({ path: join(shotsFolder, 'try-it-1440-dark.png') });
  await page.emulateMedia({ colorScheme: 'light' });
}

/** The plan with it has been worked out. */
const usable = (page: Page) => page.locator('button:not([aria-disabled])', { hasText: words('try-out.use') }).waitFor();

async function inThePlan(stage: Stage, page: Page, owner: Person): Promise<void> {
  const before = await weekOf(owner);
  await page.getByRole('button', { name: words('try-out.use') }).click();
  const said = page
    .getByRole('list', { name: words('try-out.takenTitle') })
    .getByText(/changed the plan: 60 swimmer-hours on Saturday\./);
  await said.waitFor();
  const after = await weekOf(owner);
  stage.equal('the sheet has the swimmers', swimmersIn(after), 60);
  stage.equal('one try-out is in force', after.tryOuts.length, 1);
  stage.check('there is a new plan', before.plan?.id !== after.plan?.id, after.plan?.id);
  stage.equal('the field says what the sheet says', await fieldOf(page).inputValue(), '60');
  stage.equal('the second line is gone', await page.locator('path[data-tried]').count(), 0);
  await page.reload();
  await said.waitFor();
  await page.screenshot({ path: join(shotsFolder, 'try-it-taken.png'), fullPage: true });
}

const swimmersIn = ({ days }: Awaited<ReturnType<typeof weekOf>>) =>
  days.find(({ day }) => day === SATURDAY)?.swimmerHours;

async function putBack(stage: Stage, page: Page, owner: Person): Promise<void> {
  await page.getByRole('button', { name: /^Put back: 60/ }).click();
  await page.getByText(/changed the plan/).waitFor({ state: 'detached' });
  const week = await weekOf(owner);
  stage.equal('the swimmers are as before', swimmersIn(week), 0);
  stage.equal('no try-out is in force', week.tryOuts.length, 0);
}

async function anotherEvening(stage: Stage, page: Page): Promise<void> {
  await listening(page);
  const dose = page.getByRole('combobox', { name: words('try-out.move'), exact: true });
  await dose.selectOption({ index: 1 });
  const to = page.getByRole('combobox', { name: words('try-out.moveTo'), exact: true });
  await page.waitForFunction(
    (select) => select instanceof HTMLSelectElement && select.options.length > 1,
    await to.elementHandle(),
  );
  await to.selectOption({ index: 1 });
  const said = page.getByText(/ instead of /);
  await said.waitFor();
  stage.check('it says where the dose goes', /^With .+ granules .+ instead of .+, /.test(await said.innerText()), {
    said: await said.innerText(),
  });
  await page.getByRole('button', { name: words('try-out.putBack'), exact: true }).click();
  await said.waitFor({ state: 'detached' });
}

async function onPhone(stage: Stage, server: Server, owner: Person): Promise<void> {
  for (const theme of ['light', 'dark'] as const) {
    const visitor = await stage.visitor(server, `a phone, ${theme}`, { width: 390, height: 844, touch: true, theme });
    await enterAs(visitor, owner);
    const { page } = visitor;
    await page.goto('/week');
    await sectionOf(page).scrollIntoViewIfNeeded();
    await listening(page);
    // Today's curve is the one that a phone shows.
    await page.getByRole('combobox', { name: words('try-out.day') }).selectOption({ index: 0 });
    await page.getByRole('radio', { name: words('try-out.skies.overcast') }).check({ force: true });
    await page.getByText(/^With an overcast sky today, /).waitFor();
    await saturday(page);
    await fieldOf(page).fill('60');
    await page.getByText(/^With 60 swimmer-hours on Saturday and an overcast sky today, /).waitFor();
    await usable(page);
    const wide = await page.evaluate(() => document.documentElement.scrollWidth);
    stage.equal('nothing sticks out of the page', wide, 390);
    await page.screenshot({ path: join(shotsFolder, `try-it-390-${theme}.png`), fullPage: true });
  }
}

async function aViewer(stage: Stage, server: Server, owner: Person): Promise<void> {
  const viewer = await viewerOf(server, owner, 'Kit');
  const visitor = await stage.visitor(server, 'a viewer', { width: 1440 });
  await enterAs(visitor, viewer);
  const { page } = visitor;
  await page.goto('/week');
  await saturday(page);
  await fieldOf(page).fill('60');
  await page.getByText(/^With 60 swimmer-hours on Saturday, /).waitFor();
  await page.getByText(words('try-out.viewer')).waitFor();
  stage.equal(
    'a viewer has nothing to press',
    await page.getByRole('button', { name: words('try-out.use') }).count(),
    0,
  );
  const start = await viewer.must<TryOutStart>('GET', '/api/try-outs');
  const refused = await viewer.send('POST', '/api/try-outs', {
    id: randomUUID(),
    planId: start.planId,
    swimmers: [{ day: SATURDAY, swimmerHours: 60 }],
  });
  stage.equal('the server refuses a viewer', refused.status, 403);
}
