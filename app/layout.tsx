import './fonts/faces.css';
import './globals.css';
import type { Metadata, Viewport } from 'next';
import { getLocale, getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { earlyFontsScript } from '@/components/ui/early-fonts';
import { earlyPressesScript } from '@/components/ui/early-presses';
import { UiProvider } from '@/components/ui/ui-provider';
import { DeviceKeeper } from '@/lib/client/device-keeper';
import { Providers } from '@/lib/client/providers';
import { nonceOf } from '@/lib/api/headers';
import { openPageVisit } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { showDeviceOwner } from '@/lib/services/show-device-owner';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('common');
  return {
    title: { default: t('productName'), template: `%s · ${t('productName')}` },
    description: t('description'),
    manifest: '/manifest.webmanifest',
    icons: {
      icon: [
        { url: '/favicon.ico', sizes: '32x32' },
        { url: '/icon.svg', type: 'image/svg+xml' },
      ],
      apple: '/apple-touch-icon.png',
    },
    // Amounts and dates are not phone numbers.
    formatDetection: { telephone: false },
  };
}

/** Those of every page, asked for beside the style sheet that names them: text that changes its width later would move the page. */
const fonts = [
  new URL('./fonts/fraunces-latin.woff2', import.meta.url),
  new URL('./fonts/atkinson-latin.woff2', import.meta.url),
];

export const viewport: Viewport = { width: 'device-width', initialScale: 1, colorScheme: 'light dark' };

export default async function RootLayout({ children }: { children: React.ReactNode }) {
  // Every page is made per request: a page made at build time would carry no nonce and its scripts would be refused.
  const nonce = nonceOf((await headers()).get('content-security-policy'));
  const language = await getLocale();
  const owner = await showDeviceOwner(await openPageVisit());
  return (
    <html lang={language}>
      <head>
        {/* A browser hides the nonce from whoever reads the page, React among them. */}
        <script
          nonce={nonce}
          suppressHydrationWarning
          dangerouslySetInnerHTML={{ __html: `${earlyFontsScript}${earlyPressesScript}` }}
        />
        {/* An element, and not a call of React's, which would ask for them again on the way to another page. */}
        {fonts.map(({ pathname }) => (
          <link key={pathname} rel="preload" href={pathname} as="font" type="font/woff2" crossOrigin="anonymous" />
        ))}
      </head>
      <body>
        <ClientMessages>
          <Providers>
            <DeviceKeeper owner={owner} />
            <UiProvider>{children}</UiProvider>
          </Providers>
        </ClientMessages>
      </body>
    </html>
  );
}
