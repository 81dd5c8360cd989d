import { randomBytes } from 'node:crypto';
import { chmodSync, closeSync, fsyncSync, openSync, renameSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { textOf, variablesOf } from './env-files.mjs';
import { withLock } from './lock.mjs';
import { inRoot, say, workFolder } from './place.mjs';

const file = '.env.local';
const secrets = ['WADEWELL_SECRET'];

/** Makes the secrets that nobody has set yet. Values that stand in the file are kept, with everything else in it. */
export async function ensureSecrets() {
  await withLock('secrets', async () => {
    const known = { ...variablesOf(file), ...process.env };
    const missing = secrets.filter((name) => !known[name]);
    if (missing.length > 0) {
      const before = textOf(file);
      const gap = before === '' || before.endsWith('\n') ? '' : '\n';
      const added = missing.map((name) => `${name}=${randomBytes(32).toString('base64url')}\n`);
      writeWhole(`${before}${gap}${added.join('')}`);
      say(`Made ${missing.join(', ')} in ${file}. Keep that file to yourself.`);
    }
    if (textOf(file) !== '') chmodSync(inRoot(file), 0o600);
  });
}

/** A reader, or a power cut, finds the old file or the new one and nothing between. */
function writeWhole(text) {
  const draft = join(workFolder, `${file}.${process.pid}`);
  const handle = openSync(draft, 'w', 0o600);
  try {
    writeSync(handle, text);
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
  renameSync(draft, inRoot(file));
}
