import type { Page } from 'playwright-core';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { boxFaults, sidewaysScroll } from '../looks/boxes';
import { layEverythingOut } from '../looks/lay-everything-out';
import { nextDose, whenDue } from '../support/doses';
import { borrowSession, enterAs } from '../support/enter';
import { sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { curves } from '../support/sheet';
import { inLanguage, words } from '../support/words';
import { describeEverything, enterFullTest, tickAndUndo } from './first-week';

/** Somebody who reads only Spanish: from the first page to a ticked dose, and back after signing out. */
export const inSpanish: Journey = {
  name: 'in Spanish',
  seconds: 200,
  run: (stage) =>
    inLanguage('es', async () => {
      const server = await stage.server({ name: 'spanish', clock: sundayEvening });
      const visitor = await stage.visitor(server, 'Inés', { width: 1440, height: 1000, locale: 'es-US' });
      const { page } = visitor;
      await page.goto('/');
      stage.equal('the first page is in the language of the browser', await languageOf(page), 'es');
      await page
        .getByRole('link', { name: words('start.landing.start') })
        .first()
        .waitFor();
      stage.none('it says nothing in English', await englishOn(page));

      await describeEverything(stage, page);
      await enterFullTest(stage, page);
      const ines = new Person(server);
      await borrowSession(visitor, ines);
      await ines.must('PUT', '/api/tour', { closed: true });
      const refused = (await ines.send('PUT', '/api/language', { language: 'fr' })).text;
      stage.check('a refusal is in Spanish', refused.includes('Elige inglés o español.'), refused);
      const sheet = () => ines.must<WeekSheet>('GET', '/api/week');
      const first = nextDose(await sheet());
      if (!first) return stage.check('a dose lies ahead', false, (await sheet()).doses);
      await server.restart(whenDue(first, await sheet()));
      await stage.part('ticking and taking back', () => tickAndUndo(stage, page, first, sheet));
      await page.locator(curves).first().waitFor({ state: 'attached' });
      stage.none('the sheet says nothing in English', await englishOn(page));
    }),
};

/** Whoever chose a language is spoken to in it, before and after signing in, and may choose again. */
export const choosingLanguage: Journey = {
  name: 'choosing a language',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'language', clock: sundayEvening });
    const { page } = await stage.visitor(server, 'a guest', { width: 390, height: 844, touch: true });
    await page.goto('/');
    stage.equal('an English browser is spoken to in English', await languageOf(page), 'en');
    await page
      .getByRole('link', { name: words('navigation.language.es') })
      .first()
      .click();
    await page.waitForFunction(() => document.documentElement.lang === 'es');
    stage.equal('the address says nothing of it', new URL(page.url()).search, '');
    await inLanguage('es', async () => {
      await page.waitForLoadState('networkidle');
      await page
        .getByRole('button', { name: words('start.landing.lookRound') })
        .first()
        .click();
      await page.waitForURL('**/week');
      stage.equal('the choice goes on inside', await languageOf(page), 'es');
      await page.waitForLoadState('networkidle');
      await page.getByRole('button', { name: words('navigation.more'), exact: true }).click();
      await page.getByRole('button', { name: words('navigation.language.en') }).click();
    });
    await page.waitForFunction(() => document.documentElement.lang === 'en');
    stage.check('and can be changed there', page.url().endsWith('/week'), page.url());
  },
};

const beforeTheDoor = [
  '/',
  '/sign-in',
  '/sign-up',
  '/reset',
  '/help/emergency',
  '/help/safety',
  '/help/privacy',
  '/help/how',
  '/help/how/free-chlorine',
  '/help/how/volume',
];
const inside = ['/week', '/week/print', '/test', '/pool', '/situations', '/rounds', '/house', '/household', '/help'];

/** Spanish words are longer: nothing may run over at the narrowest and at the widest. */
export const spanishPages: Journey = {
  name: 'Spanish pages',
  seconds: 240,
  async run(stage) {
    const server = await stage.server({ name: 'spanish-pages', clock: sundayEvening });
    const person = new Person(server);
    await person.must('PUT', '/api/language', { language: 'es' });
    await person.must('POST', '/api/look-round');
    for (const width of [320, 1440]) {
      const visitor = await stage.visitor(server, `at ${width}`, { width, height: 900, locale: 'es-ES' });
      const lookAt = (path: string) => stage.part(`${path} at ${width}`, () => look(stage, visitor.page, path, width));
      for (const path of beforeTheDoor) await lookAt(path);
      await enterAs(visitor, person);
      for (const path of inside) await lookAt(path);
    }
  },
};

async function look(stage: Stage, page: Page, path: string, width: number): Promise<void> {
  await page.goto(path);
  await page.waitForLoadState('networkidle');
  await layEverythingOut(page);
  const here = (what: string) => `${path} at ${width}: ${what}`;
  stage.equal(here('in Spanish'), await languageOf(page), 'es');
  const { overlaps, clipped } = await boxFaults(page);
  stage.none(here('no box over another'), overlaps);
  stage.none(here('no text cut off'), clipped);
  stage.equal(here('no sideways scroll'), await sidewaysScroll(page), 0);
  stage.none(here('nothing in English'), await englishOn(page));
}

const languageOf = (page: Page) => page.evaluate(() => document.documentElement.lang);

/** Lines with words that every English text has and no Spanish one. */
function englishOn(page: Page): Promise<string[]> {
  return page.evaluate(() =>
    document.body.innerText
      .replaceAll('Journal of Physical Chemistry', '')
      .split('\n')
      .filter((line) => /\b(the|and|with|your|of|this|to|is)\b/i.test(line)),
  );
}
