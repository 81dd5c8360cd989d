import { NextIntlClientProvider } from 'next-intl';
import { catalogue, type Namespace } from './catalogue';

/** The words that every page's controls need in the browser. */
const everywhere: readonly Namespace[] = ['common', 'navigation', 'problems'];

/**
 * Gives the browser the words of the named namespaces, on top of those needed everywhere. A page sends only its own: all
 * of them would travel with every page, and the longest texts are read on the server only.
 */
export function ClientMessages({
  namespaces = [],
  children,
}: {
  namespaces?: readonly Namespace[];
  children: React.ReactNode;
}) {
  const messages = Object.fromEntries([...everywhere, ...namespaces].map((name) => [name, catalogue[name]]));
  return <NextIntlClientProvider messages={messages}>{children}</NextIntlClientProvider>;
}
