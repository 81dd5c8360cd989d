import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import type { AdviceAnswer, CourseAnswer, TryItAnswer, TryItQuestion } from './messages';

/** As much of a thread as is used. */
export type TryItThread = Pick<Worker, 'terminate'> & {
  postMessage(question: TryItQuestion): void;
  onmessage: ((event: MessageEvent<TryItAnswer>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
};

type Heard = {
  course: (answer: CourseAnswer) => void;
  advice: (answer: AdviceAnswer) => void;
  /** The engine failed on the newest question, or cannot be started. */
  failed: () => void;
  /** Nothing is tried any more, so what was said of it is over. */
  stopped: () => void;
};

/** A plan is made once nothing has been changed for so long [ms]: it takes a hundred times as long as a course. */
const SETTLED_AFTER = 250;

/**
 * Asks the engine what becomes of the week. One thread answers with courses; plans are made in a second one, so that no
 * input ever waits for them. Only answers to the newest question are heard.
 */
export class TryItSession {
  private newest = 0;
  private planning: number | undefined;
  private settling: ReturnType<typeof setTimeout> | undefined;
  private waiting: (TryItQuestion & { number: number }) | undefined;
  private planner: TryItThread | undefined;
  private readonly courses: TryItThread;

  constructor(
    private readonly start: TryOutStart,
    private readonly heard: Heard,
    private readonly open: () => TryItThread = openThread,
  ) {
    this.courses = this.opened(() => {});
  }

  try(changes: TryOutChanges): void {
    this.newest += 1;
    const number = this.newest;
    this.courses.postMessage({ kind: 'course', number, changes });
    clearTimeout(this.settling);
    this.settling = setTimeout(() => this.plan({ kind: 'advice', number, changes }), SETTLED_AFTER);
  }

  /** Nothing is tried any more: whatever is still worked out is not heard. */
  stop(): void {
    this.newest += 1;
    this.waiting = undefined;
    clearTimeout(this.settling);
    this.heard.stopped();
  }

  close(): void {
    this.stop();
    this.courses.terminate();
    this.planner?.terminate();
  }

  private plan(question: TryItQuestion & { number: number }): void {
    if (this.planning !== undefined) {
      this.waiting = question;
      return;
    }
    this.planner ??= this.opened(() => this.nextPlan());
    this.planning = question.number;
    this.planner.postMessage(question);
  }

  private opened(answered: () => void): TryItThread {
    const thread = this.open();
    thread.onmessage = ({ data }) => {
      answered();
      this.hear(data);
    };
    thread.onerror = () => this.heard.failed();
    thread.postMessage({ kind: 'start', start: this.start });
    return thread;
  }

  private hear(answer: TryItAnswer): void {
    if (answer.number !== this.newest) return;
    if (answer.kind === 'course') this.heard.course(answer);
    else if (answer.kind === 'advice') this.heard.advice(answer);
    else this.heard.failed();
  }

  private nextPlan(): void {
    const { waiting } = this;
    this.planning = undefined;
    this.waiting = undefined;
    if (waiting?.number === this.newest) this.plan(waiting);
  }
}

function openThread(): TryItThread {
  return new Worker(new URL('./worker.ts', import.meta.url), { type: 'module' });
}
