import { waterMarkError } from '@/lib/standards/bucket-test';
import {
  companionCap,
  fastChlorineCap,
  LIQUID_STRENGTH_SHARE,
  swimWaitHours,
  tabletCap,
  TABLETS_NEED_PH,
} from '@/lib/standards/caps';
import { filterPressureRise } from '@/lib/standards/filter';
import { handling } from '@/lib/standards/handling';
import { type Limit, limits } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import { type Constant, type ConstantUnit, group } from './constant';

const limitUnits: Record<Limit['unit'], ConstantUnit> = {
  'mg/L': 'mg/L',
  pH: 'pH',
  hours: 'hours',
  mm: 'mm',
  days: 'days',
  m3: 'm3',
  '1': 'none',
};

const limitNames = Object.keys(limits) as (keyof typeof limits)[];
const fastNames = Object.keys(fastChlorineCap) as (keyof typeof fastChlorineCap)[];
const companionNames = Object.keys(companionCap) as (keyof typeof companionCap)[];
const waitNames = [...fastNames, 'trichlor', ...companionNames] as const;
const surfaceNames = Object.keys(surfaceRanges) as (keyof typeof surfaceRanges)[];
const handlingNames = Object.keys(handling) as (keyof typeof handling)[];

const surface = surfaceNames.flatMap(
  (name): Constant<`surface.${typeof name}.${'hardness' | 'index'}.${'low' | 'high'}`>[] => {
    const { calciumHardness, saturationIndex, source } = surfaceRanges[name];
    const of = `standards/surface-ranges#surfaceRanges.${name}`;
    return [
      {
        name: `surface.${name}.hardness.low`,
        value: calciumHardness[0],
        unit: 'mg/L',
        of: `${of}.calciumHardness.0`,
        source,
      },
      {
        name: `surface.${name}.hardness.high`,
        value: calciumHardness[1],
        unit: 'mg/L',
        of: `${of}.calciumHardness.1`,
        source,
      },
      {
        name: `surface.${name}.index.low`,
        value: saturationIndex[0],
        unit: 'none',
        of: `${of}.saturationIndex.0`,
        source,
      },
      {
        name: `surface.${name}.index.high`,
        value: saturationIndex[1],
        unit: 'none',
        of: `${of}.saturationIndex.1`,
        source,
      },
    ];
  },
);

export const ruleConstants = [
  group(
    'limits',
    ['stabilizer'],
    'ours',
    limitNames.map((name) => ({
      name: `limit.${name}` as const,
      value: limits[name].value,
      unit: limitUnits[limits[name].unit],
      of: `standards/limits#limits.${name}.value`,
      source: limits[name].source,
    })),
  ),
  group(
    'fastCaps',
    ['free-chlorine'],
    'ours',
    fastNames.map((name) => ({
      name,
      value: fastChlorineCap[name].value,
      unit: 'mg/L',
      of: `standards/caps#fastChlorineCap.${name}.value`,
      source: fastChlorineCap[name].source,
    })),
  ),
  group(
    'companionCaps',
    ['ph', 'alkalinity', 'calcium'],
    'ours',
    companionNames.map((name) => ({
      name,
      value: companionCap[name].perCubicMetre,
      unit: 'gPerM3',
      of: `standards/caps#companionCap.${name}.perCubicMetre`,
      source: companionCap[name].source,
    })),
  ),
  group('tabletCaps', ['tablets'], 'practice', [
    {
      name: 'waterPerTablet',
      value: tabletCap.waterPerTablet,
      unit: 'm3',
      of: 'standards/caps#tabletCap.waterPerTablet',
      source: tabletCap.source,
    },
    {
      name: 'tabletMass',
      value: tabletCap.tabletMass,
      unit: 'g',
      of: 'standards/caps#tabletCap.tabletMass',
      source: tabletCap.source,
    },
    {
      name: 'stabilizerRise',
      value: tabletCap.stabilizerRise,
      unit: 'mg/L',
      of: 'standards/caps#tabletCap.stabilizerRise',
      source: tabletCap.source,
    },
    {
      name: 'countedFor',
      value: tabletCap.countedFor,
      unit: 'hours',
      of: 'standards/caps#tabletCap.countedFor',
      source: 'ours',
    },
    { name: 'tabletsNeedPH', value: TABLETS_NEED_PH, unit: 'pH', of: 'standards/caps#TABLETS_NEED_PH' },
    {
      name: 'liquidShare',
      value: LIQUID_STRENGTH_SHARE,
      unit: 'none',
      of: 'standards/caps#LIQUID_STRENGTH_SHARE',
    },
  ]),
  group(
    'swimWaits',
    ['swimmers'],
    'practice',
    waitNames.map((name) => ({
      name,
      value: swimWaitHours[name] ?? 0,
      unit: 'hours',
      of: `standards/caps#swimWaitHours.${name}`,
    })),
  ),
  group('surfaces', ['calcium'], 'ours', surface),
  group('filter', [], 'ours', [
    {
      name: 'filterCleanFrom',
      value: filterPressureRise.from,
      unit: 'bar',
      of: 'standards/filter#filterPressureRise.from',
      source: filterPressureRise.source,
    },
    {
      name: 'filterCleanLatest',
      value: filterPressureRise.latest,
      unit: 'bar',
      of: 'standards/filter#filterPressureRise.latest',
      source: filterPressureRise.source,
    },
  ]),
  group('bucketTest', [], 'ours', [
    {
      name: 'waterMarkError',
      value: waterMarkError.value,
      unit: waterMarkError.unit,
      of: 'standards/bucket-test#waterMarkError.value',
      source: waterMarkError.source,
    },
  ]),
  group(
    'handling',
    [],
    'ours',
    handlingNames.map((name) => ({
      name: `handling.${name}` as const,
      value: handling[name].value,
      unit: handling[name].unit,
      of: `standards/handling#handling.${name}.value`,
      source: handling[name].source,
    })),
  ),
];
