import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import type { NewReading } from '@/lib/schemas/reading';
import { enterAs } from '../support/enter';
import { describeSteps, fullTest, granules, slowTablets, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { shotsFolder } from '../support/place';
import type { Server } from '../support/server';
import { words } from '../support/words';

type Values = Partial<NewReading['values']>;
type Case = {
  /** The card's text in the catalogue. */
  card: string;
  shelf: readonly object[];
  values?: Values;
  feeder?: 'none' | 'inline' | 'floating';
};

const product = (substance: string, form: string, more: object = {}) => ({
  ...{ id: substance, substance, form, alkali: 0, labelWay: 'unknown', stock: 50_000, storedAt: 20 },
  ...more,
});
const liquid = product('sodium-hypochlorite', 'liquid', { strength: 12.5, boughtOn: '2026-07-01', measure: 250 });
const thin: Values = { freeChlorine: 1.5 };

/** What a household has to own, and to read, so that its week holds each card. */
const cases: readonly Case[] = [
  { card: 'granules-dissolve', shelf: [granules], values: thin },
  { card: 'granules-broadcast', shelf: [{ ...granules, labelWay: 'broadcast' }], values: thin },
  { card: 'liquid', shelf: [liquid], values: thin },
  { card: 'acid', shelf: [granules, product('hydrochloric-acid', 'liquid', { strength: 31.45 })], values: { pH: 8.1 } },
  { card: 'dry-acid', shelf: [granules, product('sodium-bisulfate', 'other')], values: { pH: 8.1 } },
  { card: 'tablets-inline', shelf: [slowTablets, granules], values: thin, feeder: 'inline' },
  { card: 'tablets-floating', shelf: [slowTablets, granules], values: thin, feeder: 'floating' },
  {
    card: 'companion-dissolve',
    shelf: [granules, product('sodium-bicarbonate', 'other')],
    values: { totalAlkalinity: 40 },
  },
  {
    card: 'stabilizer-bag',
    shelf: [granules, product('cyanuric-acid', 'other')],
    values: { cyanuricAcid: 12, freeChlorine: 3.5 },
  },
];

/** What a test leads to; after a storm it counts no more, whatever it read. */
const states: readonly { state: string; values: Values; storm?: boolean }[] = [
  { state: 'fine', values: {} },
  { state: 'wait', values: { freeChlorine: 6 } },
  { state: 'stay-out', values: { pH: 6.8 } },
  { state: 'test-first', values: {}, storm: true },
];

/** Each product's card and each state of the verdict, at the width of a phone. */
export const cards: Journey = {
  name: 'every card on a phone',
  seconds: 300,
  async run(stage) {
    const server = await stage.server({ name: 'cards', clock: sundayEvening });
    const visitor = await stage.visitor(server, 'Ines', { width: 390, height: 844, touch: true });
    for (const each of cases)
      await stage.part(each.card, async () => {
        const person = await household(server, each);
        await person.must('POST', '/api/readings', test(each.values));
        await enterAs(visitor, person);
        await readCard(stage, visitor.page, person, each.card);
      });
    for (const { state, values, storm } of states)
      await stage.part(state, async () => {
        const person = await household(server, { card: state, shelf: [slowTablets, granules], feeder: 'inline' });
        await person.must('POST', '/api/readings', test(values));
        if (storm) await reportStorm(person);
        await enterAs(visitor, person);
        await readVerdict(stage, visitor.page, person, state);
      });
  },
};

const test = (values: Values = {}) => {
  const usual = fullTest(sundayEvening);
  return { ...usual, values: { ...usual.values, ...values } };
};

async function reportStorm(person: Person): Promise<void> {
  const { now: happenedAt } = await weekOf(person);
  await person.must('POST', '/api/pool-events', { id: randomUUID(), kind: 'storm', happenedAt });
}

async function household(server: Server, { shelf, feeder = 'none' }: Case): Promise<Person> {
  const person = new Person(server);
  await person.signUp();
  for (const each of shelf) await person.must('POST', '/api/shelf-products', { ...each, id: randomUUID() });
  const filled = { kind: feeder, ...(feeder === 'none' ? {} : { ingredient: 'trichlor', capacity: 8, loaded: 0 }) };
  const answers = feeder === 'none' ? { feeder: { kind: 'none' } } : { feeder: filled };
  await describeSteps(person, ['scope', 'size', 'lining', 'sun', 'water', 'shelf', 'label'], { water: answers });
  return person;
}

async function readCard(stage: Stage, page: Page, person: Person, card: string): Promise<void> {
  await page.goto('/week');
  await page.getByRole('heading', { name: words('week.phone.rest') }).waitFor();
  // Each one that is opened leaves the list of those that are shut.
  const shut = page.locator('main details:not([open]) > summary');
  for (let left = await shut.count(); left > 0; left--) await shut.first().click();
  const first = plain(`doses.steps.${card}.1`);
  const steps = page.locator('ol').filter({ hasText: first }).first();
  await steps.waitFor().catch(() => undefined);
  const { doses } = await weekOf(person);
  stage.check(
    `${card}: it stands on the sheet`,
    (await steps.count()) > 0,
    doses.map(({ steps: text }) => text),
  );
  if ((await steps.count()) === 0) return;
  const text = (await steps.innerText()).replace(/\s+/g, ' ');
  const protects = text.search(/Nobody in the water/);
  const pump = text.search(/Pump o(?:n|ff)/);
  const pours = text.search(/then the|Pour low|Pour slowly|Scatter them|open slowly|Fill it into/);
  stage.check(
    `${card}: people before pump before pouring`,
    protects === Math.min(...[protects, pump, pours].filter((at) => at >= 0)) && (pump < 0 || pump < pours),
    text,
  );
  stage.check(`${card}: goggles and gloves come before pouring`, text.search(/Goggles/i) < pours, text);
  stage.equal(
    `${card}: nothing is wider than the phone`,
    await page.evaluate(() => document.documentElement.scrollWidth > window.innerWidth),
    false,
  );
  await page.screenshot({ path: join(shotsFolder, `card-${card}.png`), fullPage: true });
}

async function readVerdict(stage: Stage, page: Page, person: Person, state: string): Promise<void> {
  await page.goto('/week');
  await page.getByRole('heading', { level: 1 }).waitFor();
  stage.equal(`${state}: the server says so`, (await weekOf(person)).verdict.state, state);
  const text = (await page.locator('main').innerText()).replace(/\s+/g, ' ');
  const said = {
    fine: /The water is fine for swimming until/,
    wait: /Wait until/,
    'stay-out': /Stay out:/,
    'test-first': /Test before anyone swims/,
  };
  stage.check(`${state}: its words`, said[state as keyof typeof said].test(text), text.slice(0, 300));
  stage.equal(
    `${state}: the standing line stands under a Fine alone`,
    /Before anyone goes in:/.test(text),
    state === 'fine',
  );
  stage.check(`${state}: never ‘safe’`, !/\bsafe\b/i.test(text), text);
  await page.screenshot({ path: join(shotsFolder, `verdict-${state}.png`), fullPage: true });
}

function plain(path: string): string {
  return words(path).replace(/<\/?\w+>/g, '');
}
