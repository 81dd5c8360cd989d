'use client';

import { LocateFixed } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { NumberTextField } from '@/components/ui/number-text-field';
import { Segments } from '@/components/ui/segments';
import { TextField } from '@/components/ui/text-field';
import type { FieldProblems } from './field-problems';
import { usePoolSetting } from './setting';
import { placeText, type SunDraft, zoneFit } from './sun-draft';

type Props = { draft: SunDraft; change: (part: Partial<SunDraft>) => void; problems: FieldProblems };

/** Where the pool lies, to a tenth of a degree: by the device's own location, or typed from a map. */
export function PlaceFields({ draft, change, problems }: Props) {
  const t = useTranslations('pool.sun.place');
  const fit = zoneFit(draft);
  return (
    <div className="grid gap-3.5">
      <TextField
        label={t('name')}
        aside={t('optional')}
        name="placeName"
        autoComplete="off"
        maxLength={80}
        value={draft.placeName}
        onChange={(event) => change({ placeName: event.target.value })}
        problem={problems.placeName}
      />
      <LocateButton change={change} />
      <div className="grid grid-cols-[1fr_112px] items-end gap-x-3 gap-y-2.5">
        <Degrees
          name="latitude"
          value={draft.latitude}
          onChange={(latitude, negative) => change(negative ? { latitude, north: false } : { latitude })}
          problem={problems.latitude}
        />
        <Segments
          hideLabel
          label={t('northOrSouth')}
          choices={[
            { value: 'north', label: t('north') },
            { value: 'south', label: t('south') },
          ]}
          value={draft.north ? 'north' : 'south'}
          onChange={(side) => change({ north: side === 'north' })}
        />
        <Degrees
          name="longitude"
          value={draft.longitude}
          onChange={(longitude, negative) => change(negative ? { longitude, east: false } : { longitude })}
          problem={problems.longitude}
        />
        <Segments
          hideLabel
          label={t('eastOrWest')}
          choices={[
            { value: 'east', label: t('east') },
            { value: 'west', label: t('west') },
          ]}
          value={draft.east ? 'east' : 'west'}
          onChange={(side) => change({ east: side === 'east' })}
        />
      </div>
      <p className="-mt-1 text-small text-ink-2">{t('note')}</p>
      <TextField
        label={t('timeZone')}
        name="timeZone"
        autoComplete="off"
        value={draft.timeZone}
        onChange={(event) => change({ timeZone: event.target.value })}
        hint={t('timeZoneNote')}
        problem={problems.timeZone}
      />
      {fit === 'fits' ? null : <ZoneDoubt fit={fit} draft={draft} change={change} />}
    </div>
  );
}

function Degrees({
  name,
  value,
  onChange,
  problem,
}: {
  name: 'latitude' | 'longitude';
  value: string;
  onChange: (text: string, negative: boolean) => void;
  problem: string | undefined;
}) {
  const t = useTranslations('pool.sun.place');
  return (
    <NumberTextField
      label={t(name)}
      name={name}
      unit={t('degrees')}
      value={value}
      problem={problem}
      onChange={(event) => {
        const typed = event.target.value;
        // A map writes the south and the west with a minus: it moves to the choice beside the field.
        const negative = /^\s*[-\u2212]/.test(typed);
        onChange(negative ? typed.replace(/^\s*[-\u2212]/, '') : typed, negative);
      }}
    />
  );
}

function LocateButton({ change }: Pick<Props, 'change'>) {
  const t = useTranslations('pool.sun.place');
  const { locale } = usePoolSetting();
  const [state, setState] = useState<'idle' | 'asking' | 'found' | 'refused'>('idle');
  const ask = () => {
    if (!('geolocation' in navigator)) {
      setState('refused');
      return;
    }
    setState('asking');
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        change(placeText(coords.latitude, coords.longitude, locale));
        setState('found');
      },
      () => setState('refused'),
      { maximumAge: 3_600_000, timeout: 15_000 },
    );
  };
  return (
    <div>
      <Button wide onClick={ask} busy={state === 'asking' ? t('locating') : undefined}>
        <LocateFixed aria-hidden="true" className="size-4.5" />
        {t('locate')}
      </Button>
      <p role="status" className="mt-1.5 text-small text-ink-2 empty:hidden">
        {state === 'found' ? t('located') : state === 'refused' ? t('notLocated') : null}
      </p>
    </div>
  );
}

function ZoneDoubt({ fit, draft, change }: { fit: 'flip' | 'off' } & Omit<Props, 'problems'>) {
  const t = useTranslations('pool.sun.place');
  const common = useTranslations('common');
  return (
    <Callout
      severity="take-care"
      word={common('takeCare')}
      actions={
        fit === 'flip' ? (
          <Button variant="primary" onClick={() => change({ east: !draft.east })}>
            {draft.east ? t('flipWest') : t('flipEast')}
          </Button>
        ) : undefined
      }
    >
      <p>{t('zoneDoubt', { timeZone: draft.timeZone })}</p>
    </Callout>
  );
}
