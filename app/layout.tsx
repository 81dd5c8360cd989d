import '@fontsource-variable/atkinson-hyperlegible-next/index.css';
import '@fontsource-variable/fraunces/full.css';
import './globals.css';
import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { connection } from 'next/server';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('common');
  return { title: { default: t('productName'), template: `%s · ${t('productName')}` }, description: t('description') };
}

export default async function RootLayout({ children }: { children: React.ReactNode }) {
  // Every page is made per request: a page made at build time would carry no nonce and its scripts would be refused.
  await connection();
  return (
    <html lang="en">
      <body>{children}</body>
    </html>
  );
}
