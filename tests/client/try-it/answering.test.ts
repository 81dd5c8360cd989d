import { describe, expect, it } from 'vitest';
import { answering } from '@/lib/client/try-it/answering';
import type { TryItAnswer } from '@/lib/client/try-it/messages';
import { planWeek } from '@/lib/planner';
import { type TryOutStart, tryOutChangesSchema } from '@/lib/schemas/try-out';
import { scenarioOf } from '../../planner/scenarios';

const scenario = scenarioOf();
const start: TryOutStart = {
  ...{ planId: 'p', scenario, evenings: [], mostTablets: 3 },
  doses: planWeek(scenario).doses.map((dose, index) => ({
    ...dose,
    id: `00000000-0000-4000-8000-00000000000${index}`,
  })),
};
const party = (swimmerHours: number) => tryOutChangesSchema.parse({ swimmers: [{ day: '2026-07-09', swimmerHours }] });
const said = (answers: readonly TryItAnswer[]) =>
  answers.map((answer) => `${answer.number} ${answer.kind === 'course' && answer.likely ? 'likely' : answer.kind}`);

describe('the thread behind Try it', () => {
  it('says the median at once and the likely range after it', async () => {
    const answers: TryItAnswer[] = [];
    const ask = answering(
      (answer) => answers.push(answer),
      () => Promise.resolve(),
    );
    await ask({ kind: 'start', start });
    const asked = ask({ kind: 'course', number: 1, changes: party(8) });
    expect(said(answers)).toEqual(['1 course']);
    await asked;
    expect(said(answers)).toEqual(['1 course', '1 likely']);
  });

  it('gives the likely range of an older question up for a newer one', async () => {
    const answers: TryItAnswer[] = [];
    let pauses = 0;
    const newer: Promise<void>[] = [];
    const ask = answering(
      (answer) => answers.push(answer),
      async () => {
        pauses += 1;
        if (pauses === 3) newer.push(ask({ kind: 'course', number: 2, changes: party(9) }));
      },
    );
    await ask({ kind: 'start', start });
    await ask({ kind: 'course', number: 1, changes: party(8) });
    await Promise.all(newer);
    expect(said(answers)).toEqual(['1 course', '2 course', '2 likely']);
  });

  it('says that it failed when there is nothing to try anything on', async () => {
    const answers: TryItAnswer[] = [];
    const ask = answering(
      (answer) => answers.push(answer),
      () => Promise.resolve(),
    );
    await expect(ask({ kind: 'course', number: 1, changes: party(8) })).rejects.toThrow();
    expect(said(answers)).toEqual(['1 failed']);
  });
});
