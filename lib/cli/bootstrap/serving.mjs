import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { workFolder } from './place.mjs';
import { identityOf, stillRuns } from './process-identity.mjs';

const notes = join(workFolder, 'serving');

/** Notes that this process serves from a build folder, until it ends. */
export function noteServing(folder) {
  mkdirSync(notes, { recursive: true });
  const note = join(notes, `${folder}.${process.pid}`);
  writeFileSync(note, identityOf(process.pid));
  process.once('exit', () => rmSync(note, { force: true }));
}

/** The process that serves from a build folder now, if there is one: a rebuild would pull the pages from under it. */
export function serverOf(folder) {
  return notesAbout(folder)
    .map((name) => readFileSync(join(notes, name), 'utf8'))
    .find(stillRuns)
    ?.split(' ')[0];
}

function notesAbout(folder) {
  try {
    return readdirSync(notes).filter((name) => name.startsWith(`${folder}.`));
  } catch {
    return [];
  }
}
