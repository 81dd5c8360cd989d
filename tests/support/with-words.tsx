import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import { NextIntlClientProvider } from 'next-intl';
import { UiProvider } from '@/components/ui/ui-provider';
import { english } from '@/lib/messages/english';

/** What stands round every page: the words, the query client, the primitives' own provider. */
export function Surroundings({ children }: { children: React.ReactNode }) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false }, mutations: { retry: false } } });
  return (
    <NextIntlClientProvider locale="en" timeZone="UTC" messages={english} onError={fail}>
      <QueryClientProvider client={client}>
        <UiProvider>{children}</UiProvider>
      </QueryClientProvider>
    </NextIntlClientProvider>
  );
}

export function renderWithWords(page: React.ReactElement) {
  return render(page, { wrapper: Surroundings });
}

/** A missing word or argument is a failed test, not a line in the console. */
function fail(error: Error): never {
  throw error;
}
