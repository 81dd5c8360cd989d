import { act } from '@testing-library/react';
import { NextIntlClientProvider } from 'next-intl';
import { hydrateRoot } from 'react-dom/client';
import { renderToString } from 'react-dom/server';
import { vi } from 'vitest';
import { earlyPressesScript } from '@/components/ui/early-presses';
import { UiProvider } from '@/components/ui/ui-provider';
import { Providers } from '@/lib/client/providers';
import { english } from '@/lib/messages/english';

/** A page as the server drew it, before anybody listens; whatever it asks for is written down and not answered. */
export function fromServer(page: React.ReactElement) {
  const asked: string[] = [];
  vi.stubGlobal('fetch', (address: string) => {
    asked.push(address);
    return new Promise<Response>(() => undefined);
  });
  new Function(earlyPressesScript)();
  const place = document.createElement('div');
  const element = (
    <NextIntlClientProvider locale="en" timeZone="UTC" messages={english}>
      <Providers>
        <UiProvider>{page}</UiProvider>
      </Providers>
    </NextIntlClientProvider>
  );
  place.innerHTML = renderToString(element);
  document.body.replaceChildren(place);
  const differences: unknown[] = [];
  const onRecoverableError = (difference: unknown) => void differences.push(difference);
  return {
    place,
    asked,
    /** What the browser drew otherwise than the server. */
    differences,
    listen: () => act(async () => void hydrateRoot(place, element, { onRecoverableError })),
  };
}
