import type { Page } from 'playwright-core';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { borrowSession } from '../support/enter';
import {
  addProduct,
  answerLabel,
  answerLining,
  answerScope,
  answerSize,
  answerSun,
  answerWater,
  choice,
  goOn,
  signUp,
  typeKit,
} from '../support/first-run';
import { weekOf } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import { curves } from '../support/sheet';
import { words } from '../support/words';

type ChangeDay = {
  name: string;
  timeZone: string;
  locale: string;
  place: { latitude: string; longitude: string };
  /** On the day on which clocks change. */
  clock: string;
  day: string;
  hours: number;
};

const newYork = { timeZone: 'America/New_York', locale: 'en-US', place: { latitude: '40.7', longitude: '-74' } };

const changeDays: readonly ChangeDay[] = [
  { ...newYork, name: 'spring, New York', clock: '2027-03-14T12:30:00-04:00', day: '2027-03-14', hours: 23 },
  { ...newYork, name: 'autumn, New York', clock: '2026-11-01T12:30:00-05:00', day: '2026-11-01', hours: 25 },
  {
    name: 'autumn, Madrid',
    timeZone: 'Europe/Madrid',
    locale: 'en-GB',
    place: { latitude: '40.4', longitude: '-3.7' },
    clock: '2026-10-25T12:30:00+01:00',
    day: '2026-10-25',
    hours: 25,
  },
];

/** The whole way from sign-up to the week sheet on a day of 23 or 25 hours. */
export const clockChanges: readonly Journey[] = changeDays.map((change) => ({
  name: `clock change: ${change.name}`,
  seconds: 120,
  run: (stage) => throughTheDay(stage, change),
}));

async function throughTheDay(stage: Stage, change: ChangeDay): Promise<void> {
  const { timeZone, locale } = change;
  const server = await stage.server({ name: change.name.replace(/\W+/g, '-'), clock: change.clock });
  const visitor = await stage.visitor(server, change.name, { width: 1440, timeZone, locale });
  const { page } = visitor;
  await signUp(page, { email: 'ines@pool.example', password: 'four words in a row' });
  await describe(page, change);
  await enterTest(page);
  await page.goto('/week');
  await page.locator(curves).nth(2).waitFor({ state: 'attached' });
  const person = new Person(server);
  await borrowSession(visitor, person);
  const sheet = await weekOf(person);
  stage.equal('the household lives in the zone of its browser', sheet.household.timeZone, timeZone);
  stage.check('there is a plan', sheet.plan !== null && sheet.ahead !== null, sheet.planProblem);
  checkDays(stage, sheet, change);
  await checkColumns(stage, page, sheet);
  stage.check('the plan runs 168 h from its reading', sheet.plan !== null && span(sheet.plan) === 168, sheet.plan);
}

const hoursBetween = (from: string, to: string) => (Date.parse(to) - Date.parse(from)) / 3_600_000;
const span = ({ takenAt, endsAt }: { takenAt: string; endsAt: string }) => hoursBetween(takenAt, endsAt);

function checkDays(stage: Stage, { days }: WeekSheet, { day, hours }: ChangeDay): void {
  stage.equal(
    'each day is as long as it is',
    days.map((each) => hoursBetween(each.startsAt, each.endsAt)),
    days.map((each) => (each.day === day ? hours : 24)),
  );
  stage.check(
    'the day of the change is on the sheet',
    days.some((each) => each.day === day),
    days.map((each) => each.day),
  );
  const gaps = days.slice(1).filter((each, index) => each.startsAt !== days[index]?.endsAt);
  stage.none('each day begins where the one before ends', gaps);
}

/** The seven columns as they are drawn. */
async function checkColumns(stage: Stage, page: Page, { days }: WeekSheet): Promise<void> {
  const heads = await page
    .locator('h2:has(> span.font-display)')
    .evaluateAll((found) => found.map((head) => head.parentElement?.getBoundingClientRect().width ?? 0));
  stage.equal('seven columns', heads.length, 7);
  const whole = heads.reduce((sum, width) => sum + width, 0);
  const all = days.reduce((sum, each) => sum + hoursBetween(each.startsAt, each.endsAt), 0);
  const wrong = days.flatMap((each, index) => {
    const wanted = (hoursBetween(each.startsAt, each.endsAt) / all) * whole;
    const found = heads[index] ?? 0;
    return Math.abs(found - wanted) > 0.6 ? [`${each.day}: ${found.toFixed(1)} px, not ${wanted.toFixed(1)}`] : [];
  });
  stage.none('each as wide as its hours', wrong);
}

async function describe(page: Page, { place }: ChangeDay): Promise<void> {
  await answerScope(page);
  await goOn(page, 'scope', '/first-run/size');
  await answerSize(page, '75,7');
  await goOn(page, 'size', '/first-run/lining');
  await answerLining(page);
  await goOn(page, 'lining', '/first-run/sun');
  await answerSun(page, place);
  await goOn(page, 'sun', '/first-run/water');
  await answerWater(page);
  await goOn(page, 'water', '/first-run/shelf');
  const granules = { substance: 'calcium-hypochlorite', form: 'granular', strength: '65', stock: '4,5' } as const;
  await addProduct(page, { ...granules, way: 'dissolve' });
  await goOn(page, 'shelf', '/first-run/label');
  await answerLabel(page);
  await goOn(page, 'label', '/week');
}

async function enterTest(page: Page): Promise<void> {
  await page.goto('/test');
  await choice(page, words('readings.kind.full')).first().click();
  await choice(page, words('readings.method.drop-kit')).click();
  await typeKit(page, { freeChlorine: '3', pH: '7.5', totalAlkalinity: '90', cyanuricAcid: '40', temperature: '18' });
  await page.locator('#value-temperature').blur();
  await page.getByRole('button', { name: words('readings.save.full') }).click();
  await page.getByText(words('readings.saved.title')).waitFor();
}
