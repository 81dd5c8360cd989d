import { parseArgs } from 'node:util';

export const usage = `Usage: npm run -s plan -- [--explain] [--project] scenario.json
       npm run -s plan -- -            reads the scenario from standard input
       npm run -s plan -- --schema     prints the JSON Schema of a scenario

--explain  plain text for people instead of JSON
--project  projects the scenario's doses and plans nothing`;

export type Order = { schema: true } | { schema: false; file: string; explain: boolean; project: boolean };

/** What was asked for; undefined when it makes no sense. */
export function orderOf(args: string[]): Order | undefined {
  try {
    const { values, positionals } = parseArgs({
      args,
      allowPositionals: true,
      options: {
        schema: { type: 'boolean', default: false },
        explain: { type: 'boolean', default: false },
        project: { type: 'boolean', default: false },
      },
    });
    const { schema, explain, project } = values;
    if (schema) return positionals.length === 0 ? { schema } : undefined;
    const [file] = positionals;
    return file !== undefined && positionals.length === 1 ? { schema, file, explain, project } : undefined;
  } catch {
    return undefined;
  }
}
