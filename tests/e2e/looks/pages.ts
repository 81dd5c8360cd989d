import type { Page } from 'playwright-core';
import { readStop } from '../support/doses';
import { choice } from '../support/first-run';
import { curvesDrawn } from '../support/sheet';
import { pattern, words } from '../support/words';

/** A page, or a state of one, as somebody sees it. */
export type View = {
  name: string;
  path: string;
  /** What has to be pressed first, and what has to be there before it is looked at. */
  prepare?: (page: Page) => Promise<void>;
  /** Not found on purpose. */
  missing?: true;
};

const shows = (text: string | RegExp) => async (page: Page) => {
  await page.getByText(text).first().waitFor();
};

export const signedOut: readonly View[] = [
  { name: 'landing', path: '/' },
  { name: 'sign-in', path: '/sign-in' },
  { name: 'reset', path: '/reset' },
  { name: 'sign-up', path: '/sign-up' },
  {
    name: 'sign-up-refused',
    path: '/sign-up',
    async prepare(page) {
      await page.getByRole('button', { name: words('start.signUp.submit') }).click();
      await page.getByText(words('start.form.empty')).first().waitFor();
    },
  },
  { name: 'help', path: '/help' },
  { name: 'emergency', path: '/help/emergency' },
  { name: 'safety', path: '/help/safety' },
  { name: 'privacy', path: '/help/privacy' },
  { name: 'not-found', path: '/there-is-no-such-page', missing: true },
];

/** How the figures are worked out; open to everybody. */
export const workedOut: readonly View[] = [
  { name: 'how', path: '/help/how' },
  { name: 'how-free-chlorine', path: '/help/how/free-chlorine' },
  {
    name: 'how-forms-moved',
    path: '/help/how/chlorine-forms',
    async prepare(page) {
      await page.getByRole('slider', { name: words('how-examples.input.stabilizer') }).press('PageUp');
      await page.getByRole('button', { name: words('how-examples.putBack') }).waitFor();
    },
  },
  { name: 'how-ph', path: '/help/how/ph' },
  { name: 'how-likely-range', path: '/help/how/likely-range' },
  { name: 'how-unknown', path: '/help/how/unknown' },
  { name: 'how-constants', path: '/help/how/constants' },
];

/** For somebody in the middle of the first run, with all steps open. */
export const firstRun: readonly View[] = [
  { name: 'first-run-scope', path: '/first-run/scope', prepare: shows(words('pool.scope.title')) },
  { name: 'first-run-size', path: '/first-run/size', prepare: shows(words('pool.size.title')) },
  {
    name: 'first-run-size-doubt',
    path: '/first-run/size',
    async prepare(page) {
      await page.getByLabel(words('pool.size.volume'), { exact: true }).fill('18000');
      await page
        .getByRole('button', { name: pattern('pool.size.doubt.no') })
        .first()
        .waitFor();
    },
  },
  {
    name: 'first-run-size-drawn',
    path: '/first-run/size',
    async prepare(page) {
      await choice(page, words('pool.size.how.measured')).click();
      await page.getByLabel(words('pool.size.measure.length'), { exact: true }).fill('10');
      await page.getByLabel(words('pool.size.measure.width'), { exact: true }).fill('5');
      await page.getByLabel(words('pool.size.measure.shallow'), { exact: true }).fill('1.1');
      await page.getByLabel(words('pool.size.measure.deep'), { exact: true }).fill('1.9');
    },
  },
  { name: 'first-run-lining', path: '/first-run/lining', prepare: shows(words('pool.lining.title')) },
  { name: 'first-run-sun', path: '/first-run/sun', prepare: shows(words('pool.sun.title')) },
  { name: 'first-run-water', path: '/first-run/water', prepare: shows(words('pool.water.title')) },
  { name: 'first-run-shelf', path: '/first-run/shelf', prepare: shows(words('pool.shelf.title')) },
  {
    name: 'first-run-product',
    path: '/first-run/shelf',
    async prepare(page) {
      const first = page.getByRole('button', { name: words('pool.shelf.addFirst') });
      await first.or(page.getByRole('button', { name: words('pool.shelf.addAnother') })).click();
      await page.getByRole('region', { name: words('pool.product.title') }).waitFor();
    },
  },
  { name: 'first-run-label', path: '/first-run/label', prepare: shows(words('pool.label.title')) },
];

const testForm = (method: 'strip' | 'drop-kit' | 'slip') => async (page: Page) => {
  await choice(page, words('readings.kind.full')).first().click();
  await choice(page, words(`readings.method.${method}`)).click();
};

