'use client';

import { Hand } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useSheet } from './sheet-context';

/** Who says that they are adding it right now. */
export function ClaimedBy({ name }: { name: string }) {
  const t = useTranslations('doses.claimed');
  const { sheet } = useSheet();
  return (
    <p className="flex items-center gap-2 font-strong">
      <Hand aria-hidden="true" className="size-5" />
      {name === sheet.me.name ? t('self') : t('other', { name })}
    </p>
  );
}
