/**
 * `npm run audit`: how quick and how open to everybody the pages of the production build are, beside an empty Next.js page in
 * the same run. Words after `--` choose pages by a part of their path; `--runs=1` is a quick look. Ends with 1 when a bar is
 * missed.
 */
import { chromium, type Page } from 'playwright-core';
import { enterAs } from '../e2e/support/enter';
import { flags, Visitor } from '../e2e/support/browser';
import { sundayEvening } from '../e2e/support/households';
import { Person } from '../e2e/support/person';
import { seededDatabase } from '../e2e/support/seeded';
import { freePort, Server } from '../e2e/support/server';
import { startEmptyPage } from './empty-page';
import { firstLoadKilobytes } from './first-load';
import { layoutShift, watchShifts } from './layout-shift';
import { scoresOf } from './lighthouse';
import { bars, type Measured, measured, widths } from './pages';
import { tryItTimes } from './try-it';
import { violationsOf } from './violations';

const words = process.argv.slice(2).filter((word) => !word.startsWith('--'));
const runs = Number(/--runs=(\d+)/.exec(process.argv.join(' '))?.[1] ?? 5);
// The start page has no other name than the beginning of all the others.
const meant = (path: string) => (word: string) => (word === '/' ? path === word : path.includes(word));
const chosen = measured.filter(({ path }) => words.length === 0 || words.some(meant(path)));

const misses: string[] = [];
const holds = (good: boolean, what: string) => {
  if (!good) misses.push(what);
  return good;
};

const port = await freePort();
const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM_PATH || '/usr/bin/chromium',
  args: [...flags, `--remote-debugging-port=${port}`],
});
const empty = await startEmptyPage(await freePort());
const server = await Server.start({ name: 'audit', clock: sundayEvening }, await seededDatabase(sundayEvening));
try {
  const member = new Person(server);
  await member.must('POST', '/api/look-round');
  const emptyScores = await scoresOf(empty.address, { cookie: '', port, runs });
  const emptyKilobytes = await firstLoadKilobytes(empty.address, '');

  console.log(
    `Medians of ${runs}. The empty page: performance ${emptyScores.performance}, ${emptyKilobytes.toFixed(0)} kB.\n`,
  );
  console.log(
    '| page | performance, beside the empty page | accessibility | best practices | layout shift | first scripts over the empty page [kB] | axe |',
  );
  console.log('|---|---|---|---|---|---|---|');
  for (const page of chosen) console.log(await rowOf(page, member, emptyScores.performance, emptyKilobytes));

  if (words.length === 0 || words.some(meant('/week try it'))) {
    const { sentence, curve } = await asVisitor(member, ({ page }) => tryItTimes(page, runs));
    holds(sentence <= bars.sentence, `Try it: sentence after ${sentence.toFixed(0)} ms`);
    holds(curve <= bars.curve, `Try it: curve after ${curve.toFixed(0)} ms`);
    console.log(
      `\nTry it at a quarter of the speed: sentence ${sentence.toFixed(0)} ms, curve ${curve.toFixed(0)} ms after an input.`,
    );
  }
} finally {
  await server.stop();
  empty.stop();
  await browser.close();
}
for (const miss of misses) console.log(`missed: ${miss}`);
console.log(misses.length === 0 ? '\nEvery bar is met.' : `\n${misses.length} bars are missed.`);
process.exit(misses.length === 0 ? 0 : 1);

async function rowOf(
  { path, as, firstLoad }: Measured,
  member: Person,
  floor: number,
  emptyKilobytes: number,
): Promise<string> {
  const cookie = as === 'member' ? member.cookie : '';
  const address = `${server.address}${path}`;
  const scores = await scoresOf(address, { cookie, port, runs });
  const kilobytes = (await firstLoadKilobytes(address, cookie)) - emptyKilobytes;
  const { shift, violations } = await asVisitor(as === 'member' ? member : undefined, async ({ page }) => ({
    shift: await mostShift(page, path),
    violations: await violationsOf(page, path, widths),
  }));
  const moved = Math.max(shift, scores.layoutShift);
  holds(scores.performance >= floor - bars.performance, `${path}: performance ${scores.performance}`);
  holds(
    scores.accessibility >= bars.accessibility,
    `${path}: accessibility ${scores.accessibility} (${scores.faults.join(', ')})`,
  );
  holds(
    scores.bestPractices >= bars.bestPractices,
    `${path}: best practices ${scores.bestPractices} (${scores.faults.join(', ')})`,
  );
  holds(moved <= bars.layoutShift, `${path}: layout shift ${moved.toFixed(3)}`);
  if (firstLoad !== undefined) holds(kilobytes <= firstLoad, `${path}: ${kilobytes.toFixed(1)} kB of ${firstLoad}`);
  holds(violations.length === 0, `${path}: ${violations.join('; ')}`);
  return `| \`${path}\` | ${scores.performance} (${scores.performance - floor}) | ${scores.accessibility} | ${scores.bestPractices} | ${moved.toFixed(3)} | ${kilobytes.toFixed(1)}${firstLoad === undefined ? '' : ` of ${firstLoad}`} | ${violations.length === 0 ? 'none' : violations.length} |`;
}

async function mostShift(page: Page, path: string): Promise<number> {
  await watchShifts(page);
  const shifts: number[] = [];
  for (const width of widths) shifts.push(await layoutShift(page, path, width));
  return Math.max(...shifts);
}

async function asVisitor<Result>(
  person: Person | undefined,
  run: (visitor: Visitor) => Promise<Result>,
): Promise<Result> {
  const visitor = await Visitor.open(browser, server, 'audit');
  try {
    if (person) await enterAs(visitor, person);
    return await run(visitor);
  } finally {
    await visitor.context.close();
  }
}
