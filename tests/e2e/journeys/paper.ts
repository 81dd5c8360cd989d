import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { boxFaults } from '../looks/boxes';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { inkOf, paperSize, takesOnePage } from '../support/paper';
import { Person } from '../support/person';
import { shotsFolder } from '../support/place';
import { words } from '../support/words';

const shows = (page: Page) => page.getByRole('heading', { name: words('week-print.readings.title') }).waitFor();

/** The week on paper: of this week and the next, in both systems of units, before the first test and after something happened. */
export const paper: Journey = {
  name: 'week on paper',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'paper', clock: sundayEvening });
    const owner = new Person(server);
    await owner.signUp({ unitSystem: 'us' });
    await describePool(owner);
    const visitor = await stage.visitor(server, 'the owner', { width: 1440 });
    await enterAs(visitor, owner);
    const { page } = visitor;
    await stage.part('before the first test', async () => {
      await page.goto('/week/print');
      await page.getByText(words('week-print.bar.untested')).waitFor();
      await printed(stage, page, 'paper-untested');
    });
    await owner.must('POST', '/api/readings', fullTest(sundayEvening));
    await owner.must('PUT', '/api/house-notes', {
      ourPhone: '+1 555 0100',
      neighbourName: 'Ada',
      neighbourPhone: '555 0142',
      professionalName: 'The pool firm in the lane',
      professionalPhone: '(555) 0199',
    });
    await stage.part('from the sheet to the paper', async () => {
      await page.goto('/week');
      await page.getByRole('link', { name: words('week.print') }).click();
      await shows(page);
      await printed(stage, page, 'paper-this-week');
    });
    await stage.part('the week to come, in which the plan is carried out', async () => {
      await page.goto('/week/print?start=2026-07-12');
      await shows(page);
      await printed(stage, page, 'paper-next-week');
      await page.getByRole('link', { name: words('week-print.back') }).click();
      await page.waitForURL(/\/week\?start=2026-07-12/);
    });
    await stage.part('the sheet itself is not for the printer', async () => {
      await page.goto('/week');
      await page.getByRole('link', { name: words('week.print') }).waitFor();
      await page.emulateMedia({ media: 'print' });
      const seen = (await page.locator('main').innerText()).replace(/\s+/g, ' ').trim();
      stage.equal('only the way to the page is printed', seen, words('week-print.elsewhere'));
      await page.emulateMedia({ media: null });
      await page.goto('/week/print');
      await shows(page);
    });
    await stage.part('in the other units, of a week that is under way', async () => {
      stage.check('US units so far', /ppm/.test(await page.locator('main').innerText()));
      const guest = new Person(server);
      await guest.must('POST', '/api/look-round');
      const other = await stage.visitor(server, 'a guest of the demo household', { width: 1440 });
      await enterAs(other, guest);
      await other.page.goto('/week/print');
      await shows(other.page);
      stage.check('metric', /mg\/L/.test(await other.page.locator('main').innerText()));
      await printed(stage, other.page, 'paper-demo');
    });
    await stage.part('after something happened', async () => {
      await owner.must('POST', '/api/pool-events', {
        id: '7a0f3f57-6a53-4b0c-9d8e-0f7d3b1c5e21',
        kind: 'drain-cover',
        happenedAt: '2026-07-05T19:00:30-04:00',
      });
      await page.goto('/week/print');
      await page.getByRole('heading', { name: words('week-print.asks.barred') }).waitFor();
      const boxes = await page.getByText(words('week-print.toDo.added'), { exact: true }).count();
      stage.equal('no box to tick for a dose', boxes, 0);
      await printed(stage, page, 'paper-barred');
    });
  },
};

/** One page of each paper, in black alone, with no word cut off or over another. */
async function printed(stage: Stage, page: Page, name: string): Promise<void> {
  await takesOnePage(stage, page, name);
  await page.emulateMedia({ media: 'print', colorScheme: 'dark' });
  await page.setViewportSize(paperSize);
  stage.equal(`${name}: no bar`, await page.getByRole('navigation').first().isVisible(), false);
  stage.none(`${name}: black on white`, await inkOf(page));
  const { clipped, overlaps } = await boxFaults(page);
  stage.none(`${name}: no word cut`, clipped);
  stage.none(`${name}: no word over another`, overlaps);
  await page.screenshot({ path: join(shotsFolder, `${name}.png`), fullPage: true });
  // Told 'screen' it would print so, too.
  await page.emulateMedia({ media: null, colorScheme: 'light' });
  await page.setViewportSize({ width: 1440, height: 1000 });
}
