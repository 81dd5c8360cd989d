import { Engine } from '@/lib/engine-worker/engine';
import type { EngineTask, EngineTasks } from '@/lib/engine-worker/messages';
import { sourceEngine } from './engine';

/** The real engine, with a way to make its tasks fail and a list of what it was asked. */
export class WatchedEngine extends Engine {
  /** The orders of each task, in their order. */
  asked: { [Task in EngineTask]: EngineTasks[Task]['order'][] } = {
    plan: [],
    project: [],
    openings: [],
    lead: [],
    learn: [],
  };
  faults: Partial<Record<EngineTask, Error>> = {};
  private readonly real = sourceEngine();

  constructor() {
    super({
      startThread: () => {
        throw new Error('The real engine starts its own.');
      },
    });
  }

  override async run<Task extends EngineTask>(task: Task, order: EngineTasks[Task]['order']) {
    this.asked[task].push(order);
    const fault = this.faults[task];
    if (fault) throw fault;
    return this.real.run(task, order);
  }

  override async close() {
    await this.real.close();
  }

  /** Forgets what it was asked, and works. */
  reset() {
    this.asked = { plan: [], project: [], openings: [], lead: [], learn: [] };
    this.faults = {};
  }
}