/** For a member of a household whose week is full. */
export const signedIn: readonly View[] = [
  {
    name: 'week',
    path: '/week',
    async prepare(page) {
      await curvesDrawn(page);
    },
  },
  {
    name: 'week-tables',
    path: '/week',
    async prepare(page) {
      await curvesDrawn(page);
      await page.getByRole('button', { name: words('week.table.days'), exact: true }).click();
      await page.getByRole('region').locator('table').first().waitFor();
    },
  },
  { name: 'week-print', path: '/week/print', prepare: shows(words('week-print.readings.title')) },
  { name: 'test-strip', path: '/test', prepare: testForm('strip') },
  { name: 'test-kit', path: '/test', prepare: testForm('drop-kit') },
  {
    name: 'test-doubts',
    path: '/test',
    async prepare(page) {
      await testForm('drop-kit')(page);
      await page.locator('#value-freeChlorine').fill('0');
      await page.locator('#value-pH').fill('74');
      await page.locator('#value-totalAlkalinity').fill('700');
      await page.locator('#value-calciumHardness').fill('many');
      await page.locator('#value-calciumHardness').blur();
      await page.getByText(words('readings.zero.title')).waitFor();
    },
  },
  {
    name: 'pool',
    path: '/pool',
    async prepare(page) {
      await page.getByText(words('learnt.legend')).waitFor();
      await page
        .getByRole('button', { name: pattern('learnt.why.openFor') })
        .first()
        .click();
      await page.locator('summary', { hasText: words('learnt.more') }).click();
      await page.getByRole('heading', { name: words('learnt.thing.carbonDioxideTransfer.name') }).waitFor();
    },
  },
  {
    name: 'pool-start-again',
    path: '/pool',
    async prepare(page) {
      await page.getByRole('button', { name: words('learnt.table.see') }).click();
      await page.getByRole('button', { name: words('learnt.forget.open') }).click();
      await page.getByRole('dialog').waitFor();
    },
  },
  { name: 'pool-sun', path: '/pool/sun', prepare: shows(words('pool.sun.title')) },
  { name: 'help-signed-in', path: '/help' },
  { name: 'situations', path: '/situations', prepare: shows(words('situations.onlyOne')) },
  {
    name: 'situations-accident',
    path: '/situations/accident',
    async prepare(page) {
      await page.getByRole('button', { name: words('situations.begin.button') }).click();
      await choice(page, words('situations.answer.vomit')).click();
      await page.getByText(words('situations.questions.missing')).waitFor();
    },
  },
  {
    name: 'situations-stabilizer',
    path: '/situations/stabilizer-high',
    prepare: shows(words('situations.begin.button')),
  },
  { name: 'house', path: '/house', prepare: shows(words('house.field.gate')) },
  { name: 'house-sheet', path: '/house/sheet', prepare: shows(words('house.sheet.doses.nobody')) },
  { name: 'household', path: '/household', prepare: shows(words('household.does.owner')) },
  {
    name: 'household-on-duty',
    path: '/household',
    async prepare(page) {
      await page.getByText(words('household.does.owner')).first().waitFor();
      // It stays from one width to the next.
      if (await page.getByText(words('household.duty.none')).isVisible()) {
        await page.getByText(words('household.duty.open')).click();
        await page.getByLabel(words('household.duty.from'), { exact: true }).fill('2026-07-12');
        await page.getByLabel(words('household.duty.until'), { exact: true }).fill('2026-07-18');
        await page.getByRole('button', { name: words('household.duty.ask'), exact: true }).click();
      }
      await page.getByRole('button', { name: words('household.duty.takeBack'), exact: true }).waitFor();
      await page.getByRole('button', { name: words('household.audit.show'), exact: true }).click();
      await page.locator('[aria-labelledby="audit-trail"] li').first().waitFor();
    },
  },
  {
    name: 'rounds-exceptions',
    path: '/rounds',
    async prepare(page) {
      for (const item of ['water-level', 'filter-pressure', 'pump-seal', 'drain-cover'] as const) {
        const name = words(`rounds.item.${item}.name`);
        await page.getByRole('button', { name: `${name}: not fine` }).click();
      }
      await page.locator('summary', { hasText: words('house.visits.writeDown') }).click();
      await page.getByLabel(words('house.visits.note')).waitFor();
    },
  },
];

