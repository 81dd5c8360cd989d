import type { Page } from 'playwright-core';
import { enterAs } from '../support/enter';
import { answerScope, choice, goOn, signUp } from '../support/first-run';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { curvesDrawn } from '../support/sheet';
import { pattern, words } from '../support/words';

/** Metric and US: the volume in the wrong unit is asked back, and every figure on a page has its unit. */
export const measures: Journey = {
  name: 'metric and US',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'measures', clock: sundayEvening });
    await stage.part('asked back', () => askedBack(stage, server));
    for (const system of ['metric', 'us'] as const)
      await stage.part(`units on the sheet, ${system}`, () => unitsOnSheet(stage, server, system));
  },
};

async function askedBack(stage: Stage, server: Server): Promise<void> {
  const { page } = await stage.visitor(server, '18,000');
  await signUp(page, { email: 'gallons@pool.example', password: 'four words in a row', units: 'us' });
  await answerScope(page);
  await goOn(page, 'scope', '/first-run/size');
  await choice(page, words('pool.size.sure.known')).click();
  const volume = page.getByLabel(words('pool.size.volume'), { exact: true });
  const unit = (name: 'm3' | 'L' | 'us-gal') => choice(page, words(`pool.unit.name.${name}`)).click();
  const question = page.getByRole('group', { name: words('common.takeCare') });
  const next = page.getByRole('button', { name: words('pool.size.next') });

  for (const typed of ['18,000', '18000'] as const)
    for (const wrong of ['m3', 'L'] as const) {
      await volume.fill(typed);
      await unit(wrong);
      await question.waitFor();
      const asked = (await question.innerText()).replace(/\s+/g, ' ');
      stage.check(`${typed} as ${wrong}: asked back with gallons`, /US gallons/.test(asked), asked);
      await next.click({ force: true });
      stage.check(
        `${typed} as ${wrong}: nothing is taken before the answer`,
        page.url().endsWith('/first-run/size'),
        page.url(),
      );
      await question.getByRole('button', { name: pattern('pool.size.doubt.yes') }).click();
      await question.waitFor({ state: 'detached' });
    }
  stage.check('18,000 US gallons are 68.1 m3', /68(\.1)?\s?m³/.test(await page.locator('form').innerText()));
  await unit('us-gal');
  stage.check('and are not asked about', !(await question.isVisible()));
  await goOn(page, 'size', '/first-run/lining');
}

async function unitsOnSheet(stage: Stage, server: Server, system: 'metric' | 'us'): Promise<void> {
  const person = new Person(server);
  await person.signUp({ unitSystem: system });
  await describePool(person);
  await person.must('POST', '/api/readings', fullTest(sundayEvening));
  const visitor = await stage.visitor(server, system, { width: 1440 });
  const { page } = visitor;
  await enterAs(visitor, person);
  await page.goto('/week');
  await curvesDrawn(page);
  const week = await textOf(page);
  await page
    .getByRole('button', { name: words('doses.action.steps') })
    .first()
    .click();
  const steps = await page.getByRole('dialog').innerText();
  await page.goto('/pool');
  await page.getByText(words('pool.profile.row.volume')).first().waitFor();
  const pool = await textOf(page);
  const [own, foreign] =
    system === 'metric'
      ? [[/\d\s?m³/, /\bmg\/L\b/, /\d\s?g\b/], /\d\s?(US gal|gal\b|oz\b|fl oz|ft\b|°F|lb\b|ppm)/]
      : [[/\d\s?(US )?gal/, /\bppm\b/, /\d\s?(oz|lb)\b/], /\d\s?(m³|mg\/L|g\b|kg\b|mL\b|m\b|°C)/];
  const [volume, concentration, mass] = own;
  stage.check(`${system}: the sheet gives the volume with its unit`, volume?.test(week) ?? false, week.slice(0, 300));
  stage.check(`${system}: chlorine has its unit`, concentration?.test(week) ?? false, week.slice(0, 600));
  stage.check(`${system}: granules have theirs`, mass?.test(week) ?? false, week.match(/.{60}granules.{20}/g));
  stage.check(
    `${system}: the pool page gives the volume with its unit`,
    volume?.test(pool) ?? false,
    pool.slice(0, 400),
  );
  for (const [place, text] of [
    ['the sheet', week],
    ['the steps', steps],
  ] as const)
    stage.check(
      `${system}: no unit of the other system on ${place}`,
      !foreign.test(text),
      text.match(new RegExp(`.{0,40}${foreign.source}.{0,20}`, 'g')),
    );
}

async function textOf(page: Page): Promise<string> {
  return (await page.locator('main').innerText()).replace(/\s+/g, ' ');
}
