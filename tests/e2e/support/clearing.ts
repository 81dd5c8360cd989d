import { randomUUID } from 'node:crypto';
import type { NewReading } from '@/lib/schemas/reading';
import type { Situations } from '@/lib/schemas/situation';
import { confirmStops, nextDose, whenDue } from './doses';
import { describePool, fullTest, sundayEvening, weekOf } from './households';
import type { Person } from './person';
import type { Server } from './server';

/** What is read on the mornings after a Sunday: still below what a clear pool keeps, and then not any more. */
const mornings = [
  { takenAt: '2026-07-06T07:10:00-04:00', freeChlorine: 4.2, look: 'green' },
  { takenAt: '2026-07-07T07:10:00-04:00', freeChlorine: 6.9, look: 'cloudy' },
  { takenAt: '2026-07-08T07:10:00-04:00', freeChlorine: 9.6, look: 'clear' },
] as const;

export const situationsOf = (person: Person) => person.must<Situations>('GET', '/api/situations');

/** Green water on its third morning: three treatment evenings, one good morning. The server's clock goes along. */
export async function clearThreeDays(server: Server, person: Person): Promise<void> {
  await describePool(person);
  const green = fullTest(sundayEvening);
  const values = { ...green.values, freeChlorine: 0.6, pH: 7.3, cyanuricAcid: 34 };
  await person.must('POST', '/api/readings', { ...green, values, look: 'green' });
  const id = randomUUID();
  const answers = { drain: 'not-at-all', look: 'green', addedInLastDay: 'no' };
  await person.must('POST', '/api/situations', { id, situation: { kind: 'clearing', answers } });
  await tick(person, id, 'pump-day-and-night');
  for (const { takenAt, freeChlorine, look } of mornings) {
    await giveDose(server, person);
    await server.restart(takenAt);
    const test: NewReading = fullTest(takenAt, { kind: 'quick', values: { freeChlorine, pH: 7.4 }, look });
    await person.must('POST', '/api/readings', test);
    if (look === 'clear') await tick(person, id, `drain-seen-${takenAt.slice(0, 10)}`);
  }
}

async function giveDose(server: Server, person: Person): Promise<void> {
  const week = await weekOf(person);
  const dose = nextDose(week, 'g');
  if (!dose) throw new Error('no treatment evening is planned');
  await server.restart(whenDue(dose, week));
  await confirmStops(person);
  const { planVersion } = dose;
  await person.must('POST', `/api/doses/${dose.id}/ticks`, { id: randomUUID(), action: 'given', planVersion });
}

const tick = (person: Person, id: string, step: string) =>
  person.must('POST', `/api/situations/${id}/ticks`, { step, done: true });
