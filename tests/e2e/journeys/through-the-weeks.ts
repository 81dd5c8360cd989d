import type { CDPSession, Page } from 'playwright-core';
import { dayRange } from '@/lib/calendar/format';
import { addDays } from '@/lib/calendar/household-day';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { until } from '../support/waiting';
import { curvesDrawn } from '../support/sheet';
import { words } from '../support/words';

/** Through the weeks by link, by key and by finger, and along a curve hour by hour. */
export const throughTheWeeks: Journey = {
  name: 'through the weeks',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'weeks', clock: sundayEvening });
    const person = new Person(server);
    await person.signUp();
    await describePool(person);
    await person.must('POST', '/api/readings', fullTest(sundayEvening));
    const sheet = await weekOf(person);
    await stage.part('at a desk', () => atADesk(stage, server, person, sheet));
    await stage.part('on a phone', () => onAPhone(stage, server, person, sheet));
  },
};

/** What the title says of a week so many weeks away. */
function titleOf({ days, household }: WeekSheet, weeks: number): string {
  const first = addDays(days[0]?.day ?? '', 7 * weeks);
  const range = dayRange(first, addDays(first, 6), household.locale, words('week.rangeJoiner'));
  return words('week.titleOf').replace('{days}', range);
}

const startsWith = (page: Page, title: string) => until(async () => (await page.title()).startsWith(title));

async function atADesk(stage: Stage, server: Server, person: Person, sheet: WeekSheet): Promise<void> {
  const visitor = await stage.visitor(server, 'desk', { width: 1440, height: 500 });
  const { page } = visitor;
  await enterAs(visitor, person);
  await page.goto('/week');
  const curve = page.getByRole('slider', {
    name: words('week.chart.readName').replace('{name}', words('week.lane.chlorine')),
  });
  await curve.waitFor();
  const weeks = page.getByRole('navigation', { name: words('week.weeks') }).first();
  const next = weeks.getByRole('link', { name: words('week.nextWeek') });
  const nightsAndLimits = page.locator('.recharts-reference-area, .recharts-reference-line');
  await until(async () => (await nightsAndLimits.count()) > 40);
  const drawn = await nightsAndLimits.count();
  const scrolled = () => page.evaluate(() => scrollY);
  await next.focus();
  await page.evaluate(() => scrollTo(0, 90));
  const before = await scrolled();
  stage.check('there is something to scroll', before > 0, before);
  await page.keyboard.press('Enter');
  stage.check('the title says which week it is', await startsWith(page, titleOf(sheet, 1)), await page.title());
  const focused = () => page.evaluate(() => document.activeElement?.getAttribute('aria-label'));
  stage.equal('the link that was pressed keeps the focus', await focused(), words('week.nextWeek'));
  // The head of another week is lower, and the browser keeps the lanes where they are: by less than they were scrolled.
  stage.check('the page is not thrown back to its top', (await scrolled()) > 0, await scrolled());
  await page.keyboard.press('ArrowRight');
  stage.check('its arrow key goes on', await startsWith(page, titleOf(sheet, 2)), await page.title());
  await page.evaluate(() => (document.activeElement as HTMLElement | null)?.blur());
  await page.keyboard.press('ArrowLeft');
  stage.check('and back, with nothing in focus', await startsWith(page, titleOf(sheet, 1)), await page.title());
  await weeks.getByRole('link', { name: words('week.thisWeek') }).click();
  await page.waitForURL((url) => url.pathname === '/week' && url.search === '');
  await until(async () => (await nightsAndLimits.count()) === drawn);
  stage.equal('nights and limits stand there as before', await nightsAndLimits.count(), drawn);

  await curve.focus();
  const said = () => curve.getAttribute('aria-valuetext');
  const [now, line] = [await said(), page.locator('[data-cursor-line]')];
  await page.keyboard.press('PageUp');
  await line.waitFor({ state: 'attached' });
  const later = await said();
  stage.check(
    'a day on, the curve says another hour and its likely range',
    later !== now && /likely .* to /.test(later ?? ''),
    later,
  );
  stage.check('and stays in its week', page.url().endsWith('/week'), page.url());
  const shown = await page.locator('[data-overlay] p').allInnerTexts();
  stage.check('all three curves show that hour', shown.length === 3 && shown[0] === later, shown);
  await page.keyboard.press('Escape');
  stage.equal('Escape leaves', await line.count(), 0);
}

async function onAPhone(stage: Stage, server: Server, person: Person, sheet: WeekSheet): Promise<void> {
  const visitor = await stage.visitor(server, 'phone', { width: 390, height: 844, touch: true });
  const { page } = visitor;
  await enterAs(visitor, person);
  await page.goto('/week');
  await curvesDrawn(page);
  await page.evaluate(() => scrollTo(0, 0));
  const finger = await visitor.context.newCDPSession(page);
  await drag(finger, { x: 320, y: 150 }, { x: 310, y: 60 });
  await page.waitForTimeout(400);
  stage.check('scrolling turns no week', page.url().endsWith('/week'), page.url());
  await page.evaluate(() => scrollTo(0, 0));
  await drag(finger, { x: 320, y: 150 }, { x: 120, y: 160 });
  stage.check(
    'a swipe to the left brings the week after',
    await startsWith(page, titleOf(sheet, 1)),
    await page.title(),
  );
  const range = titleOf(sheet, 1).split(',')[0] ?? '';
  await page.locator('header[data-turns-weeks]').getByText(range).first().waitFor();
  await drag(finger, { x: 120, y: 150 }, { x: 320, y: 160 });
  await page.waitForURL((url) => url.pathname === '/week' && url.search === '');
  stage.check('and one to the right brings back this week', page.url().endsWith('/week'), page.url());
}

type Place = { x: number; y: number };

/** A finger that is put down, drawn over the screen and lifted. */
async function drag(session: CDPSession, from: Place, to: Place): Promise<void> {
  const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', points: Place[]) =>
    session.send('Input.dispatchTouchEvent', { type, touchPoints: points });
  await touch('touchStart', [from]);
  for (let step = 1; step <= 8; step += 1)
    await touch('touchMove', [{ x: from.x + ((to.x - from.x) * step) / 8, y: from.y + ((to.y - from.y) * step) / 8 }]);
  await touch('touchEnd', []);
}
