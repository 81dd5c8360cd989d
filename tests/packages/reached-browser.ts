import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { getTableConfig, SQLiteTable } from 'drizzle-orm/sqlite-core';
import { is } from 'drizzle-orm';
import * as schema from '@/db/schema';

/** Something that only the server has. Where it stands in a file that browsers fetch, code or a secret has got out. */
export type Marker = { what: string; text: string };

/** Packages that run on the server alone, by words that stand in their code whatever it is shrunk to. */
const packages = {
  'server-only': ['This module cannot be imported from a Client Component module. '],
  'drizzle-orm': ['drizzle:entityKind', 'drizzle:Name', 'drizzle:Columns'],
  '@libsql/client': ['URL_SCHEME_NOT_SUPPORTED', 'LibsqlError', '@libsql/'],
  '@node-rs/argon2': ['@node-rs/argon2', 'argon2-linux', 'memoryCost'],
  lucia: ['generateIdFromEntropySize', 'createBlankSessionCookie', 'validateSession'],
  nodemailer: ['nodemailer', 'ESMTP', 'STARTTLS'],
  pino: ['pino.serializers', 'pino.redact', 'pino-', 'formatterSym'],
  sharp: ['libvips', '@img/sharp'],
  '@simplewebauthn/server': ['verifyAuthenticationResponse', 'verifyRegistrationResponse'],
  '@zxcvbn-ts/language-common': ['passwords-common', 'qwertyuiop'],
};

const settings = [
  ...['WADEWELL_SECRET', 'DATABASE_URL', 'DATABASE_AUTH_TOKEN', 'SMTP_URL', 'MAIL_FROM', 'APP_ORIGIN'],
  ...['TRUSTED_PROXIES', 'TEST_CLOCK'],
];
const builtIn = ['node:crypto', 'node:fs', 'node:net', 'node:worker_threads', 'node:diagnostics_channel'];
const sql = ['create table', 'insert into', 'delete from', 'pragma journal_mode', 'on conflict do nothing'];

/** Everything that may not be found, with the secrets of this machine and those that the tests use. */
export function markers(root: string, secrets: readonly string[] = []): Marker[] {
  const listed = (what: string, texts: readonly string[]) => texts.map((text) => ({ what, text }));
  return [
    ...Object.entries(packages).flatMap(([name, texts]) => listed(`the package ${name}`, texts)),
    ...listed('a setting of the server', settings),
    ...listed('a part of Node.js', builtIn),
    ...listed('SQL', sql),
    ...listed('a table', tables()),
    ...listed('a sentence of a service', serverSentences(root)),
    ...listed('a secret', [...secrets, ...ownSecrets(root)]),
  ];
}

/** Names of tables that are words of their own: the browser speaks of readings, too. */
function tables(): string[] {
  return Object.values(schema)
    .filter((table) => is(table, SQLiteTable))
    .map((table) => getTableConfig(table).name)
    .filter((name) => name.includes('_'));
}

const serverFolders = ['lib/services', 'lib/auth', 'lib/api', 'db'];

/** What the server answers in words of its own, read from its code: long enough to be nobody else's. */
function serverSentences(root: string): string[] {
  const shared = filesBelow(join(root, 'lib/messages/en'))
    .concat(
      filesBelow(join(root, 'lib/schemas')),
      filesBelow(join(root, 'lib/client')),
      filesBelow(join(root, 'components')),
    )
    .map(({ text }) => text)
    .join('\n');
  const said = serverFolders
    .flatMap((folder) => filesBelow(join(root, folder)))
    .flatMap(({ text }) => [...text.matchAll(/'([A-Z][^'\\\n]{28,}\.)'/g)].map(([, sentence]) => sentence!));
  return [...new Set(said)].filter((sentence) => !shared.includes(sentence));
}

/** The values of this machine, where it has any. */
function ownSecrets(root: string): string[] {
  const file = join(root, '.env.local');
  const kept = existsSync(file) ? readFileSync(file, 'utf8') : '';
  const written = [...kept.matchAll(/^(?:WADEWELL_SECRET|DATABASE_AUTH_TOKEN|SMTP_URL)=["']?([^"'\n]+)/gm)];
  return written.map(([, value]) => value!);
}

export type PlacedText = { name: string; text: string };

/** Every file below a folder that holds text. */
export function filesBelow(folder: string): PlacedText[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.(?:js|mjs|css|map|json|html|txt|tsx?)$/.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name))
    .map((path) => ({ name: path.slice(folder.length + 1), text: readFileSync(path, 'utf8') }));
}

/** Which markers stand in which files. Capitals do not matter, nor how a bundler spells a quote. */
export function reachedBrowser(files: readonly PlacedText[], sought: readonly Marker[]): string[] {
  return files.flatMap(({ name, text }) => {
    const low = text.toLowerCase();
    return sought
      .filter((marker) => low.includes(marker.text.toLowerCase()))
      .map(({ what, text: found }) => `${name} holds ${what === 'a secret' ? what : `${what}: ${found}`}`);
  });
}
