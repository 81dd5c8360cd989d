import { enterAs } from '../support/enter';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { until } from '../support/waiting';
import { words } from '../support/words';

const chunks = '**/_next/static/chunks/*.js';
/** Stands in the code of Try it and nowhere else. */
const codeOfTryIt = 'try-it-loading';

/** The connection goes when the sheet is drawn and the rest of its code is not there: what is drawn stays, and the rest follows. */
export const lateCode: Journey = {
  name: 'code that comes late',
  seconds: 90,
  async run(stage) {
    const server = await stage.server({ name: 'late-code', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    await ines.must('POST', '/api/readings', fullTest(sundayEvening));
    for (const { what, width } of [
      { what: 'desk', width: 1440 },
      { what: 'phone', width: 390 },
    ])
      await stage.part(what, async () => {
        const visitor = await stage.visitor(server, what, { width, height: 900 });
        const { page } = visitor;
        await enterAs(visitor, ines);
        visitor.expect(/ERR_FAILED .*\/_next\/static\/chunks\//);
        // A service worker would fetch it where nobody can withhold it.
        await visitor.context.addInitScript('delete Navigator.prototype.serviceWorker');
        let withheld = 0;
        await page.route(chunks, async (route) => {
          const response = await route.fetch();
          if (!(await response.text()).includes(codeOfTryIt)) return route.fulfill({ response });
          withheld += 1;
          await route.abort();
        });
        await page.goto('/week');
        stage.check(`${what}: it is withheld`, await until(() => withheld > 0));
        await page.waitForTimeout(2000);
        const text = await page.locator('main').innerText();
        stage.check(`${what}: the sheet stays`, /The water is fine for swimming until/.test(text), text.slice(0, 300));
        // The words of Try it stand there before its code does; until then its controls are off.
        const off = page.locator('fieldset[inert]').filter({ hasText: words('try-out.title') });
        stage.equal(`${what}: Try it is not alive yet`, await off.count(), 1);
        // One that is being withheld just now is answered anyway.
        await page.unrouteAll({ behavior: 'ignoreErrors' });
        const alive = await until(async () => (await off.count()) === 0, { seconds: 40, every: 500 });
        stage.check(`${what}: it comes to life by itself`, alive);
      });
    await stage.part('pressed before anybody listens', () => pressedEarly(stage, server, ines));
  },
};

/** A press on the words from the server, while the scripts are still on their way. */
async function pressedEarly(stage: Stage, server: Server, person: Person): Promise<void> {
  const visitor = await stage.visitor(server, 'in a hurry', { width: 390, height: 900, touch: true });
  const { page } = visitor;
  await enterAs(visitor, person);
  await visitor.context.addInitScript('delete Navigator.prototype.serviceWorker');
  let release = () => {};
  const released = new Promise<void>((resolve) => (release = resolve));
  await page.route(chunks, async (route) => {
    await released;
    await route.continue();
  });
  await page.goto('/week', { waitUntil: 'commit' });
  await page
    .getByRole('button', { name: words('doses.action.skip') })
    .first()
    .click();
  const asked = page.getByText(words('doses.action.skipAsk'));
  stage.equal('nothing happens before the code is there', await asked.isVisible(), false);
  release();
  await asked.waitFor();
  stage.check('it is done when the code is there', await asked.isVisible());
}
