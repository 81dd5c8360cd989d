import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { borrowSession } from '../support/enter';
import { choice, typeKit } from '../support/first-run';
import { weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { curves } from '../support/sheet';
import { words } from '../support/words';

const morning = '2026-07-08T06:00:00Z';
const eveningOfThatDay = '2026-07-08T15:00:00Z';
const monthsLater = '2026-11-20T06:00:00Z';
const day = 24 * 3_600_000;

/** Looking round without an account: a full sheet at once, a copy of one's own, never stale. */
export const lookRound: Journey = {
  name: 'look round',
  seconds: 150,
  // It measures how long somebody waits.
  alone: true,
  async run(stage) {
    const server = await stage.server({ name: 'look-round', clock: morning, fresh: true });
    // The demo of the day is made when the server starts; whoever comes in that very moment waits for it.
    await new Person(server).must('POST', '/api/look-round');
    const first = await look(stage, server, 'first visitor');
    stage.check('the week is full', isFull(first.sheet), {
      readings: first.sheet.readings.length,
      doses: first.sheet.doses.length,
    });
    stage.equal('it says that it is a demo', first.sheet.household.demo, true);
    checkAge(stage, first.sheet);
    const untouched = await history(first.person);

    await stage.part('the copy can be written in', () => enterCheck(stage, first));
    const second = await look(stage, server, 'second visitor');
    const seen = await history(second.person);
    stage.equal('a second visitor sees nothing of it', seen, untouched);

    const elsewhere = await stage.server({ name: 'look-round-again', clock: eveningOfThatDay, fresh: true });
    const other = new Person(elsewhere);
    await other.must('POST', '/api/look-round');
    stage.equal('the same day gives the same rows on another server', await history(other), untouched);

    await stage.part('signing out leaves', async () => {
      const { page } = first.visitor;
      await page
        .getByRole('button', { name: words('navigation.signOut') })
        .first()
        .click();
      await page.waitForURL((url) => ['/', '/sign-in'].includes(url.pathname));
      await page.goto('/week');
      stage.check('the copy is closed', page.url().endsWith('/sign-in'), page.url());
      // Nobody looks on while the server is away.
      await page.goto('about:blank');
      await second.visitor.page.goto('about:blank');
    });

    await server.restart(monthsLater);
    const later = new Person(server);
    await later.must('POST', '/api/look-round');
    const sheet = await weekOf(later);
    checkAge(stage, sheet);
    stage.check('months later the week is full again', isFull(sheet), {
      readings: sheet.readings.length,
      doses: sheet.doses.length,
    });
  },
};

async function look(stage: Stage, server: Server, name: string) {
  const visitor = await stage.visitor(server, name, { width: 1440 });
  const { page } = visitor;
  await page.goto('/');
  const button = page.getByRole('button', { name: words('start.landing.lookRound') }).first();
  await button.and(page.locator(':enabled')).waitFor();
  const started = performance.now();
  await button.click();
  await page.waitForURL('**/week');
  await page.locator(curves).nth(2).waitFor({ state: 'attached' });
  const seconds = (performance.now() - started) / 1000;
  stage.check(`the ${name} sees a full sheet in under 5 s`, seconds < 5, `${seconds.toFixed(1)} s`);
  const person = new Person(server);
  await borrowSession(visitor, person);
  return { visitor, person, sheet: await weekOf(person) };
}

const isFull = ({ readings, doses, ahead, lastReading }: WeekSheet) =>
  lastReading !== null && ahead !== null && doses.length > 0 && readings.length > 0;

function checkAge(stage: Stage, { lastReading, now }: WeekSheet): void {
  const age = (Date.parse(now) - Date.parse(lastReading?.takenAt ?? now)) / day;
  stage.check('the newest reading is 1 to 3 days old', age >= 1 && age <= 3, `${age.toFixed(2)} days`);
}

/** What was measured in ten weeks, without what is different in each copy. */
async function history(person: Person): Promise<unknown> {
  const readings = await person.must<{ takenAt: string; kind: string; values: unknown }[]>('GET', '/api/readings');
  return readings.map(({ takenAt, kind, values }) => ({ takenAt: new Date(takenAt).toISOString(), kind, values }));
}

async function enterCheck(
  stage: Stage,
  { visitor: { page }, person }: Awaited<ReturnType<typeof look>>,
): Promise<void> {
  const before = (await weekOf(person)).readings.length;
  await page.goto('/test?kind=quick');
  await choice(page, words('readings.kind.quick')).first().click();
  await choice(page, words('readings.method.drop-kit')).click();
  await typeKit(page, { freeChlorine: '2.6', pH: '7.4' });
  await page.locator('#value-pH').blur();
  await page.getByRole('button', { name: words('readings.save.quick') }).click();
  await page.getByText(words('readings.saved.title')).waitFor();
  const { readings, lastReading } = await weekOf(person);
  stage.equal('a quick check is taken', readings.length, before + 1);
  stage.equal('and is the newest reading', lastReading?.values, { freeChlorine: 2.6, pH: 7.4 });
}
