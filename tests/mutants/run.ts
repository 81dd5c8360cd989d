import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { copyTree } from './copied-tree';
import { occurrences } from './occurrences';
import type { PlantedFault } from './planted-fault';
import { plantedFaults } from './planted-faults';
import { runTests } from './run-tests';

/**
 * `npm run mutants [words]`: plants one fault after the other in copies of the tree and expects the named tests to turn
 * red. Words choose the faults whose file or description has them. Two at a time, each in its own copy.
 */
const root = join(import.meta.dirname, '../..');
const AT_A_TIME = 2;

type Outcome = { planted: PlantedFault; caught: boolean; because: string };

const asked = process.argv.slice(2).map((word) => word.toLowerCase());
const chosen = plantedFaults.filter(({ file, fault }) =>
  asked.every((word) => `${file} ${fault}`.toLowerCase().includes(word)),
);

process.exitCode = await main();

async function main(): Promise<number> {
  const copies = Array.from({ length: AT_A_TIME }, () => copyTree(root));
  const removeAll = () => copies.forEach(({ remove }) => remove());
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.once(signal, () => {
      removeAll();
      process.exit(1);
    });
  try {
    const sound = await runTests(copies[0]!.folder, [...new Set(chosen.flatMap(({ noticedBy }) => noticedBy))]);
    if (sound.ended !== 'green') {
      console.error(`Without any fault the tests are not green (${sound.ended}): nothing can be told.`);
      return 1;
    }
    const waiting = [...chosen];
    const outcomes: Outcome[] = [];
    await Promise.all(
      copies.map(async ({ folder }) => {
        for (let planted = waiting.shift(); planted; planted = waiting.shift()) {
          const outcome = await tryFault(folder, planted);
          outcomes.push(outcome);
          console.log(
            `${outcome.caught ? 'caught  ' : 'SURVIVED'} ${planted.file}: ${planted.fault}${outcome.because}`,
          );
        }
      }),
    );
    const survived = outcomes.filter(({ caught }) => !caught).length;
    console.log(`${outcomes.length - survived} caught, ${survived} survived`);
    return survived > 0 || outcomes.length === 0 ? 1 : 0;
  } finally {
    removeAll();
  }
}

async function tryFault(folder: string, planted: PlantedFault): Promise<Outcome> {
  const file = join(folder, planted.file);
  const sound = readFileSync(file, 'utf8');
  const times = occurrences(sound, planted.find);
  if (times !== 1) return { planted, caught: false, because: ` (its text stands there ${times} times)` };
  writeFileSync(
    file,
    sound.replace(planted.find, () => planted.plant),
  );
  try {
    const { ended } = await runTests(folder, planted.noticedBy);
    const because = { red: '', green: '', hung: ' (the tests never ended)', 'nothing ran': ' (no test ran)' }[ended];
    return { planted, caught: ended === 'red' || ended === 'hung', because };
  } finally {
    writeFileSync(file, sound);
  }
}
