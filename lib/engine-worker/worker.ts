import { parentPort } from 'node:worker_threads';
import { planWeek, projectScenario } from '@/lib/planner';
import { type Answer, faultOf, type Question } from './messages';

const tasks = { plan: planWeek, project: projectScenario };

function answer({ id, task, scenario }: Question): Answer {
  try {
    return { id, plan: tasks[task](scenario) };
  } catch (error) {
    return { id, fault: faultOf(error) };
  }
}

parentPort?.on('message', (question: Question) => parentPort?.postMessage(answer(question)));
parentPort?.postMessage({ ready: true } satisfies Answer);
