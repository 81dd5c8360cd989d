import type { Page } from 'playwright-core';
import { enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { until } from '../support/waiting';
import { words } from '../support/words';

const kept = 'wadewell-emergency-card';
const filesKept = (page: Page) =>
  page.evaluate(async (name) => ((await caches.has(name)) ? (await (await caches.open(name)).keys()).length : 0), kept);

/** The emergency card on a phone without a connection, and after somebody has signed out. */
export const cardOffline: Journey = {
  name: 'emergency card without a connection',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'card-offline', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    const visitor = await stage.visitor(server, 'Ines', { width: 390, height: 844, touch: true });
    const { page } = visitor;
    await enterAs(visitor, ines);
    await page.goto('/week');
    // Ten seconds after the page, and then the time that its files take.
    stage.check(
      'the card and its files are kept',
      await until(async () => (await filesKept(page)) > 3, { seconds: 30 }),
    );
    // While its files are fetched the worker is not in charge yet.
    await page.evaluate(() => navigator.serviceWorker.ready.then(({ active }) => active?.state));
    stage.check(
      'the worker is in charge',
      await until(() => page.evaluate(() => navigator.serviceWorker.controller !== null)),
    );

    visitor.expect(/ERR_INTERNET_DISCONNECTED/, /ERR_FAILED/, /fetch/i);
    await page.context().setOffline(true);
    const answer = await page.goto('/help/emergency');
    stage.equal('it opens', answer?.status(), 200);
    await page.getByRole('heading', { level: 1, name: words('help.emergency.headline') }).waitFor();
    const call = page.getByRole('link', { name: /911/ }).first();
    stage.equal('with the numbers of the household’s country', await call.getAttribute('href'), 'tel:911');
    const family = await page.evaluate(
      () => getComputedStyle(document.querySelector('h1') ?? document.body).fontFamily,
    );
    stage.check('in its own type', !/^(Times|serif)/.test(family), family);
    const loaded = await page.evaluate(() => [...document.fonts].filter(({ status }) => status === 'loaded').length);
    stage.check('which is there, too', loaded > 0, loaded);
    const words911 = await page.locator('main').innerText();
    stage.check('and all of its words', words911.includes(words('help.emergency.after')), words911);

    await page.context().setOffline(false);
    await page.goto('/week');
    await page.setViewportSize({ width: 1280, height: 900 });
    await page.getByRole('button', { name: words('navigation.signOut') }).click();
    await page.waitForURL((url) => url.pathname === '/');
    // The server has had everything forgotten, the worker too: it comes back as on a first visit.
    stage.check(
      'it is kept anew for whoever comes next',
      await until(async () => (await filesKept(page)) > 3, { seconds: 30 }),
    );
    const text = await page.evaluate(async () => (await (await caches.match('/help/emergency'))?.text()) ?? '');
    stage.check('as a whole', text.includes(words('help.emergency.after')), text.length);
    stage.check('with no name of whoever signed out', !text.includes('Ines'));
  },
};
