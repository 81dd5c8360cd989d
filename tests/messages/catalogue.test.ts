import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { createTranslator } from 'next-intl';
import { expect, it } from 'vitest';
import { catalogue } from '@/lib/messages/catalogue';

const folder = join(import.meta.dirname, '../../lib/messages/en');

it('serves every file of words', () => {
  const files = readdirSync(folder).map((file) => file.replace(/\.json$/, ''));
  expect(Object.keys(catalogue).sort()).toEqual(files.sort());
});

type Words = { [name: string]: string | Words };

function keysOf(words: Words, before = ''): string[] {
  return Object.entries(words).flatMap(([name, value]) =>
    typeof value === 'string' ? [before + name] : keysOf(value, `${before}${name}.`),
  );
}

it.each(Object.entries(catalogue))('%s holds only messages that can be read', (_namespace, words: Words) => {
  const unreadable: string[] = [];
  const t = createTranslator({
    locale: 'en',
    messages: words,
    onError: ({ code, message }) => {
      // Without arguments most messages cannot be filled in; a message that cannot be read fails in another way.
      if (String(code) === 'INVALID_MESSAGE') unreadable.push(message);
    },
  });
  for (const key of keysOf(words)) t(key as never);
  expect(unreadable).toEqual([]);
});
