import { randomUUID } from 'node:crypto';
import type { Page } from 'playwright-core';
import { addDays } from '@/lib/calendar/household-day';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { closeDialog, confirmStopOnDesk, nextDose, whenDue } from '../support/doses';
import { borrowSession } from '../support/enter';
import {
  addProduct,
  answerLabel,
  answerLining,
  answerScope,
  answerSize,
  answerSun,
  answerWater,
  choice,
  goOn,
  signUp,
  typeKit,
} from '../support/first-run';
import type { Journey, Stage } from '../support/journey';
import { fullTest, sundayEvening, weekOf } from '../support/households';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { apart, curves, drawnCurves, quantitiesDrawn, readSheet } from '../support/sheet';
import { until } from '../support/waiting';
import { pattern, words } from '../support/words';

const account = { email: 'ines@pool.example', password: 'four words in a row' };

/** From an empty database to a plan on real input, its doses ticked, and everything still there afterwards. */
export const firstWeek: Journey = {
  name: 'first week',
  seconds: 200,
  async run(stage) {
    const server = await stage.server({ name: 'first-week', clock: sundayEvening });
    const visitor = await stage.visitor(server, 'Ines', { width: 1440, height: 1000 });
    const { page } = visitor;
    const ines = new Person(server);
    const sheet = () => ines.must<WeekSheet>('GET', '/api/week');

    await describeEverything(stage, page);
    await enterFullTest(stage, page);
    await borrowSession(visitor, ines);

    await page.goto('/week');
    await page.locator(curves).first().waitFor({ state: 'attached' });
    await stage.part('the four notes of the first visit', () => closeTour(stage, page));
    stage.equal('three curves', await quantitiesDrawn(page), ['freeChlorine', 'pH', 'stabilizer']);
    const planned = await sheet();
    stage.check('the plan has a dose at least', planned.doses.length > 0, planned.plan);
    await stage.part('verdict, standing line and chart are words', () => readSheet(stage, page, planned));

    const first = nextDose(planned);
    if (!first) return stage.check('a dose lies ahead', false, planned.doses);
    await server.restart(whenDue(first, planned));
    stage.equal('a restart loses nothing', stateOf(await sheet()), stateOf(planned));
    await stage.part('ticking and taking back', () => tickAndUndo(stage, page, first, sheet));

    const poured = nextDose(await sheet(), 'g');
    if (!poured) return stage.check('a dose of granules follows', false, (await sheet()).doses);
    await server.restart(whenDue(poured, await sheet()));
    await stage.part('another amount', () => otherAmount(stage, page, poured, sheet));

    const after = await sheet();
    // The sheet may still be fetching something while the session ends under it.
    visitor.expect(/401 \(Unauthorized\)/);
    await page.getByRole('button', { name: words('navigation.signOut') }).click();
    await page.waitForURL((url) => ['/', '/sign-in'].includes(url.pathname));
    await page.goto('/week');
    await page.waitForURL('**/sign-in');
    stage.check('signed out, the sheet is closed', page.url().endsWith('/sign-in'), page.url());
    await page.getByLabel(words('start.signIn.email'), { exact: true }).fill(account.email);
    await page.getByLabel(words('start.signIn.password'), { exact: true }).fill(account.password);
    await page.getByRole('button', { name: words('start.signIn.submit') }).click();
    await page.waitForURL('**/week');
    await page.locator(curves).first().waitFor({ state: 'attached' });
    await borrowSession(visitor, ines);
    stage.equal('signed in again, all is as it was', stateOf(await sheet()), stateOf(after));

    // A sheet left open would ask the server that is about to be killed.
    await page.goto('about:blank');
    await stage.part('a crash right after a save', () => crash(stage, server, ines));
  },
};

const stateOf = ({ doses, readings, plan }: WeekSheet) => ({
  plan: plan?.id,
  doses: doses.map(({ id, status, givenAmount, givenAt }) => ({ id, status, givenAmount, givenAt })),
  readings: readings.map(({ id, values }) => ({ id, values })),
});

type Sheets = () => Promise<WeekSheet>;

/** The same visit in a later version of the plan: a plan that is made again gives its doses new ids. */
const sameDose = ({ doses }: WeekSheet, { at, substance }: PlanDose) =>
  doses.find((dose) => dose.substance === substance && dose.at.slice(0, 10) === at.slice(0, 10));

