import type { Page } from 'playwright-core';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { Visitor } from '../support/browser';
import { nextDose, readStop, whenDue } from '../support/doses';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { words } from '../support/words';

/** The Stop of a product, on a phone: confirmed by name once, and again when the product is another one. */
export const stop: Journey = {
  name: 'a Stop by name',
  seconds: 120,
  async run(stage) {
    const server = await stage.server({ name: 'stop', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    const shelf = await ines.must<HouseholdProduct[]>('GET', '/api/shelf-products');
    const tablets = shelf.find(({ form }) => form === 'tablet');
    // Granules alone, so that the next dose is one of them.
    if (tablets) await ines.must('PUT', `/api/shelf-products/${tablets.id}/stock`, { stock: 0 });
    await ines.must('POST', '/api/readings', fullTest(sundayEvening));
    const planned = await weekOf(ines);
    const dose = nextDose(planned, 'g');
    if (!dose) return stage.check('granules are planned', false, planned.doses);
    await server.restart(whenDue(dose, planned));

    const visitor = await stage.visitor(server, 'Ines', { width: 390, height: 844, touch: true });
    const { page } = visitor;
    await enterAs(visitor, ines);
    await page.goto('/week');
    await stage.part('asked the first time', () => asked(stage, page));
    await stage.part('without a connection', () => withoutConnection(stage, visitor));
    await stage.part('confirmed', () => confirm(stage, page));
    await page.reload();
    await stage.part('not asked again', () => notAsked(stage, page, 'after a reload'));
    stage.equal('the server knows it of the whole week', (await unconfirmed(ines)).length, 0);

    const granules = shelf.find(({ form }) => form === 'granular');
    await ines.must('POST', '/api/shelf-products', { ...granules, strength: 70 });
    await page.reload();
    await stage.part('asked again of another strength', () => asked(stage, page));
    await stage.part('confirmed anew', () => confirm(stage, page));
    await page
      .getByRole('button', { name: words('doses.action.given'), exact: true })
      .first()
      .click();
    await page
      .getByRole('button', { name: words('doses.action.undo'), exact: true })
      .first()
      .waitFor();
    const given = (await weekOf(ines)).doses.filter(({ status }) => status === 'given');
    stage.equal('and the dose can be ticked', given.length, 1);
  },
};

const unconfirmed = async (person: Person) => (await weekOf(person)).doses.filter(({ stopDue }) => stopDue);
const tick = (page: Page) => page.getByRole('button', { name: words('doses.action.given'), exact: true });

async function asked(stage: Stage, page: Page): Promise<void> {
  await readStop(page).first().waitFor();
  const caution = page.getByRole('group', { name: words('common.stop') }).first();
  const text = (await caution.innerText()).replace(/\s+/g, ' ');
  stage.check('the Stop is there', text.includes('Never let two different pool products touch'), text);
  stage.check('with a button that has a name', text.includes('Ines: I have read this and will do so'), text);
  stage.equal('before it nothing can be ticked', await tick(page).count(), 0);
  const claim = page.getByRole('button', { name: words('doses.action.claim'), exact: true });
  stage.equal('nor begun', await claim.count(), 0);
}

async function withoutConnection(stage: Stage, visitor: Visitor): Promise<void> {
  const { page } = visitor;
  // Code that had not come yet is asked for again.
  visitor.expect(/ERR_INTERNET_DISCONNECTED/, /ERR_FAILED .*\/_next\/static\/chunks\//);
  await page.context().setOffline(true);
  await readStop(page).first().click();
  await page.getByText(words('doses.stop.unsent')).first().waitFor();
  const steps = page.getByRole('region', { name: words('doses.stepsHeading') }).first();
  stage.check('the steps can still be read', (await steps.innerText()).includes('Goggles and gloves on'));
  stage.equal('and nothing can be ticked yet', await tick(page).count(), 0);
  await page.context().setOffline(false);
}

async function confirm(stage: Stage, page: Page): Promise<void> {
  await readStop(page).first().click();
  await notAsked(stage, page, 'once confirmed');
}

async function notAsked(stage: Stage, page: Page, when: string): Promise<void> {
  await tick(page).first().waitFor();
  stage.equal(`${when}: no Stop to confirm`, await readStop(page).count(), 0);
  const said = await page.locator('main').innerText();
  stage.check(`${when}: the caution stands there`, said.includes('Never let two different pool products touch'), said);
}
