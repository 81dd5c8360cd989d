'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { learntOptions } from '@/lib/client/learnt';
import { usePoolSetting } from '../setting';
import { useVolumeWords } from '../volume-words';
import { differentVolume } from './learnt-volume';
import type { SizeKnown } from './use-learnt-words';

/** The pool as it behaves, where that clearly differs from how it was described; else as it was described. */
export function PoolHeadline({ volume, how }: { volume: number | null; how: SizeKnown }) {
  const t = useTranslations('pool');
  const l = useTranslations('learnt');
  const { mayChange, system, name } = usePoolSetting();
  const volumes = useVolumeWords();
  const { data } = useQuery(learntOptions());
  const described = volume === null ? undefined : volumes.inSystem(volume, system);
  const learnt = data && differentVolume(data);
  const behaves = learnt === undefined ? undefined : volumes.inSystem(learnt, system);
  if (data && learnt !== undefined && volume !== null && behaves !== undefined && behaves !== described)
    return (
      <Headline
        title={l('headline.title', { volume: behaves })}
        lead={l('headline.lead', {
          how,
          entered: described ?? '',
          volume: behaves,
          readings: data.readings,
          spreads: learnt > volume ? 'thinner' : 'further',
        })}
      />
    );
  return (
    <Headline
      title={described === undefined ? t('profile.title') : t('profile.headline', { name, volume: described })}
      lead={t(mayChange ? 'profile.lead' : 'profile.leadLooking')}
    />
  );
}

function Headline({ title, lead }: { title: string; lead: string }) {
  return (
    <>
      <h1 className="font-display text-headline">{title}</h1>
      <p className="max-w-[90ch] font-display text-lead text-pretty">{lead}</p>
    </>
  );
}