const sameDoseNow = async (sheet: Sheets, planned: PlanDose) => sameDose(await sheet(), planned);

async function becomes(stage: Stage, what: string, dose: PlanDose, status: string, sheet: Sheets): Promise<void> {
  const found = async () => (await sameDoseNow(sheet, dose))?.status;
  await until(async () => (await found()) === status);
  stage.equal(what, await found(), status);
}

async function openWeek(page: Page): Promise<void> {
  await page.goto('/week');
  await page.locator(curves).first().waitFor({ state: 'attached' });
}

/** Read once to the end, they never come back. */
async function closeTour(stage: Stage, page: Page): Promise<void> {
  const tour = page.getByRole('region', { name: words('tour.name') });
  for (const note of ['verdict', 'curve', 'doses', 'help']) {
    await tour.getByText(words(`tour.${note}.title`)).waitFor();
    if (note !== 'help') await tour.getByRole('button', { name: words('tour.next') }).click();
  }
  const closed = page.waitForResponse((response) => response.url().endsWith('/api/tour'));
  await tour.getByRole('button', { name: words('tour.done') }).click();
  stage.equal('that they are read is kept', (await closed).status(), 200);
  await openWeek(page);
  stage.equal('and they do not come back', await tour.count(), 0);
}

/** One tap, and the way back. */
export async function tickAndUndo(stage: Stage, page: Page, planned: PlanDose, sheet: Sheets): Promise<void> {
  await openWeek(page);
  const tickHere = page.getByText(words('doses.action.given'), { exact: true }).first();
  stage.check('before its first dose the Stop of a product is to be read', !(await tickHere.isVisible()));
  await confirmStopOnDesk(page);
  await tickHere.click();
  await becomes(stage, 'one tap marks the dose as given', planned, 'given', sheet);
  const given = await sameDoseNow(sheet, planned);
  stage.equal('what was planned is what was given', given?.givenAmount, planned.amount);
  stage.equal('and who gave it is kept', [given?.doneBy, given?.recordedBy], ['Ines', 'Ines']);

  const undo = page.getByRole('button', { name: words('doses.action.undo'), exact: true });
  await undo.first().click();
  await page.getByRole('dialog').locator(undo).click();
  await becomes(stage, 'a tick can be taken back', planned, 'planned', sheet);
  await closeDialog(page);
  await tickHere.click();
  await becomes(stage, 'and given again', planned, 'given', sheet);
}

/** Another amount went in, typed with a decimal comma: it counts, and moves the curve. */
async function otherAmount(stage: Stage, page: Page, planned: PlanDose, sheet: Sheets): Promise<void> {
  await openWeek(page);
  // The first dose was one of tablets or of these.
  if ((await sameDoseNow(sheet, planned))?.stopDue) await confirmStopOnDesk(page);
  const before = await drawnCurves(page);
  const dialog = page.getByRole('dialog');
  const press = (name: string) => dialog.getByRole('button', { name: words(name), exact: true }).click();
  // Doses before it that nobody ticked are due as well; this one is the last of them.
  await page
    .getByRole('button', { name: words('doses.action.stepsAndMore') })
    .last()
    .click();
  await press('doses.action.other');
  const field = dialog.getByLabel(words('doses.action.otherAmount'));
  await field.fill('viel');
  await press('doses.action.otherNext');
  stage.check('no number is said to be none', await dialog.getByText(words('doses.action.otherProblem')).isVisible());
  await field.fill('123,5');
  await press('doses.action.otherNext');
  await dialog.getByRole('button', { name: pattern('doses.action.otherConfirm') }).click();
  await becomes(stage, 'another amount is taken', planned, 'changed', sheet);
  stage.equal('with the comma read as one', (await sameDoseNow(sheet, planned))?.givenAmount, 123.5);
  await closeDialog(page);
  await until(async () => apart(before, await drawnCurves(page)) > 3);
  const after = await drawnCurves(page);
  stage.check('the curve follows', apart(before, after) > 3, apart(before, after));

  await page.reload();
  await page.locator(curves).first().waitFor({ state: 'attached' });
  const reloaded = apart(after, await drawnCurves(page));
  stage.check('after a reload the curves are as they were', reloaded < 1, reloaded);
  stage.equal('and the dose too', (await sameDoseNow(sheet, planned))?.status, 'changed');
}

