'use client';

import { useQuery } from '@tanstack/react-query';
import { Monitor, Smartphone } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { timeOfDay } from '@/lib/calendar/format';
import { devicesOptions, useSignOutDevice, useSignOutElsewhere } from '@/lib/client/devices';
import type { SignedInDevice } from '@/lib/schemas/device';
import { dayIn } from './day-in';
import type { HouseholdSetting } from './household-setting';
import { useRefusalWords } from './use-refusal-words';

/** Where whoever looks is signed in, and the way to sign out there. */
export function Devices({ setting }: { setting: HouseholdSetting }) {
  const t = useTranslations('household.devices');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const { data, isPending, error, refetch } = useQuery(devicesOptions());
  const elsewhere = useSignOutElsewhere();
  return (
    <section aria-labelledby="devices" className="grid gap-2">
      <h2 id="devices" className="font-display text-section">
        {t('title')}
      </h2>
      {data !== undefined ? (
        <ul>
          {data.map((device) => (
            <DeviceRow key={device.id} device={device} setting={setting} />
          ))}
        </ul>
      ) : isPending ? (
        <Skeleton label={t('title')} className="h-16" />
      ) : (
        <ProblemState
          title={t('notLoaded')}
          action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
        >
          {words(error)}
        </ProblemState>
      )}
      <Button
        size="small"
        className="justify-self-start"
        busy={elsewhere.isPending ? t('elsewhereBusy') : undefined}
        onClick={() => elsewhere.mutate()}
      >
        {t('elsewhere')}
      </Button>
      <p role="status" className="text-small empty:hidden">
        {elsewhere.isSuccess ? t('elsewhereDone') : null}
        {elsewhere.error === null ? null : words(elsewhere.error)}
      </p>
    </section>
  );
}

const phones: readonly (string | null)[] = ['android', 'ipad', 'iphone'];

function DeviceRow({ device, setting }: { device: SignedInDevice; setting: HouseholdSetting }) {
  const t = useTranslations('household.devices');
  const words = useRefusalWords();
  const leave = useSignOutDevice();
  const name = useDeviceName()(device.device);
  const { id, current, startedAt, lastSeenAt } = device;
  const Icon = phones.includes(device.device?.system ?? null) ? Smartphone : Monitor;
  return (
    <li className="grid grid-cols-[28px_minmax(0,1fr)_auto] items-start gap-x-2 border-t border-rule py-2">
      <Icon aria-hidden="true" className="mt-0.5 size-5" />
      <p className="min-w-0">
        <b className="block text-body font-emphasis break-words">{name}</b>
        {startedAt === null ? null : (
          <span className="block text-small text-ink-2">{t('since', { when: dayIn(setting, startedAt) })}</span>
        )}
        {lastSeenAt === null ? null : (
          <span className="block text-small text-ink-2">
            {t('seen', {
              when: dayIn(setting, lastSeenAt),
              time: timeOfDay(Date.parse(lastSeenAt), setting.timeZone, setting.locale),
            })}
          </span>
        )}
      </p>
      {current ? (
        <p className="text-small text-ink-2">{t('this')}</p>
      ) : (
        <Button
          variant="quiet"
          className="-mt-2 -mr-1.5"
          aria-label={t('signOutOn', { device: name })}
          busy={leave.isPending ? t('signingOut') : undefined}
          onClick={() => leave.mutate(id)}
        >
          {t('signOut')}
        </Button>
      )}
      {leave.error === null ? null : (
        <p role="alert" className="col-span-3 text-small font-emphasis text-terra-ink">
          {words(leave.error)}
        </p>
      )}
    </li>
  );
}

function useDeviceName() {
  const t = useTranslations('household.devices');
  return (device: SignedInDevice['device']): string => {
    const browser = device?.browser ? t(`browser.${device.browser}`) : undefined;
    const system = device?.system ? t(`system.${device.system}`) : undefined;
    if (browser === undefined || system === undefined) return browser ?? system ?? t('unknown');
    return t('named', { browser, system });
  };
}
