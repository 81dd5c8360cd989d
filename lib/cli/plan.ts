/** `npm run -s plan`: a scenario in, a plan out; on standard output stands the answer and nothing else. */
import { readFile } from 'node:fs/promises';
import { text } from 'node:stream/consumers';
import { z } from 'zod';
import { planWeek, projectScenario } from '@/lib/planner';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { orderOf, usage } from './plan/arguments';
import { explain } from './plan/explain';
import { plannerProblemLines } from './plan/planner-problems';
import { InputProblems, readScenario } from './plan/read-scenario';

const invalidInput = 2;
const fault = 1;

async function answer(args: string[]): Promise<string> {
  const order = orderOf(args);
  if (order === undefined) throw new InputProblems(usage.split('\n'));
  if (order.schema) return JSON.stringify(z.toJSONSchema(scenarioSchema, { io: 'input' }), null, 2);
  const scenario = readScenario(await textOf(order.file));
  const plan = order.project ? projectScenario(scenario) : planWeek(scenario);
  return order.explain ? explain(scenario, plan) : JSON.stringify(plan);
}

async function textOf(file: string): Promise<string> {
  try {
    return file === '-' ? await text(process.stdin) : await readFile(file, 'utf8');
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new InputProblems([`$: ${file} cannot be read: ${reason}`]);
  }
}

try {
  process.stdout.write(`${await answer(process.argv.slice(2))}\n`);
} catch (error) {
  const lines = error instanceof InputProblems ? error.lines : plannerProblemLines(error);
  process.stderr.write(`${lines?.join('\n') ?? (error instanceof Error ? error.stack : String(error))}\n`);
  process.exitCode = lines ? invalidInput : fault;
}
