import type { Locator, Page } from 'playwright-core';
import type { RecordedReading } from '@/lib/schemas/reading';
import { borrowSession, enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { until } from '../support/waiting';
import { pattern, words } from '../support/words';

const password = 'four words in a row';

/** A member deletes the account; the owner closes the household, makes another one, and deletes theirs as well. */
export const leaving: Journey = {
  name: 'leaving',
  seconds: 180,
  async run(stage) {
    const server = await stage.server({ name: 'leaving', clock: sundayEvening });
    const ines = new Person(server);
    const { email } = await ines.signUp();
    await describePool(ines);
    const otto = await joined(ines);
    await otto.must('POST', '/api/readings', fullTest(sundayEvening));

    const owner = await stage.visitor(server, 'Ines', { width: 1440, height: 1000 });
    await enterAs(owner, ines);
    const member = await stage.visitor(server, 'Otto', { width: 390, height: 844 });
    await enterAs(member, otto);
    member.expect(/status of 422/);

    await stage.part('signing out on another device', async () => {
      const phone = new Person(server);
      await phone.must('POST', '/api/sign-in', { email, password });
      const { page } = owner;
      await page.goto('/household');
      const out = page.getByRole('listitem').getByRole('button', { name: pattern('household.devices.signOutOn') });
      await out.first().waitFor();
      const before = await out.count();
      await page.getByText(words('household.devices.this'), { exact: true }).waitFor();
      await out.last().click();
      await until(async () => (await out.count()) === before - 1);
      stage.equal('that one is signed out', (await phone.send('GET', '/api/week')).status, 401);
      stage.equal('this one is not', (await ines.send('GET', '/api/week')).status, 200);
    });

    await stage.part('a member deletes the account', async () => {
      const { page } = member;
      await page.goto('/household');
      await open(page, 'household.deleting.open');
      const dialog = page.getByRole('dialog');
      await dialog.getByText('Marrow Lane').waitFor();
      await confirm(dialog, 'household.deleting.yes', { wrongFirst: true });
      await page.waitForURL((url) => url.pathname === '/');
      stage.equal('and is signed out', (await otto.send('GET', '/api/week')).status, 401);
      const [reading] = await ines.must<RecordedReading[]>('GET', '/api/readings');
      stage.equal('the test stays, under nobody’s name', reading?.recordedBy, 'former member');
      await owner.page.goto('/week');
      await owner.page.getByText('former member').first().waitFor();
    });

    await stage.part('the owner closes the household', async () => {
      const { page } = owner;
      await page.goto('/household');
      await open(page, 'household.closing.open');
      const dialog = page.getByRole('dialog');
      await dialog.getByLabel(words('household.closing.name'), { exact: true }).fill('marrow lane');
      await confirm(dialog, 'household.closing.yes');
      await page.getByText(words('start.signIn.nowhere')).waitFor();
    });

    await stage.part('and makes another one', async () => {
      const { page } = owner;
      await page.waitForLoadState('networkidle');
      await page.getByLabel(words('start.signUp.householdName'), { exact: true }).fill('Heron Mill');
      await page.getByRole('button', { name: words('start.signIn.ownSubmit'), exact: true }).click();
      await page.waitForURL('**/first-run/**');
    });

    await stage.part('and deletes the account', async () => {
      await borrowSession(owner, ines);
      await describePool(ines);
      const { page } = owner;
      await page.goto('/household');
      await open(page, 'household.deleting.open');
      const dialog = page.getByRole('dialog');
      await dialog.getByText('Heron Mill').waitFor();
      await confirm(dialog, 'household.deleting.yes');
      await page.waitForURL((url) => url.pathname === '/');
      const again = await new Person(server).send('POST', '/api/sign-in', { email, password });
      stage.equal('and can no longer sign in', again.status, 401);
      const anew = new Person(server);
      await anew.signUp({ email, householdName: 'Anew' });
      stage.equal('the address is free', (await anew.send('GET', '/api/households')).status, 200);
    });
  },
};

async function joined(ines: Person): Promise<Person> {
  const invitation = { id: crypto.randomUUID(), name: 'Otto', role: 'caretaker', chemicalsAllowed: false };
  const { link } = await ines.must<{ link: string }>('POST', '/api/invitations', invitation);
  const otto = new Person(ines.server);
  const token = link.split('/').at(-1);
  const account = { token, name: 'Otto', email: 'otto@pool.example', password, locale: 'en-US' };
  await otto.must('POST', '/api/invitations/sign-up', account);
  await otto.must('PUT', '/api/tour', { closed: true });
  return otto;
}

async function open(page: Page, button: string): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.getByRole('button', { name: words(button), exact: true }).click();
}

async function confirm(dialog: Locator, button: string, { wrongFirst = false } = {}): Promise<void> {
  const field = dialog.getByLabel(words('household.deleting.password'), { exact: true });
  const yes = dialog.getByRole('button', { name: words(button), exact: true });
  if (wrongFirst) {
    await field.fill('not this one');
    await yes.click();
    await dialog.getByText('This is not the password you have now.').waitFor();
  }
  await field.fill(password);
  await yes.click();
}
