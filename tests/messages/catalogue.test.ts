import { type MessageFormatElement, parse, TYPE } from '@formatjs/icu-messageformat-parser';
import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { createTranslator } from 'next-intl';
import { describe, expect, it } from 'vitest';
import { catalogues, type Namespace } from '@/lib/messages/catalogue';
import type { Catalogue } from '@/lib/messages/english';
import { type Language, languages } from '@/lib/schemas/languages';
import { keysOf, type Words } from './keys';

const namespaces = Object.keys(catalogues.en) as Namespace[];
const messages = (language: Language, namespace: Namespace) => keysOf(catalogues[language][namespace] as Words);

describe.each(languages)('in %s', (language) => {
  it('every file of words is served', () => {
    const folder = join(import.meta.dirname, '../../lib/messages', language);
    const files = readdirSync(folder).map((file) => file.replace(/\.json$/, ''));
    expect(Object.keys(catalogues[language]).sort()).toEqual(files.sort());
  });

  it.each(namespaces)('%s holds only messages that can be read', (namespace) => {
    const unreadable: string[] = [];
    const t = createTranslator({
      locale: language,
      messages: catalogues[language][namespace] as Catalogue[Namespace] & Words,
      onError: ({ code, message }) => {
        // Without arguments most messages cannot be filled in; a message that cannot be read fails in another way.
        if (String(code) === 'INVALID_MESSAGE') unreadable.push(message);
      },
    });
    for (const key of messages(language, namespace).keys()) t(key as never);
    expect(unreadable).toEqual([]);
  });
});

describe.each(languages.filter((language) => language !== 'en'))('%s beside English', (language) => {
  it.each(namespaces)('%s has the same keys in the same order', (namespace) => {
    expect([...messages(language, namespace).keys()]).toEqual([...messages('en', namespace).keys()]);
  });

  it.each(namespaces)('%s has the same gaps, choices and tags in each message', (namespace) => {
    const other = messages(language, namespace);
    const differences = [...messages('en', namespace)].flatMap(([key, english]) => {
      const [wanted, found] = [gapsOf(english), gapsOf(other.get(key) ?? '')];
      return wanted === found ? [] : [`${key}: ${wanted} in English, ${found} in ${language}`];
    });
    expect(differences).toEqual([]);
  });

  it.each(namespaces)('%s says something wherever English does', (namespace) => {
    const other = messages(language, namespace);
    const silent = [...messages('en', namespace)].filter(([key, english]) => english !== '' && !other.get(key));
    expect(silent).toEqual([]);
  });
});

/** What a message is filled in with: names and kinds of its gaps, the arms of its choices, its tags. Plural arms are the language's own. */
function gapsOf(message: string): string {
  const found = new Set<string>();
  const look = (elements: readonly MessageFormatElement[]) => {
    for (const element of elements) {
      if (element.type === TYPE.literal || element.type === TYPE.pound) continue;
      found.add(`${element.value}:${TYPE[element.type]}`);
      if (element.type === TYPE.tag) look(element.children);
      if (element.type !== TYPE.select && element.type !== TYPE.plural) continue;
      for (const [arm, { value }] of Object.entries(element.options)) {
        if (element.type === TYPE.select || arm.startsWith('=')) found.add(`${element.value}=${arm}`);
        look(value);
      }
    }
  };
  look(parse(message));
  return [...found].sort().join(' ');
}
