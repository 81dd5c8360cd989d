import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { nextDose, whenDue } from '../support/doses';
import { borrowSession } from '../support/enter';
import { sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Keyboard } from '../support/keyboard';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { until } from '../support/waiting';
import { pattern, words } from '../support/words';

/** From the first page to a dose that is ticked, without a mouse, a finger or an address that is typed. */
export const byKeyboard: Journey = {
  name: 'by keyboard alone',
  seconds: 200,
  async run(stage) {
    const server = await stage.server({ name: 'keyboard', clock: sundayEvening });
    const visitor = await stage.visitor(server, 'Ines', { width: 1440, height: 900 });
    const { page } = visitor;
    const keyboard = new Keyboard(page);

    try {
      await page.goto('/');
      await stage.part('past the bar to what the page is for', () => skipTheBar(stage, keyboard));
      await signUp(keyboard);
      await describePool(keyboard);
      await firstTest(keyboard);
      const ines = new Person(server);
      await borrowSession(visitor, ines);
      await tickDose(stage, keyboard, server, ines);
    } finally {
      keyboard.check(stage);
    }
  },
};

/** What lies over a phone's page, and over a desk's: Escape closes it and leads back. */
export const escape: Journey = {
  name: 'Escape leads back',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'escape', clock: '2026-07-08T06:00:00Z', fresh: true });
    const person = new Person(server);
    await person.must('POST', '/api/look-round');
    for (const { what, width, open } of [
      { what: 'More on a phone', width: 390, open: words('navigation.more') },
      { what: 'a dialog on a phone', width: 390, open: words('events.ask') },
      { what: 'a dialog on a desk', width: 1440, open: words('events.ask') },
    ])
      await stage.part(what, async () => {
        const visitor = await stage.visitor(server, what, { width, height: 844 });
        const [name = '', value = ''] = person.cookie.split('=');
        await visitor.context.addCookies([{ name, value, url: server.address, httpOnly: true, sameSite: 'Lax' }]);
        await visitor.page.goto('/week');
        await leadsBack(stage, new Keyboard(visitor.page), what, open);
      });
  },
};

async function leadsBack(stage: Stage, keyboard: Keyboard, what: string, open: string): Promise<void> {
  const { page } = keyboard;
  await keyboard.tabAndPress('button', open);
  const dialog = page.getByRole('dialog');
  await dialog.waitFor();
  const inside = () => dialog.evaluate((found) => found.contains(document.activeElement));
  stage.check(`${what}: opening it takes the focus along`, await until(inside, { seconds: 5 }));
  await keyboard.press('Escape');
  await dialog.waitFor({ state: 'detached' });
  stage.check(`${what}: Escape closes it and the focus is back`, await keyboard.hasFocus('button', open));
  await keyboard.press('Space');
  await dialog.waitFor();
  await until(inside, { seconds: 5 });
  await keyboard.tabAndPress(
    'button',
    words(open === words('navigation.more') ? 'navigation.closeMore' : 'common.close'),
  );
  await dialog.waitFor({ state: 'detached' });
  stage.check(`${what}: so does its own button`, await keyboard.hasFocus('button', open));
  keyboard.check(stage);
}

/** A name that begins so; a second line may follow in it. */
const beginning = (text: string) => new RegExp(`^${text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}`);

async function skipTheBar(stage: Stage, keyboard: Keyboard): Promise<void> {
  const { page } = keyboard;
  await keyboard.tabTo('link', words('common.skipToContent'), { most: 1 });
  await keyboard.press('Enter');
  await keyboard.press('Tab');
  const inMain = await page.locator('main').evaluate((main) => main.contains(document.activeElement));
  stage.check(
    'the first stop leads past the bar',
    inMain,
    await page.evaluate(() => document.activeElement?.outerHTML),
  );
  await keyboard.press('Shift+Tab');
}

async function signUp(keyboard: Keyboard): Promise<void> {
  const { page } = keyboard;
  await keyboard.tabAndPress('link', words('start.landing.start'));
  await page.waitForURL('**/sign-up');
  const field = (name: string) => words(`start.signUp.${name}`);
  await keyboard.tabAndType(field('name'), 'Ines');
  await keyboard.tabAndType(field('email'), 'ines.keys@pool.example');
  await keyboard.tabAndType(field('password'), 'four words in a row');
  await keyboard.tabAndType(field('householdName'), 'Marrow Lane');
  await keyboard.tabAndChoose(field('units'), beginning(field('metric')));
  await keyboard.tabAndPress('button', field('submit'));
  await page.waitForURL('**/first-run/scope');
}

