import type { Page } from 'playwright-core';
import { sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { until } from '../support/waiting';
import { words } from '../support/words';

/** The start page: a sheet that works without signing in, and one that is read without scripts. */
export const landing: Journey = {
  name: 'landing',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'landing', clock: sundayEvening, fresh: true });
    await stage.part('with scripts', async () => {
      const { page } = await stage.visitor(server, 'a visitor', { width: 1440 });
      await tryIt(stage, page);
    });
    await stage.part('moved before the scripts have come', async () => {
      const { page } = await stage.visitor(server, 'a quick visitor', { width: 390, height: 844 });
      await moveEarly(stage, page);
    });
    await stage.part('without scripts', async () => {
      const { page } = await stage.visitor(server, 'a visitor without scripts', { width: 390, scripts: false });
      await page.goto('/');
      const text = await page.locator('main').innerText();
      stage.check('a whole week is read', text.includes(words('start.sample.fullTest')), text);
      stage.check('with its doses', /\d+ (slow )?tablets?/.test(text), text);
      stage.check('and why nothing moves', text.includes('need scripts'), text);
      const button = page.getByRole('button', { name: words('start.landing.lookRound') });
      stage.equal('no button that does nothing', await button.count(), 0);
      stage.equal('no slider that does nothing', await page.getByRole('slider').count(), 0);
      await page
        .getByRole('link', { name: words('start.landing.start') })
        .first()
        .click();
      stage.check('its links lead on', page.url().endsWith('/sign-up'), page.url());
    });
  },
};

async function tryIt(stage: Stage, page: Page): Promise<void> {
  const answered: string[] = [];
  await page.goto('/');
  const firstScripts = await scriptsOf(page);
  page.on('request', (request) => {
    if (request.resourceType() !== 'script' && !request.url().includes('/_next/')) answered.push(request.url());
  });
  const slider = page.getByRole('slider', { name: words('start.sample.stabilizer') });
  await slider.press('End');
  await page.getByText(words('start.sample.replaceWater')).waitFor();
  stage.equal('the slider stands where it was put', await slider.inputValue(), '100');
  stage.equal('the keys still move it', await slider.evaluate((element) => element === document.activeElement), true);
  stage.check('the engine came after the page', (await scriptsOf(page)) > firstScripts, firstScripts);
  await page.getByText(words('start.sample.putBack')).click();
  await page.getByText('Two evenings in seven days.').waitFor();
  stage.none('nothing was asked of the server', answered);
}

async function moveEarly(stage: Stage, page: Page): Promise<void> {
  await page.goto('/', { waitUntil: 'commit' });
  const slider = page.getByRole('slider', { name: words('start.sample.stabilizer') });
  await slider.waitFor();
  const box = (await slider.boundingBox())!;
  await slider.scrollIntoViewIfNeeded();
  const { y } = (await slider.boundingBox())!;
  await page.mouse.move(box.x + box.width / 3, y + 22);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width - 3, y + 22, { steps: 4 });
  await page.waitForTimeout(600);
  await page.mouse.up();
  await page.getByText(words('start.sample.replaceWater')).waitFor();
  await until(async () => (await slider.inputValue()) === '100', { seconds: 5 });
  stage.equal('what was moved before stays moved', await slider.inputValue(), '100');
}

const scriptsOf = (page: Page) =>
  page.evaluate(() => performance.getEntriesByType('resource').filter(({ name }) => /\.js\b/.test(name)).length);
