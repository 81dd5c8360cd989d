import type { Page } from 'playwright-core';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { laneFaults } from '../looks/lane-words';
import { enterAs } from '../support/enter';
import type { Journey, Stage } from '../support/journey';
import type { Person } from '../support/person';
import type { Server } from '../support/server';
import { curves } from '../support/sheet';
import { type Household, midweek, settle, tenHouseholds } from '../support/ten-households';
import { words } from '../support/words';

const widths = [1920, 1760, 1600, 1440, 1366, 1280, 1152, 1024, 960, 904] as const;

/** No label of the week sheet lies over another, on a curve or outside its lane, whatever the week and the screen. */
export const labelBoxes: Journey = {
  name: 'labels of the week',
  seconds: 240,
  async run(stage) {
    const server = await stage.server({ name: 'label-boxes', clock: midweek, fresh: true });
    const visitor = await stage.visitor(server, 'ten households', { width: widths[0], height: 1000 });
    // While one is looked at the next is planned, no more than one: there are two processors.
    let next = settled(server, tenHouseholds[0]);
    for (const [index, household] of tenHouseholds.entries())
      await stage.part(household.name, async () => {
        const here = await next;
        next = settled(server, tenHouseholds[index + 1]);
        if ('problem' in here) throw here.problem;
        stage.check(`${household.name}: there is a plan`, here.sheet.plan !== null, here.sheet.planProblem);
        await enterAs(visitor, here.person);
        await throughTheWidths(stage, visitor.page, household.name);
      });
  },
};

type Settled = { person: Person; sheet: WeekSheet };

/** What goes wrong with the next household is that household's, not of the one that is looked at meanwhile. */
async function settled(server: Server, household: Household | undefined): Promise<Settled | { problem: unknown }> {
  if (household === undefined) return { problem: new Error('There is no such household.') };
  return settle(server, household).catch((problem: unknown) => ({ problem }));
}

async function throughTheWidths(stage: Stage, page: Page, household: string): Promise<void> {
  await page.goto('/week');
  await page.locator(curves).nth(2).waitFor({ state: 'attached' });
  await page.evaluate(() => document.fonts.ready);
  for (const width of widths) {
    await page.setViewportSize({ width, height: 1000 });
    await drawnAgain(page);
    const here = (what: string) => `${household} at ${width}: ${what}`;
    const { words: seen, curves: lines, ...faults } = await laneFaults(page, words('week.lane.scroll'));
    stage.check(here('words and curves to look at'), seen > 40 && lines >= 3, `${seen} words, ${lines} curves`);
    stage.none(here('no label over another'), faults.overlaps);
    stage.none(here('no label outside its lane'), faults.clipped);
    stage.none(here('no label on a curve'), faults.onCurve);
    stage.none(here('no label too small'), faults.small);
  }
}

/** The charts fill their lanes again. */
async function drawnAgain(page: Page): Promise<void> {
  await page.waitForFunction(() =>
    [...document.querySelectorAll('svg.recharts-surface')].every((chart) => {
      const lane = chart.closest('div.grid')?.children[1]?.getBoundingClientRect();
      return lane !== undefined && Math.abs(lane.width - chart.getBoundingClientRect().width) < 1;
    }),
  );
  await page.evaluate(() => new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(drawn))));
}