async function describePool(keyboard: Keyboard): Promise<void> {
  const pool = (path: string) => words(`pool.${path}`);
  const next = async (step: string, address: string) => {
    await keyboard.tabAndPress('button', pool(`${step}.next`));
    await keyboard.page.waitForURL(`**${address}`);
  };
  await keyboard.tabAndChoose(pool('scope.title'), beginning(pool('scope.system.chlorine.label')));
  await keyboard.tabAndChoose(pool('scope.kind.question'), pool('scope.kind.pool'));
  await keyboard.tabAndPress('checkbox', beginning(pool('scope.chemicals.label')), 'Space');
  await next('scope', '/first-run/size');

  await keyboard.tabAndType(pool('size.volume'), '75,7');
  await keyboard.tabAndChoose(pool('size.sure.question'), pool('size.sure.known'));
  await next('size', '/first-run/lining');

  await keyboard.tabAndChoose(pool('lining.title'), beginning(pool('lining.surface.plaster.label')));
  await next('lining', '/first-run/sun');

  await keyboard.tabAndType(pool('sun.place.latitude'), '28');
  await keyboard.tabAndType(pool('sun.place.longitude'), '-81,5');
  await keyboard.tabAndChoose(pool('sun.cover.label'), pool('sun.cover.none'));
  await next('sun', '/first-run/water');

  await keyboard.tabTo('slider', pattern('pool.water.pump.stops'));
  await keyboard.press('ArrowRight');
  await keyboard.press('ArrowLeft');
  await keyboard.tabAndChoose(pool('water.feeder.label'), pool('water.feeder.inline'));
  await keyboard.tabAndPick(pool('water.feeder.ingredient'), pool('ingredient.trichlor.name'));
  await keyboard.tabAndType(pool('water.feeder.capacity'), '8');
  await keyboard.tabAndPress('checkbox', pool('water.methods.drop-kit'), 'Space');
  await next('water', '/first-run/shelf');

  await fillShelf(keyboard);
  await next('shelf', '/first-run/label');

  await keyboard.tabAndChoose(pool('label.title'), 'At 4 mg/L or less');
  await next('label', '/week');
}

async function fillShelf(keyboard: Keyboard): Promise<void> {
  const product = (path: string) => words(`pool.product.${path}`);
  const form = keyboard.page.getByRole('region', { name: product('title') });
  const keep = async (
    substance: 'trichlor' | 'calcium-hypochlorite',
    shape: string,
    fields: [string, string][],
    way: string,
  ) => {
    await keyboard.tabAndPick(product('ingredient'), words(`pool.ingredient.${substance}.name`));
    await keyboard.tabAndChoose(product('form.label'), product(`form.${shape}`));
    for (const [field, text] of fields) await keyboard.tabAndType(product(field), text);
    await keyboard.tabAndChoose(product('way.label'), beginning(product(`way.${way}.label`)));
    await keyboard.tabAndPress('button', product('keep'));
    await form.waitFor({ state: 'detached' });
  };
  await keyboard.tabAndPress('button', words('pool.shelf.addFirst'));
  const strength = 'strength.available-chlorine';
  await keep(
    'trichlor',
    'tablet',
    [
      [strength, '90'],
      ['amount.tabletMass', '227'],
      ['amount.stock', '20'],
    ],
    'feeder-only',
  );
  await keyboard.tabAndPress('button', words('pool.shelf.addAnother'));
  await keep(
    'calcium-hypochlorite',
    'granular',
    [
      [strength, '65'],
      ['amount.stock', '4,5'],
    ],
    'dissolve',
  );
}

/** A full test with the kit: Enter goes from value to value. */
async function firstTest(keyboard: Keyboard): Promise<void> {
  const { page } = keyboard;
  await page.getByText(words('week.state.firstTitle')).waitFor();
  await keyboard.tabAndPress('link', words('week.next.enter'));
  await page.waitForURL('**/test*');
  await keyboard.tabAndChoose(words('readings.kind.label'), words('readings.kind.full'));
  await keyboard.tabAndChoose(words('readings.method.label'), words('readings.method.drop-kit'));
  const values = ['3', '7,5', '3,2', '80', '220', '50', '29'];
  await keyboard.tabTo('textbox', 'Free chlorine');
  for (const value of values) {
    await page.keyboard.type(value);
    await keyboard.press('Enter');
  }
  await keyboard.tabAndChoose(words('readings.look.label'), words('readings.look.clear'));
  await keyboard.tabAndPress('button', words('readings.save.full'));
  await page.getByText(words('readings.saved.title')).waitFor();
}

/** The hour of the first dose has come: its Stop is read, and it is ticked. */
async function tickDose(stage: Stage, keyboard: Keyboard, server: Server, ines: Person): Promise<void> {
  const { page } = keyboard;
  const planned = await weekOf(ines);
  const dose = nextDose(planned);
  if (!dose) return stage.check('a dose lies ahead', false, planned.doses);
  await server.restart(whenDue(dose, planned));
  await keyboard.tabAndPress('link', words('readings.saved.seeWeek'));
  await page.waitForURL('**/week');

  await keyboard.tabAndPress('button', words('doses.stop.first'));
  const dialog = page.getByRole('dialog');
  await dialog.waitFor();
  await keyboard.tabAndPress('button', pattern('doses.stop.confirm'));
  await dialog.getByRole('button', { name: words('doses.action.given'), exact: true }).waitFor();
  await keyboard.press('Escape');
  await dialog.waitFor({ state: 'detached' });
  const back = await keyboard.hasFocus('button', words('doses.action.stepsAndMore'));
  stage.check(
    'the dialog leaves the focus at what opened it',
    back,
    await page.evaluate(() => document.activeElement?.outerHTML),
  );

  // The box stands before it.
  await keyboard.tabTo('checkbox', words('doses.action.given'), { back: true });
  await keyboard.press('Space');
  const given = async () => (await sheetOf(ines)).doses.some(({ status }) => status === 'given');
  await until(given);
  stage.check('the dose is ticked', await given(), (await sheetOf(ines)).doses);
  // Nobody who has just ticked has to begin at the top again to take it back.
  await keyboard.tabTo('button', words('doses.action.undo'), { most: 3 });
  stage.check('the way back is the next stop', await keyboard.hasFocus('button', words('doses.action.undo')));
}

const sheetOf = (ines: Person) => ines.must<WeekSheet>('GET', '/api/week');
