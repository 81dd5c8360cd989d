import { borrowSession, enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening, viewerOf } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { pattern, words } from '../support/words';

const dayBefore = '2026-07-11T23:30:00-04:00';
const during = '2026-07-15T12:00:00-04:00';
const dayAfter = '2026-07-20T00:00:30-04:00';

/** An owner goes away: somebody who only looks is asked, agrees, enters a test in those days, and only looks again after them. */
export const handOver: Journey = {
  name: 'hand-over',
  seconds: 180,
  async run(stage) {
    const server = await stage.server({ name: 'hand-over', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    await ines.must('POST', '/api/readings', fullTest(sundayEvening));
    const otto = await viewerOf(server, ines, 'Otto');
    const test = async (person: Person, at: string) =>
      (await person.send('POST', '/api/readings', fullTest(at))).status;

    const owner = await stage.visitor(server, 'Ines', { width: 1440, height: 1000 });
    await enterAs(owner, ines);
    await stage.part('the owner hands the pool over', async () => {
      const { page } = owner;
      await page.goto('/household');
      await page.getByText(words('household.duty.none')).waitFor();
      await page.getByText(words('household.duty.open')).click();
      await page.getByLabel(words('household.duty.who'), { exact: true }).selectOption({ label: 'Otto' });
      await page.getByLabel(words('household.duty.from'), { exact: true }).fill('2026-07-12');
      await page.getByLabel(words('household.duty.until'), { exact: true }).fill('2026-07-19');
      await page.getByRole('button', { name: words('household.duty.ask'), exact: true }).click();
      await page.getByText(pattern('household.duty.kept')).waitFor();
      stage.equal(
        'which changes nothing before he agrees',
        await page.locator('h1').innerText(),
        words('household.title'),
      );
    });

    const guest = await stage.visitor(server, 'Otto', { width: 390, height: 844 });
    await enterAs(guest, otto);
    await stage.part('who is asked agrees on a phone', async () => {
      const { page } = guest;
      await page.goto('/household');
      await page.waitForLoadState('networkidle');
      await page.getByRole('button', { name: words('household.duty.agree'), exact: true }).click();
      await page.getByRole('button', { name: words('household.duty.giveBack'), exact: true }).waitFor();
      stage.equal(
        'and it is the first thing the page says',
        await page.locator('h1').innerText(),
        'You look after it July 12 to 19.',
      );
      await borrowSession(guest, otto);
      stage.equal('but may not yet', await test(otto, sundayEvening), 403);
      await page.goto('about:blank');
    });
    await owner.page.goto('about:blank');

    await server.restart(dayBefore);
    stage.equal('nor half an hour before', await test(otto, dayBefore), 403);

    await server.restart(during);
    await stage.part('in those days the test is his', async () => {
      stage.equal('and is kept', await test(otto, during), 200);
      await guest.page.goto('/household');
      await guest.page.getByText(pattern('household.duty.now')).waitFor();
      const refused = await otto.send('GET', '/api/audit-trail');
      stage.equal('while who changed what stays with owners', refused.status, 403);
      await guest.page.goto('about:blank');
    });

    await server.restart(dayAfter);
    await stage.part('after them he only looks', async () => {
      stage.equal('by himself, on the minute', await test(otto, dayAfter), 403);
      await owner.page.goto('/household');
      await owner.page.getByText(words('household.duty.none')).waitFor();
    });

    await stage.part('the owner reads who changed what', async () => {
      const { page } = owner;
      await page.getByRole('button', { name: words('household.audit.show'), exact: true }).click();
      const entries = page.locator('[aria-labelledby="audit-trail"] li');
      await entries.first().waitFor();
      const told = (await entries.allInnerTexts()).map((text) => text.replace(/\s+/g, ' '));
      stage.check('with the test that Otto entered first', told[0]?.endsWith('Otto entered a test') === true, told);
      stage.check(
        'when he agreed',
        told[1]?.endsWith('Otto agreed to look after the pool: July 12 to 19') === true,
        told,
      );
      stage.check('and to whom it was handed', told[2]?.includes('Ines handed the pool over to Otto') === true, told);
    });
  },
};
