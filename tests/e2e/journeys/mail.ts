import type { Page } from 'playwright-core';
import { enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { until } from '../support/waiting';
import { words } from '../support/words';

const another = 'a different row of words';

/** On a machine without a mail server: mail is read on a page of its own, and its links do what they say. */
export const mail: Journey = {
  name: 'mail',
  seconds: 120,
  async run(stage) {
    const server = await stage.server({ name: 'mail', clock: sundayEvening, variables: { MAIL: 'local' } });
    const told = () => server.log.find((line) => line.includes('/mailbox?key='));
    await until(async () => told() !== undefined);
    const mailbox = new URL(/https?:\S+/.exec(told() ?? '')?.[0] ?? server.address);
    const ines = new Person(server);
    const { email, password } = await ines.signUp();
    await describePool(ines);

    const { page } = await stage.visitor(server, 'Ines', { width: 390, height: 844 });
    await stage.part('the mailbox wants its key', async () => {
      await page.goto('/mailbox');
      await page.getByLabel(words('start.mailbox.key')).fill('not the key');
      await page.getByRole('button', { name: words('start.mailbox.open'), exact: true }).click();
      await page.getByText(words('start.mailbox.wrong')).waitFor();
      stage.equal('and shows nothing', await page.getByText(email).count(), 0);
    });

    await stage.part('an address is confirmed by its link', async () => {
      await page.goto(await linkOf(page, mailbox, /\/confirm\//));
      await page.getByRole('button', { name: words('start.confirm.yes') }).click();
      await page.getByText(words('start.confirm.done')).waitFor();
      stage.check('from then on', (await account(ines)).confirmed, await account(ines));
    });

    await stage.part('a forgotten password is replaced', async () => {
      await page.goto('/sign-in');
      await page.getByRole('link', { name: /another|otra/i }).click();
      await page.waitForURL('**/reset');
      await page.waitForLoadState('networkidle');
      await page.getByLabel(words('start.signIn.email'), { exact: true }).fill(email);
      await page.getByRole('button', { name: words('start.reset.submit') }).click();
      await page.getByText(words('start.reset.sentWords')).waitFor();
      await page.goto(await linkOf(page, mailbox, /\/reset\//));
      await page.waitForLoadState('networkidle');
      await page.getByLabel(words('start.signUp.password'), { exact: true }).fill(another);
      await page.getByRole('button', { name: words('start.reset.choose') }).click();
      await page.getByText(words('start.signIn.changed')).waitFor();
      stage.equal('every device is signed out', (await ines.send('GET', '/api/account')).status, 401);
      const tried = await ines.send('POST', '/api/sign-in', { email, password });
      stage.equal('the old one no longer opens', tried.status, 401);
      await ines.must('POST', '/api/sign-in', { email, password: another });
    });

    const owner = await stage.visitor(server, 'the owner', { width: 1440, height: 1000 });
    await enterAs(owner, ines);
    await stage.part('an invitation goes by mail', async () => {
      await owner.page.goto('/household');
      await owner.page.getByLabel(words('household.name'), { exact: true }).fill('Otto');
      await owner.page.getByLabel(words('household.mail.by'), { exact: true }).fill('otto@pool.example');
      await owner.page.getByRole('button', { name: words('household.mail.send'), exact: true }).click();
      await owner.page.getByRole('button', { name: words('household.mail.again'), exact: true }).waitFor();
      stage.equal('its link is told to nobody else', await owner.page.getByText(/\/invitation\//).count(), 0);
      const guest = await stage.visitor(server, 'Otto', { width: 390, height: 844 });
      await guest.page.goto(await linkOf(page, mailbox, /\/invitation\//));
      await guest.page.getByText(words('invitation.title')).waitFor();
    });

    await stage.part('another address holds once it is confirmed', async () => {
      await owner.page.locator('summary', { hasText: words('household.account.changeEmail') }).click();
      await owner.page.getByLabel(words('household.account.newEmail'), { exact: true }).fill('new@pool.example');
      await owner.page.getByLabel(words('household.account.current'), { exact: true }).first().fill(another);
      await owner.page.getByRole('button', { name: words('household.account.saveEmail'), exact: true }).click();
      await owner.page.getByText(words('household.account.savedEmail')).waitFor();
      stage.equal('not before', (await account(ines)).email, email);
      await page.goto(await linkOf(page, mailbox, /\/confirm\//));
      await page.getByRole('button', { name: words('start.confirm.yes') }).click();
      await page.getByText(words('start.confirm.done')).waitFor();
      stage.equal('from then on', (await account(ines)).email, 'new@pool.example');
    });

    await stage.part('without MAIL=local there is no mailbox, and mail is not offered', async () => {
      const silent = await stage.server({ name: 'no-mail', clock: sundayEvening });
      const gone = await fetch(`${silent.address}/mailbox${mailbox.search}`);
      stage.equal('not even with the key', gone.status, 404);
      const visitor = await stage.visitor(silent, 'nobody', { width: 390, height: 844 });
      await visitor.page.goto('/reset');
      await visitor.page.getByText(words('start.reset.noMailWords')).waitFor();
    });
  },
};

async function account(person: Person) {
  return person.must<{ email: string; confirmed: boolean }>('GET', '/api/account');
}

/** The link of the newest mail of its kind. Mail is written behind the answer, so it may take a moment. */
async function linkOf(page: Page, mailbox: URL, kind: RegExp): Promise<string> {
  let link: string | null = null;
  await until(async () => {
    await page.goto(mailbox.pathname + mailbox.search);
    const hrefs = await page
      .locator('main a, ol a')
      .evaluateAll((links) => links.map((each) => each.getAttribute('href') ?? ''));
    link = hrefs.find((href) => kind.test(href)) ?? null;
    return link !== null;
  });
  if (link === null) throw new Error(`No mail has a link like ${kind}.`);
  return link;
}
