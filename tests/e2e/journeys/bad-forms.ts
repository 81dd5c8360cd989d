import type { Page } from 'playwright-core';
import { borrowSession, enterAs } from '../support/enter';
import { choice, pick } from '../support/first-run';
import { describePool, describeSteps, fullTest, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { until } from '../support/waiting';
import { words } from '../support/words';

const technical = /\bNaN\b|undefined|\[object|Invalid input|expected \w+, received|\bnull\b/;

/** Every form with what nobody should type: told at the field, in words, and nothing lost. */
export const badForms: Journey = {
  name: 'bad input in forms',
  seconds: 240,
  async run(stage) {
    const server = await stage.server({ name: 'bad-forms', clock: sundayEvening });
    await stage.part('sign-up and sign-in', () => doors(stage, server));
    await stage.part('first run', () => firstRun(stage, server));
    await stage.part('test', () => testForm(stage, server));
    await stage.part('two clicks, two tabs', () => twice(stage, server));
    await stage.part('no connection', () => offline(stage, server));
  },
};

/** Types, presses, and expects to stay, with the mistake told at its field. */
async function refused(
  stage: Stage,
  page: Page,
  what: string,
  press: () => Promise<void>,
  { field }: { field: string },
): Promise<void> {
  const address = page.url();
  await press();
  const control = page.locator(field).first();
  const told = async () => (await control.getAttribute('aria-invalid')) === 'true';
  await until(told, { seconds: 8 });
  const wordsId = (await control.getAttribute('aria-describedby')) ?? '';
  const said = wordsId === '' ? '' : await page.locator(`[id="${wordsId}"]`).innerText();
  const stays = page.url() === address;
  stage.check(`${what}: told at the field`, stays && (await told()) && said.trim().length > 8, {
    stays,
    told: await told(),
    said,
  });
  const all = await page.locator('body').innerText();
  stage.check(
    `${what}: in plain words`,
    !technical.test(all),
    all.match(new RegExp(`.{0,60}(?:${technical.source}).{0,60}`))?.[0],
  );
}

async function doors(stage: Stage, server: Server): Promise<void> {
  const visitor = await stage.visitor(server, 'doors');
  const { page } = visitor;
  visitor.expect(/status of 4(01|09|22)/);
  const known = await new Person(server).signUp();
  await page.goto('/sign-up');
  const press = () => page.getByRole('button', { name: words('start.signUp.submit') }).click();
  const type = (values: Record<string, string>) => async () => {
    for (const [name, value] of Object.entries(values)) await page.locator(`input[name=${name}]`).fill(value);
    await press();
  };
  await refused(stage, page, 'sign-up, all empty', press, { field: 'input[name=name]' });
  const sound = {
    name: 'Bram',
    email: 'bram@pool.example',
    password: 'four words in a row',
    householdName: 'Marrow Lane',
  };
  await refused(stage, page, 'sign-up, no address', type({ ...sound, email: 'bram' }), { field: 'input[name=email]' });
  await refused(stage, page, 'sign-up, short password', type({ ...sound, password: 'short' }), {
    field: 'input[name=password]',
  });
  await refused(stage, page, 'sign-up, common password', type({ ...sound, password: 'password123' }), {
    field: 'input[name=password]',
  });
  await refused(stage, page, 'sign-up, address that is taken', type({ ...sound, email: known.email.toUpperCase() }), {
    field: 'input[name=email]',
  });
  await refused(stage, page, 'sign-up, endless name', type({ ...sound, name: 'B'.repeat(300) }), {
    field: 'input[name=name]',
  });
  stage.equal(
    'what was typed is still there',
    await page.locator('input[name=householdName]').inputValue(),
    'Marrow Lane',
  );

  await page.goto('/sign-in');
  const submit = page.getByRole('button', { name: words('start.signIn.submit') });
  await page.locator('input[name=email]').fill(known.email);
  await page.locator('input[name=password]').fill('not the words');
  await submit.click();
  await page.getByRole('alert').filter({ hasText: /\w{4}/ }).first().waitFor();
  const said = await page.locator('main').innerText();
  stage.check('a wrong password is told without telling which of the two', /do not go together/.test(said), said);
  await page.locator('input[name=email]').fill('nobody@pool.example');
  await submit.click();
  await page.waitForTimeout(800);
  stage.check(
    'an unknown address is told in the same words',
    /do not go together/.test(await page.locator('main').innerText()),
  );
}

async function firstRun(stage: Stage, server: Server): Promise<void> {
  const visitor = await stage.visitor(server, 'first run');
  const { page } = visitor;
  visitor.expect(/status of 422/);
  const person = new Person(server);
  await person.signUp();
  await describeSteps(person, ['scope', 'size', 'lining', 'sun', 'water', 'shelf']);
  await enterAs(visitor, person);
  const press = (step: string) => page.getByRole('button', { name: words(`pool.${step}.next`) }).click({ force: true });
  const field = (name: string) => `input[name=${name}]`;
  const type = (step: string, name: string, text: string) => async () => {
    await page.locator(field(name)).fill(text);
    await press(step);
  };

  await page.goto('/first-run/size');
  for (const text of ['', 'many', '-5', '0', '9999999999', '75,7 m3'])
    await refused(stage, page, `volume "${text}"`, type('size', 'volume', text), { field: field('volume') });
  await page.locator(field('volume')).fill('75,7');
  for (const text of ['deep', '-1', '99'])
    await refused(stage, page, `depth "${text}"`, type('size', 'meanDepth', text), { field: field('meanDepth') });

  await page.goto('/first-run/sun');
  for (const text of ['', 'north', '91'])
    await refused(stage, page, `latitude "${text}"`, type('sun', 'latitude', text), { field: field('latitude') });
  await page.locator(field('latitude')).fill('28');
  await refused(stage, page, 'time zone "Mars/Base"', type('sun', 'timeZone', 'Mars/Base'), {
    field: field('timeZone'),
  });

  await page.goto('/first-run/water');
  for (const text of ['soft', '-3', '99999'])
    await refused(stage, page, `hardness "${text}"`, type('water', 'fill-calciumHardness', text), {
      field: field('fill-calciumHardness'),
    });
  await page.locator(field('fill-calciumHardness')).fill('');
  for (const text of ['', 'some', '-1', '2,5', '999'])
    await refused(stage, page, `tablets in the feeder "${text}"`, type('water', 'feederCapacity', text), {
      field: field('feederCapacity'),
    });

  await page.goto('/first-run/shelf');
  await page.getByRole('button', { name: words('pool.shelf.addFirst') }).click();
  const keep = () => page.getByRole('button', { name: words('pool.product.keep') }).click();
  const product = (name: string, text: string) => async () => {
    await page.locator(field(name)).fill(text);
    await keep();
  };
  await pick(page, words('pool.product.ingredient'), words('pool.ingredient.calcium-hypochlorite.name'));
  await choice(page, words('pool.product.form.granular')).click();
  for (const text of ['', 'strong', '0', '-5', '150', '100.5'])
    await refused(stage, page, `strength "${text}"`, product('strength', text), { field: field('strength') });
  await page.locator(field('strength')).fill('65,5');
  for (const text of ['', 'some', '-1'])
    await refused(stage, page, `left on the shelf "${text}"`, product('stock', text), { field: field('stock') });
  stage.equal('nothing of it was kept', await person.must('GET', '/api/shelf-products'), []);
}

async function testForm(stage: Stage, server: Server): Promise<void> {
  const { visitor, person } = await aMember(stage, server, 'test');
  const { page } = visitor;
  await openKit(page, 'full');
  for (const [quantity, texts] of Object.entries({
    freeChlorine: ['high', '-1', '999', '1.2.3'],
    pH: ['acid', '-7', '99'],
    totalAlkalinity: ['x', '-1', '99999'],
    cyanuricAcid: ['tube', '-1', '99999'],
    temperature: ['warm', '-40', '400'],
  }))
    for (const text of texts) {
      const box = `#value-${quantity}`;
      await refused(
        stage,
        page,
        `${quantity} "${text}"`,
        async () => {
          await page.locator(box).fill(text);
          await page.locator(box).blur();
        },
        { field: box },
      );
      await page.locator(box).fill('');
    }
  const save = page.getByRole('button', { name: words('readings.save.full') });
  stage.equal('with nothing read there is nothing to save', await save.getAttribute('aria-disabled'), 'true');
  await page.locator('#value-pH').fill('74');
  await page.locator('#value-pH').blur();
  const meant = page.getByRole('button', { name: /7\.4/ }).first();
  await meant.click();
  stage.equal('the likely slip is offered and taken', await page.locator('#value-pH').inputValue(), '7.4');
  stage.equal('a wrong test is no reading', (await weekOf(person)).readings.length, 1);
}

/** Two clicks are one test; and a second tab with the same draft sends the same one. */
async function twice(stage: Stage, server: Server): Promise<void> {
  const { visitor, person } = await aMember(stage, server, 'twice');
  const { page } = visitor;
  visitor.expect(/status of 4(09|22)/);
  const type = async (tab: Page, freeChlorine: string) => {
    await tab.locator('#value-freeChlorine').fill(freeChlorine);
    await tab.locator('#value-pH').fill('7,5');
    await tab.locator('#value-pH').blur();
  };
  const save = (tab: Page) => tab.getByRole('button', { name: words('readings.save.quick') });
  await openKit(page, 'quick');
  await type(page, '2,8');
  const tab = await visitor.newTab();
  await tab.goto('/test?kind=quick');
  stage.equal('a second tab shows the same draft', await tab.locator('#value-freeChlorine').inputValue(), '2,8');

  await save(page).dblclick();
  await page.getByText(words('readings.saved.title')).waitFor();
  stage.equal('two clicks are one reading', (await weekOf(person)).readings.length, 2);
  await save(tab).click();
  await until(async () => !(await save(tab).isVisible()), { seconds: 8 });
  stage.equal('the second tab sends the same test again', (await weekOf(person)).readings.length, 2);
}

/** No network while saving: said in words, kept, and sent once it is back. */
async function offline(stage: Stage, server: Server): Promise<void> {
  const { visitor, person } = await aMember(stage, server, 'offline');
  const { page, context } = visitor;
  visitor.expect(/ERR_INTERNET_DISCONNECTED/);
  await openKit(page, 'quick');
  await page.locator('#value-freeChlorine').fill('2.7');
  await page.locator('#value-pH').fill('7.5');
  await page.locator('#value-pH').blur();
  await context.setOffline(true);
  await page.getByRole('button', { name: words('readings.save.quick') }).click();
  await page.getByRole('heading', { name: words('readings.kept.title') }).waitFor();
  const said = await page.locator('main').innerText();
  stage.check('it says that the test is on this device only', said.includes(words('readings.kept.words')), said);
  stage.check('and what that means for swimming', said.includes('Test before anyone swims'), said);
  stage.equal('the server knows nothing of it yet', (await weekOf(person)).readings.length, 1);
  await context.setOffline(false);
  const sent = await until(async () => (await weekOf(person)).readings.length === 2, { seconds: 20, every: 300 });
  stage.check('back on the network it is sent by itself', sent);
  stage.equal('with what was typed', (await weekOf(person)).lastReading?.values, { freeChlorine: 2.7, pH: 7.5 });
  await page.waitForTimeout(500);
  stage.equal('once', (await weekOf(person)).readings.length, 2);
}

async function aMember(stage: Stage, server: Server, name: string) {
  const visitor = await stage.visitor(server, name);
  const person = new Person(server);
  await person.signUp();
  await describePool(person);
  const anHourAgo = new Date(Date.parse(sundayEvening) - 3_600_000).toISOString();
  await person.must('POST', '/api/readings', fullTest(anHourAgo));
  await enterAs(visitor, person);
  await borrowSession(visitor, person);
  return { visitor, person };
}

async function openKit(page: Page, kind: 'full' | 'quick'): Promise<void> {
  await page.goto('/test');
  await choice(page, words(`readings.kind.${kind}`))
    .first()
    .click();
  await choice(page, words('readings.method.drop-kit')).click();
}
