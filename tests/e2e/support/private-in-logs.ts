import { createClient } from '@libsql/client';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { runFolder } from './place';
import { serverSecret } from './server-secret';

/** Who and what is known to have been there: none of it may stand in a log. */
export type Private = { names: readonly string[]; words: readonly string[] };

/** What journeys sign in with, and what the server signs with. */
const knownWords = [serverSecret, 'four words in a row', 'larch water evening', 'heron over the mill'];

/** What would give somebody away, or let somebody in, whoever it is of. */
const shapes: Readonly<Record<string, RegExp>> = {
  'an e-mail address': /[\w.+-]+@[\w-]+(?:\.[\w-]+)+/,
  'a session': /(?<![\w])[a-z2-7]{40}(?![\w])/,
  'a cookie': /(?:set-cookie|cookie["']?\s*[:=]|wadewell=)/i,
  'a link that opens something': /\/(?:confirm|reset|invitation)\/[\w-]{43}/,
  'a password, hashed': /\$argon2/,
  'a password field': /"(?:password|current|passwordHash)"\s*:\s*"(?!\[left out\])/,
};

/** Said once to whoever starts a server that keeps its mail: the one line that holds the key. */
const announcing = /^Mail is kept at (http:\/\/[\w.:[\]]+)\/mailbox\?key=([\w-]{24})$/;

/** What stands in a log that may not, one line for each find; the find itself is left out, since this is a log, too. */
export function privateIn(log: string, known: Private): string[] {
  const lines = log.split('\n');
  const keys = lines.flatMap((line) => announcing.exec(line)?.[2] ?? []);
  const words = [...known.words, ...keys];
  return lines.flatMap((line, at) => {
    if (announcing.test(line)) return [];
    const found = [
      ...Object.entries(shapes).flatMap(([what, shape]) => (shape.test(line) ? [what] : [])),
      ...words.filter((word) => line.includes(word)).map(() => 'a secret word'),
      ...known.names.filter((name) => standsIn(line, name)).map(() => 'a name'),
    ];
    return [...new Set(found)].map((what) => `line ${at + 1} holds ${what}`);
  });
}

/** As a word of its own: parts of other words are nobody's name. */
function standsIn(line: string, name: string): boolean {
  for (let at = line.indexOf(name); at >= 0; at = line.indexOf(name, at + 1)) {
    const around = `${line[at - 1] ?? ' '}${line[at + name.length] ?? ' '}`;
    if (!/[\p{L}\p{N}_]/u.test(around)) return true;
  }
  return false;
}

export type LogCheck = { name: string; found: string[] };

/** Looks through every log that was written since a moment, for everybody whom the databases of the run know. */
export async function checkLogs(since: number, folder = runFolder): Promise<LogCheck[]> {
  const recent = (file: string) => statSync(join(folder, file)).mtimeMs >= since;
  const files = existsSync(folder) ? readdirSync(folder).filter(recent) : [];
  const names = new Set<string>();
  for (const file of files.filter((each) => each.endsWith('.db')))
    for (const name of await namesIn(join(folder, file))) names.add(name);
  const known = { names: [...names].filter((name) => name.length > 2), words: knownWords };
  return files
    .filter((file) => file.endsWith('.log'))
    .map((name) => ({ name, found: privateIn(readFileSync(join(folder, name), 'utf8'), known) }));
}

/** What people and households of a database are called, and where they live. */
async function namesIn(file: string): Promise<string[]> {
  const client = createClient({ url: `file:${file}` });
  try {
    const { rows } = await client.execute(
      `select name from people union select name from households
       union select place_name from pools where place_name is not null
       union select email from people where email is not null
       union select email from unproven_accounts`,
    );
    return rows.map(({ name }) => String(name));
  } finally {
    client.close();
  }
}
