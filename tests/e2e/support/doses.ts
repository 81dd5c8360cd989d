import { randomUUID } from 'node:crypto';
import type { Page } from 'playwright-core';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { weekOf } from './households';
import type { Person } from './person';
import { pattern, words } from './words';

/** The next dose that nobody has dealt with; of grams, where it has to be one that is weighed. */
export const nextDose = ({ doses, now }: WeekSheet, unit?: PlanDose['unit']) =>
  doses.find((dose) => dose.status === 'planned' && dose.at > now && (unit ?? dose.unit) === dose.unit);

/** A minute into the hours in which a dose may be ticked, and never back in time. */
export const whenDue = ({ tickFrom }: PlanDose, { now }: WeekSheet): string =>
  new Date(Math.max(Date.parse(tickFrom), Date.parse(now)) + 60_000).toISOString();

/** The button of somebody who has read the Stop of a product. */
export const readStop = (page: Page) => page.getByRole('button', { name: pattern('doses.stop.confirm') });

/** On a desk: reads the Stop of the last dose that asks for it, says so, and comes back to the sheet. */
export async function confirmStopOnDesk(page: Page): Promise<void> {
  await page
    .getByRole('button', { name: words('doses.stop.first') })
    .last()
    .click();
  await readStop(page).click();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: words('doses.action.given'), exact: true })
    .waitFor();
  await closeDialog(page);
}

/** Without a browser: the Stop of every product of the week. */
export async function confirmStops(person: Person): Promise<void> {
  for (const { id: doseId, stopDue } of (await weekOf(person)).doses)
    if (stopDue) await person.must('POST', '/api/stop-confirmations', { id: randomUUID(), doseId });
}

export async function closeDialog(page: Page): Promise<void> {
  await page.keyboard.press('Escape');
  await page.getByRole('dialog').waitFor({ state: 'detached' });
}
