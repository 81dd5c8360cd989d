import { answerScope, choice, goOn, signUp } from '../support/first-run';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { pattern, words } from '../support/words';

const onlyChlorine = 'Wadewell is for chlorine only. Mixing systems can be dangerous. Ask the maker of your system.';

/** What each answer has to lead to, in the words of the care rules (part 1). */
const stops: readonly { name: string; answers: Record<string, unknown>; says: readonly string[] }[] = [
  { name: 'bromine', answers: { system: 'bromine' }, says: [onlyChlorine] },
  { name: 'biguanide', answers: { system: 'biguanide' }, says: [onlyChlorine] },
  { name: 'copper or silver', answers: { system: 'copper-silver' }, says: [onlyChlorine] },
  { name: 'indoors', answers: { roofed: true }, says: ['No stabilizer belongs there', 'the sun model does not fit'] },
  { name: 'hot tub', answers: { kind: 'hot-tub' }, says: ['Hot water needs other limits and daily tests'] },
  {
    name: 'new plaster',
    answers: { newSurface: true },
    says: ['start-up belongs to the builder', 'Come back with their values'],
  },
  { name: 'rented', answers: { openToPublic: true }, says: ['Public rules apply', 'ask the health department'] },
  { name: 'planted', answers: { planted: true }, says: ['natural or planted pool'] },
];

/** Pools that Wadewell is not for stop at the first screen; a salt system keeps a record and gets no plan. */
export const scope: Journey = {
  name: 'scope',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'scope', clock: sundayEvening });
    await stage.part('bromine, by hand', () => bromineByHand(stage, server));
    await stage.part('each stop in its words', () => eachStop(stage, server));
    await stage.part('salt keeps a record', () => salt(stage, server));
    await stage.part('a small pool keeps a record, a smaller one is emptied', () => small(stage, server));
  },
};

async function bromineByHand(stage: Stage, server: Server): Promise<void> {
  const { page } = await stage.visitor(server, 'bromine', { width: 390, height: 844, touch: true });
  await signUp(page, { email: 'bromine@pool.example', password: 'four words in a row' });
  await answerScope(page, 'bromine');
  await page.getByRole('button', { name: words('pool.scope.next') }).click();
  await page.getByText(onlyChlorine.slice(0, 40)).first().waitFor();
  const text = (await page.locator('main').innerText()).replace(/\s+/g, ' ');
  stage.check('the stop says why, and what to do', text.includes(onlyChlorine), text);
  await page.goto('/first-run/size');
  stage.check(
    'the next step stays shut',
    !(await page.getByLabel(words('pool.size.volume'), { exact: true }).isVisible()),
    page.url(),
  );
  await page.goto('/week');
  stage.check('and so does the week', !page.url().endsWith('/week'), page.url());
  await page.waitForURL('**/first-run/scope');
  await page.getByRole('button', { name: words('first-run.changeAnswer') }).click();
  await choice(page, words('pool.scope.system.chlorine.detail')).click();
  await goOn(page, 'scope', '/first-run/size');
  stage.check('a corrected answer opens the way', page.url().endsWith('/first-run/size'), page.url());
}

async function eachStop(stage: Stage, server: Server): Promise<void> {
  const person = new Person(server);
  await person.signUp();
  const visitor = await stage.visitor(server, 'each stop');
  const { page } = visitor;
  await enterAs(visitor, person);
  for (const { name: stop, answers, says } of stops) {
    await person.must('PUT', '/api/pool', { step: 'scope', answers: { ...harmless, ...answers } });
    await page.goto('/first-run/scope');
    await page.getByRole('heading', { level: 1, name: words('first-run.stopTitle') }).waitFor();
    const text = (await page.locator('main').innerText()).replace(/\s+/g, ' ');
    for (const sentence of says)
      stage.check(`${stop}: "${sentence}"`, text.toLowerCase().includes(sentence.toLowerCase()), text);
  }
}

async function salt(stage: Stage, server: Server): Promise<void> {
  const person = new Person(server);
  await person.signUp();
  await describePool(person, { scope: { system: 'salt-generator' } });
  const reading = fullTest(sundayEvening);
  await person.must('POST', '/api/readings', reading);
  const sheet = await weekOf(person);
  stage.equal(
    'salt: the reading is kept',
    sheet.readings.map(({ id }) => id),
    [reading.id],
  );
  stage.equal('salt: the sheet is a record only', sheet.pool.recordOnly, true);
  stage.none('salt: no dose of anything', sheet.doses);
  const visitor = await stage.visitor(server, 'salt');
  const { page } = visitor;
  await enterAs(visitor, person);
  await page.goto('/week');
  await page.getByText(words('week.state.recordOnlyTitle')).waitFor();
  // The foot of the sheet is drawn once the browser knows its own width.
  await page.getByText('Never let two different pool products touch').first().waitFor();
  const text = await page.locator('main').innerText();
  stage.check(
    'salt: nothing on the sheet tells an amount to add',
    !/\b\d+\s?(g|tablets?)\b.*(granules|tablets)/i.test(text),
    text,
  );
  stage.check(
    'salt: the standing caution is there',
    text.includes('Never let two different pool products touch'),
    text,
  );
}

async function small(stage: Stage, server: Server): Promise<void> {
  const person = new Person(server);
  await person.signUp();
  await describePool(person, { size: { volume: 6 } });
  await person.must('POST', '/api/readings', fullTest(sundayEvening));
  const sheet = await weekOf(person);
  stage.equal('6 m3: a record only', [sheet.pool.recordOnly, sheet.doses.length], [true, 0]);

  const paddler = new Person(server);
  await paddler.signUp();
  await paddler.must('PUT', '/api/pool', { step: 'scope', answers: harmless });
  const visitor = await stage.visitor(server, 'paddling pool');
  const { page } = visitor;
  await enterAs(visitor, paddler);
  await page.goto('/first-run/size');
  await page.getByLabel(words('pool.size.volume'), { exact: true }).fill('1.5');
  await choice(page, words('pool.size.sure.known')).click();
  const confirm = page.getByRole('button', { name: pattern('pool.size.doubt.no') });
  if (await confirm.isVisible()) await confirm.click();
  await page.getByRole('button', { name: words('pool.size.next') }).click();
  await page.getByText(/empty it after every day of use/i).waitFor();
  stage.check('1.5 m3: it is emptied, not dosed', true);
}

const harmless = {
  system: 'chlorine',
  kind: 'pool',
  roofed: false,
  newSurface: false,
  openToPublic: false,
  planted: false,
  ultravioletOrOzone: false,
  wellWater: false,
  copperHeater: false,
  handlesChemicals: true,
};
