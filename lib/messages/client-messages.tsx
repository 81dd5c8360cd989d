import { NextIntlClientProvider } from 'next-intl';
import { getLocale } from 'next-intl/server';
import { catalogues, type Namespace } from './catalogue';

/** The words that every page's controls need in the browser. */
const everywhere: readonly Namespace[] = ['common', 'navigation', 'problems'];

/**
 * Gives the browser the words of the named namespaces, on top of those needed everywhere. A page sends only its own: all
 * of them would travel with every page, and the longest texts are read on the server only.
 *
 * @param parts of namespaces of which only some words are needed: the names of their first level
 */
export async function ClientMessages({
  namespaces = [],
  parts = {},
  children,
}: {
  namespaces?: readonly Namespace[];
  parts?: Partial<Record<Namespace, readonly string[]>>;
  children: React.ReactNode;
}) {
  const catalogue = catalogues[await getLocale()];
  const whole = [...everywhere, ...namespaces].map((name) => [name, catalogue[name]] as const);
  const some = Object.entries(parts).map(([name, keys]) => [name, pick(catalogue[name as Namespace], keys)] as const);
  const messages = Object.fromEntries([...some, ...whole]);
  return <NextIntlClientProvider messages={messages}>{children}</NextIntlClientProvider>;
}

function pick(words: object, keys: readonly string[]): object {
  return Object.fromEntries(Object.entries(words).filter(([key]) => keys.includes(key)));
}