/** For a household to whose pool something has happened while a dose was due. */
export const happened: readonly View[] = [
  {
    name: 'week-something-happened',
    path: '/week',
    async prepare(page) {
      await page.getByText(words('events.dosing.drain-cover')).first().waitFor({ state: 'attached' });
    },
  },
  { name: 'week-print-happened', path: '/week/print', prepare: shows(words('week-print.asks.barred')) },
  {
    name: 'week-what-happened',
    path: '/week',
    async prepare(page) {
      await page.getByRole('button', { name: words('events.ask') }).click();
      await page.getByRole('radio', { name: words('events.kind.drain-cover.name') }).check({ force: true });
    },
  },
];

const drawn = async (page: Page) => {
  const sheet = page.getByRole('region', { name: words('situations.chart.scroll') });
  await sheet.getByRole('img').first().waitFor({ state: 'attached' });
};

/** For a household whose water is clearing, on its third morning. */
export const clearing: readonly View[] = [
  { name: 'situations-clearing', path: '/situations/clearing', prepare: drawn },
  { name: 'situations-open', path: '/situations', prepare: shows(words('situations.onlyOne')) },
  {
    name: 'situations-mistake',
    path: '/situations/clearing',
    async prepare(page) {
      await drawn(page);
      await page.getByRole('button', { name: words('situations.ends.mistakeButton') }).click();
      await page.getByRole('dialog').waitFor();
    },
  },
  { name: 'situations-other', path: '/situations/storm', prepare: shows(words('situations.begin.toOpen')) },
];

/** For somebody whose pool is out of scope. */
export const stopped: readonly View[] = [
  { name: 'first-run-stop', path: '/first-run/scope', prepare: shows(words('first-run.stopTitle')) },
];

/** For a household that has described its pool and tested nothing yet. */
export const untested: readonly View[] = [
  { name: 'week-first', path: '/week', prepare: shows(words('week.state.firstTitle')) },
];

/** For a household whose pool makes its chlorine from salt. */
export const recordOnly: readonly View[] = [
  { name: 'week-record-only', path: '/week', prepare: shows(words('week.state.recordOnlyTitle')) },
];

const dueDose = async (page: Page) => {
  await page.getByText(words('doses.action.given'), { exact: true }).first().waitFor();
};

/** For somebody who has a dose to add and has not read the Stop of its product yet. */
export const unread: readonly View[] = [
  {
    name: 'week-stop',
    path: '/week',
    async prepare(page) {
      // A phone shows it on the page itself.
      const steps = page.getByRole('button', { name: words('doses.stop.first') }).first();
      await steps.or(readStop(page)).first().waitFor();
      if (await steps.isVisible()) await steps.click();
      await readStop(page).waitFor();
    },
  },
];

/** For a household in whose week a dose is due now. */
export const due: readonly View[] = [
  { name: 'week-due', path: '/week', prepare: dueDose },
  {
    name: 'week-steps',
    path: '/week',
    async prepare(page) {
      await dueDose(page);
      // A phone shows the steps on the page itself.
      const steps = page.getByRole('button', { name: words('doses.action.stepsAndMore') }).first();
      if (await steps.isVisible()) await steps.click();
    },
  },
  {
    name: 'more',
    path: '/week',
    async prepare(page) {
      await dueDose(page);
      const more = page.getByRole('button', { name: words('navigation.more'), exact: true });
      if (await more.isVisible()) await more.click();
    },
  },
  {
    name: 'house-sheet-named',
    path: '/house/sheet',
    async prepare(page) {
      await page.getByRole('link', { name: 'Ines', exact: true }).click();
      await page.getByText(pattern('house.sheet.doses.steps')).first().waitFor();
    },
  },
  {
    name: 'test-saved',
    path: '/test?kind=quick',
    async prepare(page) {
      await choice(page, words('readings.kind.quick')).first().click();
      await choice(page, words('readings.method.drop-kit')).click();
      await page.locator('#value-freeChlorine').fill('2.7');
      await page.locator('#value-pH').fill('7.5');
      await page.locator('#value-pH').blur();
      await page.getByRole('button', { name: words('readings.save.quick') }).click();
      await page.getByText(words('readings.saved.title')).waitFor();
    },
  },
  {
    name: 'test-saved-slip',
    path: '/test?kind=quick',
    async prepare(page) {
      await choice(page, words('readings.kind.quick')).first().click();
      await choice(page, words('readings.method.slip')).click();
      await page.locator('#value-freeChlorine').fill('2.8');
      await page.locator('#value-pH').fill('7.5');
      await page.locator('#value-pH').blur();
      await page.getByRole('button', { name: words('readings.save.quick') }).click();
      for (const product of ['calcium-hypochlorite', 'cyanuric-acid', 'copper'])
        await page.getByRole('button', { name: words(`house.shop.product.${product}`) }).click();
      await page.getByText(words('house.shop.keepAway')).waitFor();
    },
  },
];
