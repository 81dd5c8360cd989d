import { parentPort } from 'node:worker_threads';
import { learnFrom } from '@/lib/learning';
import { holdWeek, planWeek, projectScenario, treatmentWeek, tryOutOpenings } from '@/lib/planner';
import { type Answer, type EngineTask, type EngineTasks, faultOf, type Question } from './messages';

type Work<Task extends EngineTask> = (order: EngineTasks[Task]['order']) => EngineTasks[Task]['answer'];

const work: { [Task in EngineTask]: Work<Task> } = {
  plan: planWeek,
  project: projectScenario,
  openings: tryOutOpenings,
  lead: ({ scenario, lead }) =>
    'hold' in lead ? holdWeek(scenario, lead.hold) : treatmentWeek(scenario, lead.treatment),
  learn: ({ from, history }) => learnFrom(from, history),
};

function answer<Task extends EngineTask>({ id, task, order }: Question<Task>): Answer {
  try {
    return { id, answer: work[task](order) };
  } catch (error) {
    return { id, fault: faultOf(error) };
  }
}

parentPort?.on('message', (question: Question) => parentPort?.postMessage(answer(question)));
parentPort?.postMessage({ ready: true } satisfies Answer);
