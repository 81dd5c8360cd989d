import type { Page } from 'playwright-core';
import { join } from 'node:path';
import type { SituationKind } from '@/lib/schemas/situation';
import { situationsOf } from '../support/clearing';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { shotsFolder } from '../support/place';
import { until } from '../support/waiting';
import { words } from '../support/words';

const answer = (name: string) => words(`situations.answer.${name}`);

/** What is answered on the page of each kind, and a reason that the verdict then has. */
const walks: readonly {
  kind: SituationKind;
  choose?: readonly string[];
  days?: readonly string[];
  reason?: string;
}[] = [
  { kind: 'accident', choose: [answer('loose-stool')], reason: 'accident-open' },
  { kind: 'clearing', choose: [answer('not-at-all'), answer('green'), answer('no')], reason: 'water-green' },
  { kind: 'combined-chlorine' },
  { kind: 'drain-cover', reason: 'drain-cover-broken' },
  { kind: 'quick-raise' },
  { kind: 'storm', choose: [answer('dry'), answer('no')], reason: 'storm' },
  { kind: 'cover', choose: [answer('week-or-more'), answer('yes')], reason: 'cover-off-after-a-week' },
  { kind: 'stain' },
  { kind: 'away', days: ['2026-07-10', '2026-07-16'], choose: [answer('nobody')] },
  { kind: 'stabilizer-high', choose: [answer('no')] },
  { kind: 'hardness-high', choose: [answer('unsure')] },
  { kind: 'opening', days: ['2026-07-06'] },
  { kind: 'closing', days: ['2026-07-06'] },
];

/** Every situation on a phone: from its cautions to its steps on the week sheet, and its end. */
export const situations: Journey = {
  name: 'situations on a phone',
  seconds: 300,
  async run(stage) {
    const server = await stage.server({ name: 'situations', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    const test = fullTest(sundayEvening);
    const values = { ...test.values, freeChlorine: 1.4, combinedChlorine: 0.7, cyanuricAcid: 95, calciumHardness: 620 };
    await ines.must('POST', '/api/readings', { ...test, values });
    const { page } = await stage
      .visitor(server, 'Ines', { width: 390, height: 844, touch: true })
      .then(async (visitor) => {
        await enterAs(visitor, ines);
        return visitor;
      });
    for (const walk of walks) await stage.part(walk.kind, () => walkThrough(stage, page, ines, walk));
    await stage.part('a drain cover is replaced', () => replaceDrainCover(stage, page, ines));
  },
};

async function walkThrough(
  stage: Stage,
  page: Page,
  ines: Person,
  { kind, choose = [], days = [], reason }: (typeof walks)[number],
) {
  const name = words(`situations.kind.${kind}.name`);
  await page.goto('/situations');
  await page
    .getByRole('link', { name: new RegExp(`^${escaped(name)}`) })
    .first()
    .click();
  await page.waitForURL(`**/situations/${kind}`);
  const begin = page.getByRole('button', { name: words('situations.begin.button'), exact: true });
  await begin.waitFor();
  await cautionsFirst(stage, page, kind);
  for (const [index, day] of days.entries()) await page.locator('input[type=date]').nth(index).fill(day);
  for (const each of choose) await exactly(page, each).click();
  await begin.click();
  await page.getByRole('heading', { name: words('situations.ends.label') }).waitFor();
  await shoot(page, `situation-${kind}`);
  const { open } = await situationsOf(ines);
  stage.equal(`${kind}: it is open`, open?.situation.kind, kind);
  stage.check(`${kind}: it has steps`, (open?.procedure.steps.length ?? 0) > 0, open);
  await noSideways(stage, page, kind);

  await page.goto('/week');
  const strip = page.getByRole('region', { name: words('week.situation.label') });
  await strip.waitFor();
  stage.check(`${kind}: the week sheet names it`, (await strip.innerText()).includes(name));
  const { reasons } = (await weekOf(ines)).verdict;
  if (reason !== undefined)
    stage.check(
      `${kind}: the verdict knows`,
      reasons.some(({ code }) => code === reason),
      reasons,
    );

  await strip.getByRole('link', { name: words('week.situation.toSteps') }).click();
  const yes = page.getByRole('button', { name: words('situations.ends.mistake.yes') });
  await until(async () => {
    // A page that was drawn only just now may not listen yet.
    await page.getByRole('button', { name: words('situations.ends.mistakeButton') }).click();
    return until(() => yes.isVisible(), { seconds: 3 });
  });
  await yes.click();
  await page.getByRole('dialog').waitFor({ state: 'detached' });
  stage.equal(`${kind}: begun by mistake, it is over`, (await situationsOf(ines)).open, null);
}

/** What protects people stands above what is asked. */
async function cautionsFirst(stage: Stage, page: Page, kind: SituationKind): Promise<void> {
  const text = (await page.locator('main').innerText()).replace(/\s+/g, ' ');
  const asked = text.indexOf(words('situations.begin.button'));
  const stop = text.search(
    new RegExp(`${words('common.stop')}|${words('common.takeCare')}|${words('common.note')}`, 'i'),
  );
  stage.check(`${kind}: cautions stand before the questions`, stop >= 0 && stop < asked, text.slice(0, 400));
  stage.check(`${kind}: never ‘safe’`, !/\bsafe\b/i.test(text), text);
}

async function replaceDrainCover(stage: Stage, page: Page, ines: Person): Promise<void> {
  await page.goto('/situations/drain-cover');
  await page.getByRole('button', { name: words('situations.begin.button'), exact: true }).click();
  // The box is drawn by the label around it.
  const replaced = page
    .locator('label:has(input[type=checkbox])')
    .filter({ hasText: words('situations.step.cover-replaced.name') });
  await replaced.first().waitFor();
  const done = page.getByRole('button', { name: words('situations.ends.doneButton'), exact: true });
  stage.equal('it cannot be ended before', await done.count(), 0);
  await replaced.first().click();
  await done.click();
  await page.getByText(words('situations.ends.over')).first().waitFor();
  const { open, past } = await situationsOf(ines);
  stage.equal('it is over, and done', [open, past[0]?.ending], [null, 'done']);
  const { verdict } = await weekOf(ines);
  stage.check('nobody is kept out for it any more', verdict.reasons[0]?.code !== 'drain-cover-broken', verdict);
}

/** The answer that says this and nothing more: "no" is not "not at all". */
function exactly(page: Page, text: string) {
  return page.locator('label:has(input[type=radio])').filter({ hasText: new RegExp(`^${escaped(text)}$`) });
}

async function noSideways(stage: Stage, page: Page, kind: string): Promise<void> {
  const wider = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  stage.check(`${kind}: nothing is wider than the phone`, wider <= 0, wider);
}

async function shoot(page: Page, name: string): Promise<void> {
  await page.screenshot({ path: join(shotsFolder, `${name}.png`), fullPage: true });
}

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
}
