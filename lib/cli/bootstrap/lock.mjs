import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { say, workFolder } from './place.mjs';
import { identityOf, stillRuns } from './process-identity.mjs';

/**
 * Does the work while no other process of this folder does the same. A lock whose owner has died counts for nothing.
 *
 * @param name what is being done, one word; also the lock file's name
 */
export async function withLock(name, work) {
  mkdirSync(workFolder, { recursive: true });
  const lock = join(workFolder, `${name}.lock`);
  for (let told = false; !tryToTake(lock); await wait(200)) {
    const owner = ownerOf(lock);
    if (owner !== undefined && !stillRuns(owner)) discard(lock, owner);
    else if (owner !== undefined && !told) {
      say(`Waiting for process ${owner.split(' ')[0]}, which is doing the same work (${name}) in this folder.`);
      told = true;
    }
  }
  const release = () => rmSync(lock, { force: true });
  process.once('exit', release);
  try {
    return await work();
  } finally {
    process.off('exit', release);
    release();
  }
}

/** The lock appears with its owner's name already in it, or not at all. */
function tryToTake(lock) {
  const draft = `${lock}.${process.pid}`;
  writeFileSync(draft, identityOf(process.pid));
  try {
    linkSync(draft, lock);
    return true;
  } catch (problem) {
    if (problem.code === 'EEXIST') return false;
    throw problem;
  } finally {
    rmSync(draft, { force: true });
  }
}

function ownerOf(lock) {
  try {
    return readFileSync(lock, 'utf8');
  } catch {
    return undefined;
  }
}

/** Takes a dead owner's lock away. If somebody took it over in between, it is put back. */
function discard(lock, deadOwner) {
  const aside = `${lock}.${process.pid}.old`;
  try {
    renameSync(lock, aside);
    if (readFileSync(aside, 'utf8') !== deadOwner) linkSync(aside, lock);
  } catch (problem) {
    if (problem.code !== 'ENOENT' && problem.code !== 'EEXIST') throw problem;
  } finally {
    rmSync(aside, { force: true });
  }
}
