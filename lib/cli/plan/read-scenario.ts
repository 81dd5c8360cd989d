import { isTimeZone } from '@/lib/calendar/wall-time';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import { checkInput } from '@/lib/schemas/problems';
import { jsonPath } from './json-path';

/** What is wrong with the input, one line each; the person who wrote it can put it right. */
export class InputProblems extends Error {
  constructor(readonly lines: readonly string[]) {
    super(lines.join('\n'));
    this.name = new.target.name;
  }
}

/** A scenario from its JSON text. Error: InputProblems. */
export function readScenario(text: string): Scenario {
  const checked = checkInput(scenarioSchema, jsonOf(text));
  if (!checked.sound)
    throw new InputProblems(checked.problems.map(({ path, message }) => `${jsonPath(path)}: ${message}`));
  const { timeZone } = checked.value.pool;
  if (!isTimeZone(timeZone))
    throw new InputProblems([`$.pool.timeZone: "${timeZone}" is not a time zone, like America/New_York.`]);
  return checked.value;
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new InputProblems([`$: This is not JSON${placeOf(reason, text)}: ${reason.replace(/\s+/g, ' ')}`]);
  }
}

/** Node.js tells a place in characters; a person looks for a line. */
function placeOf(reason: string, text: string): string {
  const position = /at position (\d+)/.exec(reason)?.[1];
  if (position === undefined) return '';
  const lines = text.slice(0, Number(position)).split('\n');
  return ` (line ${lines.length}, column ${(lines.at(-1)?.length ?? 0) + 1})`;
}
