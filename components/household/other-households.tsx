'use client';

import { useMutation, useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { chooseHousehold, householdsOptions } from '@/lib/client/members';
import { leaveFor } from '@/lib/client/session';
import { useRefusalWords } from './use-refusal-words';

/** Whoever belongs to several households goes from one to another here. */
export function OtherHouseholds() {
  const t = useTranslations('household');
  const words = useRefusalWords();
  const { data } = useQuery(householdsOptions());
  const choose = useMutation({ mutationFn: chooseHousehold, onSuccess: () => leaveFor('/week') });
  const others = data?.filter(({ current }) => !current) ?? [];
  if (others.length === 0) return null;
  return (
    <section aria-labelledby="others">
      <h2 id="others" className="font-display text-section">
        {t('others')}
      </h2>
      <ul>
        {others.map(({ id, name, role }) => (
          <li key={id} className="flex items-center justify-between gap-3 border-t border-rule py-1.5">
            <span className="min-w-0 text-body">
              <b className="block break-words">{name}</b>
              <span className="text-small text-ink-2">{t(`role.${role}`)}</span>
            </span>
            <Button
              size="small"
              busy={choose.isPending && choose.variables === id ? t('opening') : undefined}
              onClick={() => choose.mutate(id)}
            >
              {t('open')}
            </Button>
          </li>
        ))}
      </ul>
      {choose.error === null ? null : <p role="alert">{words(choose.error)}</p>}
    </section>
  );
}
