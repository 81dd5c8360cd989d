import { setTimeout as wait } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import { sharedRun } from '@/lib/services/shared-run';

/** Work that reads a number when it begins and answers with it a moment later. */
function reader() {
  const state = { value: 0, started: 0 };
  const work = async () => {
    state.started += 1;
    const { value } = state;
    await wait(5);
    return value;
  };
  return { state, work };
}

describe('sharedRun', () => {
  it('gives everyone who asks a run that began after they asked', async () => {
    const { state, work } = reader();
    const answers = await Promise.all(
      [1, 2, 3, 4, 5].map((value) => {
        state.value = value;
        return sharedRun('one', work);
      }),
    );
    expect(answers).toEqual([1, 5, 5, 5, 5]);
    expect(state.started).toBe(2);
  });

  it('begins anew when nothing runs', async () => {
    const { state, work } = reader();
    for (const value of [1, 2, 3]) {
      state.value = value;
      expect(await sharedRun('two', work)).toBe(value);
    }
    expect(state.started).toBe(3);
  });

  it('goes on after a run that failed, and keeps the failure to those who asked for it', async () => {
    let tries = 0;
    const work = async () => {
      tries += 1;
      await wait(5);
      if (tries === 1) throw new Error('first');
      return tries;
    };
    const [first, second] = await Promise.allSettled([sharedRun('three', work), sharedRun('three', work)]);
    expect(first.status).toBe('rejected');
    expect(second).toEqual({ status: 'fulfilled', value: 2 });
  });

  it('does not let one household wait for another', async () => {
    const { state, work } = reader();
    await Promise.all([sharedRun('four', work), sharedRun('five', work)]);
    expect(state.started).toBe(2);
  });
});
