'use client';

import { useQuery } from '@tanstack/react-query';
import { PhoneCall } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { dialled } from '@/components/ui/phone-link';
import { textLink } from '@/components/ui/text-link';
import { houseNotesOptions } from '@/lib/client/house-notes';

/** One tap to the professional, or to where the number can be written down. */
export function ProfessionalCall() {
  const t = useTranslations('house.visits');
  const { data } = useQuery(houseNotesOptions());
  if (data === undefined) return null;
  const { professionalName: name, professionalPhone: phone } = data.notes;
  if (phone === undefined)
    return (
      <p className="text-small text-ink-2">
        {t.rich('noPhone', {
          link: (words) => (
            <PageLink href="/house" className={`${textLink} inline-flex min-h-11 items-center text-ink`}>
              {words}
            </PageLink>
          ),
        })}
      </p>
    );
  return (
    <a href={dialled(phone)} className={buttonClass({ variant: 'outline', className: 'justify-start' })}>
      <PhoneCall aria-hidden="true" className="size-5 shrink-0" />
      <span className="min-w-0 text-left">
        <span className="block break-words">{name === undefined ? t('callUnnamed') : t('call', { name })}</span>
        <span className="block text-label font-text">{phone}</span>
      </span>
    </a>
  );
}
