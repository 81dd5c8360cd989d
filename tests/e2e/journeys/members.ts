import type { Page } from 'playwright-core';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { confirmStopOnDesk, nextDose, whenDue } from '../support/doses';
import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { curves } from '../support/sheet';
import { until } from '../support/waiting';
import { pattern, words } from '../support/words';

/** An owner invites somebody to look; they see the sheet, are made a caretaker, read the safety card and tick a dose. */
export const members: Journey = {
  name: 'members',
  seconds: 180,
  async run(stage) {
    const server = await stage.server({ name: 'members', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    await ines.must('POST', '/api/readings', fullTest(sundayEvening));
    const owner = await stage.visitor(server, 'Ines', { width: 1440, height: 1000 });
    await enterAs(owner, ines);
    const link = await invite(owner.page);

    const guest = await stage.visitor(server, 'Otto', { width: 1440, height: 1000 });
    guest.expect(/status of (403|409)/);
    await joinByLink(stage, guest.page, link);
    await guest.page.goto('/week');
    const doses = guest.page.getByText(words('doses.action.given'), { exact: true });
    stage.equal('who only looks cannot tick', await doses.count(), 0);
    const otto = new Person(server);
    const cookies = await guest.context.cookies();
    otto.cookie = cookies.map(({ name, value }) => `${name}=${value}`).join('; ');
    const planned = await otto.must<WeekSheet>('GET', '/api/week');
    stage.check('but sees the whole plan', planned.doses.length > 0, planned.plan);
    stage.equal('and changes nothing', (await otto.send('POST', '/api/readings', fullTest(sundayEvening))).status, 403);

    await stage.part('a link opens once', async () => {
      const third = await stage.visitor(server, 'somebody else', { width: 390, height: 844 });
      await third.page.goto(link);
      await third.page.getByText(words('invitation.over.used')).waitFor();
    });

    await owner.page.reload();
    const role = owner.page.getByLabel(pattern('household.changeRole')).nth(1);
    await role.selectOption('caretaker');
    await owner.page.getByText(words('household.does.caretaker')).waitFor();
    const adult = owner.page.getByRole('switch').nth(1);
    if ((await adult.getAttribute('aria-checked')) !== 'true') await adult.click();
    await owner.page.getByText(words('household.card.waits')).waitFor();

    const dose = nextDose(planned);
    if (!dose) return stage.check('a dose lies ahead', false, planned.doses);
    await guest.page.goto('/household');
    await guest.page.getByRole('button', { name: words('household.card.confirm'), exact: true }).click();
    await guest.page.getByText(pattern('household.card.handles')).first().waitFor();
    await guest.page.goto('about:blank');
    await owner.page.goto('about:blank');
    await server.restart(whenDue(dose, planned));
    await stage.part('the caretaker ticks, and the owner sees it', async () => {
      await otto.must('PUT', '/api/tour', { closed: true });
      await guest.page.goto('/week');
      await guest.page.locator(curves).first().waitFor({ state: 'attached' });
      await confirmStopOnDesk(guest.page);
      await doses.first().click();
      const given = async () =>
        (await ines.must<WeekSheet>('GET', '/api/week')).doses.find(({ status }) => status === 'given');
      await until(async () => (await given()) !== undefined);
      stage.equal('with the name of who gave it', (await given())?.doneBy, 'Otto');
    });

    await stage.part('who is removed sees nothing any more', async () => {
      await owner.page.goto('/household');
      await owner.page
        .getByRole('button', { name: words('household.remove') })
        .first()
        .click();
      await owner.page
        .getByRole('dialog')
        .getByRole('button', { name: words('household.removeYes'), exact: true })
        .click();
      await until(async () => (await otto.send('GET', '/api/week')).status === 403);
      stage.equal('from that moment on', (await otto.send('GET', '/api/week')).status, 403);
      await guest.page.goto('/week');
      await guest.page.getByText(words('start.signIn.nowhere')).waitFor();
    });
  },
};

async function invite(page: Page): Promise<string> {
  await page.goto('/household');
  await page.waitForLoadState('networkidle');
  await page.getByLabel(words('household.name'), { exact: true }).fill('Otto');
  await page.getByRole('button', { name: words('household.invite'), exact: true }).click();
  const link = page.getByLabel(pattern('household.linkFor'));
  await link.waitFor();
  return link.inputValue();
}

async function joinByLink(stage: Stage, page: Page, link: string): Promise<void> {
  await page.goto(link);
  await page.waitForLoadState('networkidle');
  stage.equal(
    'the name is there already',
    await page.getByLabel(words('invitation.name'), { exact: true }).inputValue(),
    'Otto',
  );
  await page.getByLabel(words('invitation.email'), { exact: true }).fill('otto@pool.example');
  await page.getByLabel(words('invitation.password'), { exact: true }).fill('four words in a row');
  await page.getByRole('button', { name: words('invitation.submit'), exact: true }).click();
  await page.waitForURL('**/week');
}
