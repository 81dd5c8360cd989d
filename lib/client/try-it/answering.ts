import type { TryOutStart } from '@/lib/schemas/try-out';
import { TryItEngine } from './engine';
import type { TryItAnswer, TryItQuestion } from './messages';

/**
 * Answers questions in a thread of its own: the median at once, the likely range after it. The latest question wins; between
 * a few members of the ensemble it looks whether a newer one has come, and gives the older one up.
 *
 * @param say   sends an answer
 * @param pause lets waiting messages in
 */
export function answering(say: (answer: TryItAnswer) => void, pause: () => Promise<void>) {
  let start: TryOutStart | undefined;
  let engine: TryItEngine | undefined;
  let latest = 0;

  const ready = () => {
    if (start === undefined) throw new Error('Something was tried before there was anything to try it on.');
    return (engine ??= new TryItEngine(start));
  };
  const course = async (number: number, changes: Parameters<TryItEngine['course']>[1]) => {
    latest = number;
    say(ready().course(number, changes));
    const isStale = () => pause().then(() => latest !== number);
    const likely = await ready().likely(number, changes, isStale);
    if (likely) say(likely);
  };

  return async (question: TryItQuestion): Promise<void> => {
    if (question.kind === 'start') {
      start = question.start;
      engine = undefined;
      // Before the first input comes, which then need not wait for it.
      ready().ready();
      return;
    }
    const { kind, number, changes } = question;
    try {
      if (kind === 'course') await course(number, changes);
      else say({ kind: 'advice', number, advice: ready().advice(changes) });
    } catch (fault) {
      say({ kind: 'failed', number });
      throw fault;
    }
  };
}
