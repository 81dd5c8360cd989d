import type { Worker } from 'node:worker_threads';
import { AppError } from '@/lib/errors';
import { type Answer, type EngineTask, type EngineTasks, errorOf, type Question } from './messages';

type AnyAnswer = EngineTasks[EngineTask]['answer'];
type Job = { question: Question; resolve: (answer: AnyAnswer) => void; reject: (error: Error) => void };
type Running = { job: Job; timer: NodeJS.Timeout };

export type EngineOptions = {
  startThread: () => Worker;
  /** Longest a job may take, and longest a thread may take to load [ms]. */
  jobLimit?: number;
  loadLimit?: number;
  /** Jobs that may wait; one more is refused. */
  queueLimit?: number;
};

const busy = (why: string) =>
  new AppError(
    'engine-busy',
    'The plan could not be worked out in time. Your entries are saved; try again in a moment.',
    {
      cause: new Error(why),
    },
  );

/**
 * Runs the engine in one long-lived thread, one job after another in the order asked, so that a plan never keeps the
 * server from answering. A job over its limit takes the thread with it and fails; so does a job during which the thread
 * crashes. The next job gets a new thread.
 */
export class Engine {
  private readonly waiting: Job[] = [];
  private running: Running | undefined;
  private thread: Worker | undefined;
  private loaded = false;
  private lastId = 0;
  private readonly options: Required<EngineOptions>;

  constructor(options: EngineOptions) {
    this.options = { jobLimit: 5_000, loadLimit: 20_000, queueLimit: 200, ...options };
  }

  /** Does a task; rejects with what the engine threw, with `engine-busy`, or with the crash. */
  async run<Task extends EngineTask>(
    task: Task,
    order: EngineTasks[Task]['order'],
  ): Promise<EngineTasks[Task]['answer']> {
    if (this.waiting.length >= this.options.queueLimit) throw busy('The queue is full.');
    return new Promise<AnyAnswer>((resolve, reject) => {
      this.lastId += 1;
      this.waiting.push({ question: { id: this.lastId, task, order }, resolve, reject });
      this.next();
    });
  }

  /** Ends the thread; what waits is worked off by a new one. */
  async close(): Promise<void> {
    const thread = this.thread;
    this.lose(busy('The engine was closed.'));
    await thread?.terminate();
  }

  private next(): void {
    if (this.running || this.waiting.length === 0) return;
    const job = this.waiting.shift()!;
    const thread = this.thread ?? this.start();
    thread.ref();
    this.running = { job, timer: this.alarm(this.loaded ? this.options.jobLimit : this.options.loadLimit) };
    if (this.loaded) thread.postMessage(job.question);
  }

  private start(): Worker {
    const thread = this.options.startThread();
    this.thread = thread;
    this.loaded = false;
    const mine = () => this.thread === thread;
    thread.on('message', (answer: Answer) => mine() && this.hear(thread, answer));
    thread.on('error', (error: Error) => mine() && this.lose(new Error('The engine crashed.', { cause: error })));
    thread.on('exit', (code) => mine() && this.lose(new Error(`The engine ended with code ${code}.`)));
    return thread;
  }

  private hear(thread: Worker, answer: Answer): void {
    const { running } = this;
    if ('ready' in answer) {
      this.loaded = true;
      if (!running) return;
      clearTimeout(running.timer);
      running.timer = this.alarm(this.options.jobLimit);
      thread.postMessage(running.job.question);
      return;
    }
    if (running?.job.question.id !== answer.id) return;
    this.settle();
    if ('answer' in answer) running.job.resolve(answer.answer);
    else running.job.reject(errorOf(answer.fault));
    if (this.waiting.length === 0) thread.unref();
    this.next();
  }

  private alarm(limit: number): NodeJS.Timeout {
    return setTimeout(() => {
      const thread = this.thread;
      this.lose(busy(`The engine needed more than ${limit} ms.`));
      void thread?.terminate();
    }, limit);
  }

  /** The thread is gone: the job it worked on fails, the others go on in a new one. */
  private lose(error: Error): void {
    const { running } = this;
    this.forget();
    this.settle();
    running?.job.reject(error);
    this.next();
  }

  private forget(): void {
    this.thread = undefined;
    this.loaded = false;
  }

  private settle(): void {
    clearTimeout(this.running?.timer);
    this.running = undefined;
  }
}
