import { getTranslations } from 'next-intl/server';

export default async function LandingPage() {
  const t = await getTranslations('common');
  return <h1 className="font-display-soft text-landing">{t('productName')}</h1>;
}
