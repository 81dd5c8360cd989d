import type { SampleWater } from '@/lib/schemas/sample-water';
import type { SampleAnswer, SampleQuestion } from './messages';

/** As much of a thread as is used. */
export type SampleThread = Pick<Worker, 'terminate'> & {
  postMessage(question: SampleQuestion): void;
  onmessage: ((event: MessageEvent<SampleAnswer>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
};

/**
 * Asks the engine for the week of one water after another. A plan takes longer than a finger needs for the next step of a
 * slider: while one is being made only the newest question waits.
 */
export class SampleSession {
  private asked: SampleWater | undefined;
  private waiting: SampleWater | undefined;
  private thread: SampleThread | undefined;

  constructor(
    private readonly heard: (answer: SampleAnswer) => void,
    private readonly open: () => SampleThread = openThread,
  ) {}

  ask(water: SampleWater): void {
    if (this.asked !== undefined) {
      this.waiting = water;
      return;
    }
    this.thread ??= this.opened();
    this.asked = water;
    this.thread.postMessage(water);
  }

  close(): void {
    this.thread?.terminate();
    this.thread = undefined;
    this.asked = undefined;
    this.waiting = undefined;
  }

  private opened(): SampleThread {
    const thread = this.open();
    thread.onmessage = ({ data }) => this.hear(data);
    // The engine did not load, or went down: the next question gets a new one.
    thread.onerror = () => {
      const { asked } = this;
      this.close();
      if (asked !== undefined) this.heard({ failed: asked });
    };
    return thread;
  }

  private hear(answer: SampleAnswer): void {
    const { waiting } = this;
    this.asked = undefined;
    this.waiting = undefined;
    this.heard(answer);
    if (waiting !== undefined) this.ask(waiting);
  }
}

function openThread(): SampleThread {
  return new Worker(new URL('./worker.ts', import.meta.url), { type: 'module' });
}