/** What was confirmed is on disk: the process ends without a chance to tidy up. */
async function crash(stage: Stage, server: Server, ines: Person): Promise<void> {
  const soon = async (seconds: number) => new Date(Date.parse((await weekOf(ines)).now) + seconds * 1000).toISOString();
  const clock = await soon(60);
  const reading = fullTest((await weekOf(ines)).now, { kind: 'quick', values: { freeChlorine: 1.6, pH: 7.4 } });
  await ines.must('POST', '/api/readings', reading);
  await server.kill();
  await server.restart(clock);
  const listed = (await weekOf(ines)).readings.map(({ id }) => id);
  stage.check('a reading that was confirmed survives a crash', listed.includes(reading.id), listed);

  const week = await weekOf(ines);
  // Late in the week the next dose may lie in the one after.
  const nextWeek = addDays(week.days[0]!.day, 7);
  const open = nextDose(week) ?? nextDose(await ines.must<WeekSheet>('GET', `/api/week?start=${nextWeek}`));
  if (!open) return stage.check('a dose is left to tick', false, week.doses);
  const due = whenDue(open, week);
  await server.restart(due);
  const tick = { action: 'given', id: randomUUID(), planVersion: open.planVersion };
  await ines.must('POST', `/api/doses/${open.id}/ticks`, tick);
  await server.kill();
  await server.restart(new Date(Date.parse(due) + 60_000).toISOString());
  const found = (await weekOf(ines)).doses.find(({ id }) => id === open.id);
  stage.equal('a tick that was confirmed survives a crash', found?.status, 'given');
  const again = await ines.send('POST', `/api/doses/${open.id}/ticks`, tick);
  stage.equal('the same tick sent again is the same tick', again.status, 200);
  const doubtful = (again.body as WeekSheet | undefined)?.verdict.reasons.map(({ code }) => code);
  stage.check('and is no double dose', doubtful?.includes('suspected-double-dose') === false, doubtful);
}

export async function describeEverything(stage: Stage, page: Page): Promise<void> {
  await signUp(page, account);
  await answerScope(page);
  await goOn(page, 'scope', '/first-run/size');
  await answerSize(page, '75,7');
  await goOn(page, 'size', '/first-run/lining');
  // Half-way through: what was answered is kept, and the first run opens where it stood.
  await answerLining(page);
  await page.reload();
  const chosen = choice(page, words('pool.lining.surface.plaster.detail')).locator('input');
  stage.equal('what was chosen and not yet saved survives a reload', await chosen.isChecked(), true);
  await page.goto('/first-run');
  await page.waitForURL('**/first-run/lining');
  stage.check('the first run goes on where it stood', page.url().endsWith('/first-run/lining'), page.url());
  await goOn(page, 'lining', '/first-run/sun');
  await answerSun(page, { latitude: '28', longitude: '-81.5' });
  await goOn(page, 'sun', '/first-run/water');
  await answerWater(page);
  await goOn(page, 'water', '/first-run/shelf');
  const tablets = { substance: 'trichlor', form: 'tablet', strength: '90', tabletMass: '227', stock: '20' } as const;
  await addProduct(page, { ...tablets, way: 'feeder-only' });
  const granules = { substance: 'calcium-hypochlorite', form: 'granular', strength: '65', stock: '4,5' } as const;
  await addProduct(page, { ...granules, way: 'dissolve' });
  await goOn(page, 'shelf', '/first-run/label');
  await answerLabel(page);
  await goOn(page, 'label', '/week');
  await page.getByText(words('week.state.firstTitle')).waitFor();
}

export async function enterFullTest(stage: Stage, page: Page): Promise<void> {
  await page
    .getByRole('link', { name: words('week.next.enter') })
    .first()
    .click();
  await page.waitForURL('**/test*');
  await choice(page, words('readings.kind.full')).first().click();
  await choice(page, words('readings.method.drop-kit')).click();
  await typeKit(page, {
    freeChlorine: '3',
    totalChlorine: '3.2',
    pH: '7,5',
    totalAlkalinity: '80',
    calciumHardness: '220',
    cyanuricAcid: '50',
    temperature: '29',
  });
  await page.locator('#value-temperature').blur();
  await page.getByRole('button', { name: words('readings.save.full') }).click();
  await page.getByText(words('readings.saved.title')).waitFor();
  const heading = await page.locator('[data-verdict]').first().getAttribute('data-verdict');
  stage.equal('after saving the first line is the swim state', heading, 'fine');
}
