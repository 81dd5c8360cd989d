import { useTranslations } from 'next-intl';
import { wallTimeText } from '@/lib/calendar/format';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { PoolProfile, SetupStep } from '@/lib/schemas/pool-profile';
import type { WallInterval } from '@/lib/schemas/time';
import { limits } from '@/lib/standards/limits';
import { formatNumber, formatQuantityIn } from '@/lib/units/format';
import { useProductWords } from './product-words';
import type { ProfileRow } from './profile-rows';
import { usePoolSetting } from './setting';
import { lengthUnit } from './size-draft';
import { useVolumeWords } from './volume-words';

export type ProfilePart = { step: SetupStep; rows: ProfileRow[] };

/** What is known of the water, its equipment and what stands on the shelf, as it is read. */
export function useEquipmentRows({
  profile: { water },
  shelf,
}: {
  profile: Pick<PoolProfile, 'water'>;
  shelf: readonly HouseholdProduct[];
}): ProfilePart[] {
  const products = useProductWords();
  return [
    { step: 'water', rows: useWaterRows(water) },
    {
      step: 'shelf',
      rows: shelf.map((product) => ({
        name: products.left(product),
        value: [products.name(product), products.detail(product)].join(', '),
      })),
    },
  ];
}

/** Everything else that is known of the pool, part by part. */
export function usePoolRows({ profile }: { profile: PoolProfile }): ProfilePart[] {
  const t = useTranslations('pool');
  const { locale } = usePoolSetting();
  const { scope, lining, sun, label, swimLimitSetBy } = profile;
  const size = useSizeRows(profile);
  const row = (name: Parameters<typeof t>[0], value: string | undefined): ProfileRow[] =>
    value === undefined ? [] : [{ name: t(name), value }];
  const yes = (fact: boolean | undefined, name: 'ultravioletOrOzone' | 'wellWater' | 'copperHeater') =>
    fact ? row('profile.row.also', t(`scope.fact.${name}.label`)) : [];
  const limit = label?.swimLimit === 'not-said' ? limits.swimLimitDefault.value : label?.swimLimit;

  return [
    {
      step: 'scope',
      rows: [
        ...row('profile.row.system', scope ? t(`scope.system.${scope.system}.label`) : undefined),
        ...row('profile.row.kind', scope ? t(`scope.kind.${scope.kind}`) : undefined),
        ...yes(scope?.ultravioletOrOzone, 'ultravioletOrOzone'),
        ...yes(scope?.wellWater, 'wellWater'),
        ...yes(scope?.copperHeater, 'copperHeater'),
      ],
    },
    { step: 'size', rows: size },
    {
      step: 'lining',
      rows: row('profile.row.lining', lining ? t(`lining.surface.${lining.surface}.label`) : undefined),
    },
    {
      step: 'sun',
      rows: sun
        ? [
            ...row('profile.row.place', sun.placeName),
            ...row('profile.row.timeZone', sun.timeZone),
            ...row(
              'profile.row.sun',
              t('profile.sunShare', { percent: formatNumber(sun.sunExposure * 100, { decimals: 0, locale }) }),
            ),
            ...row('profile.row.cover', t(`sun.cover.${sun.cover}`)),
          ]
        : [],
    },
    {
      step: 'label',
      rows: label
        ? [
            ...row(
              'profile.row.swimLimit',
              limit === undefined
                ? undefined
                : t(label.swimLimit === 'not-said' ? 'profile.limitUsual' : 'profile.limitSet', {
                    limit: formatNumber(limit, { decimals: 0, locale }),
                    name: swimLimitSetBy ?? t('profile.someone'),
                  }),
            ),
            ...row('profile.row.swimHours', hoursWords(t, [label.swimHours], locale)),
          ]
        : [],
    },
  ];
}

type Words = ReturnType<typeof useTranslations<'pool'>>;

function hoursWords(t: Words, hours: readonly WallInterval[], locale: string): string {
  return hours
    .map(({ from, to }) => t('profile.hours', { from: wallTimeText(from, locale), to: wallTimeText(to, locale) }))
    .join(', ');
}

function useSizeRows({ size, volume, meanDepth, volumeEstimated }: PoolProfile): ProfileRow[] {
  const t = useTranslations('pool');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  const volumes = useVolumeWords();
  if (size === null || volume === null) return [];
  const unit = lengthUnit(system);
  const metres = (value: number) => units(unit, { value: formatQuantityIn(value, 'length', unit, locale).value });
  return [
    { name: t('profile.row.volume'), value: volumes.inSystem(volume, system) },
    { name: t('profile.row.from'), value: t(volumeEstimated ? 'profile.estimated' : 'profile.known') },
    ...(size.how === 'measured'
      ? [{ name: t('profile.row.shape'), value: t(`size.shape.${size.outline.shape}`) }]
      : []),
    ...(meanDepth === null ? [] : [{ name: t('profile.row.meanDepth'), value: metres(meanDepth) }]),
  ];
}

function useWaterRows(water: PoolProfile['water']): ProfileRow[] {
  const t = useTranslations('pool');
  const names = useTranslations('pool.ingredient');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  if (water === null) return [];
  const { pump, feeder, fillWater, testMethods } = water;
  const concentration = (value: number) =>
    units(system === 'metric' ? 'mg/L' : 'ppm', { value: formatNumber(value, { decimals: 0, locale }) });
  const known = (value: number | undefined) => (value === undefined ? t('profile.unknown') : concentration(value));
  return [
    { name: t('profile.row.pump'), value: pump.length === 0 ? t('water.pump.never') : hoursWords(t, pump, locale) },
    {
      name: t('profile.row.feeder'),
      value:
        feeder.kind === 'none' || feeder.ingredient === undefined
          ? t('water.feeder.none')
          : t('profile.feeder', {
              kind: t(`water.feeder.${feeder.kind}`),
              count: feeder.capacity,
              ingredient: names(`${feeder.ingredient}.name`),
            }),
    },
    { name: t('water.fill.calciumHardness'), value: known(fillWater.calciumHardness) },
    { name: t('water.fill.totalAlkalinity'), value: known(fillWater.totalAlkalinity) },
    {
      name: t('profile.row.tests'),
      value: testMethods.map((method) => t(`water.methods.${method}`)).join(', '),
    },
  ];
}
