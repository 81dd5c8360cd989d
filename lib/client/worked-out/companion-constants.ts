import {
  alkalinityAim,
  alkalinityDeadBand,
  companionAim,
  hardnessAct,
  replaceWaterFrom,
  retestHours,
  sodaAshLimits,
  waterExchangeADay,
} from '@/lib/standards/companions';
import { type Constant, entries, group } from './constant';

const file = 'standards/companions';
const surfaces = ['plaster', 'tile', 'vinyl', 'fibreglass', 'painted'] as const;

const hardness = surfaces.flatMap((name): Constant<`surface.${typeof name}.act.${'low' | 'high'}`>[] => {
  const { source } = hardnessAct;
  const [low, high] = hardnessAct[name];
  const of = `${file}#hardnessAct.${name}`;
  return [
    { name: `surface.${name}.act.low`, value: low, unit: 'mg/L', of: `${of}.0`, source },
    { name: `surface.${name}.act.high`, value: high, unit: 'mg/L', of: `${of}.1`, source },
  ];
});

/** What the doses beside chlorine aim at and stop for. */
export const companionConstants = [
  group('alkalinityAims', ['alkalinity'], 'ours', [
    {
      name: 'alkalinityTabletsLow',
      value: alkalinityAim.tablets.value[0],
      unit: 'mg/L',
      of: `${file}#alkalinityAim.tablets.value.0`,
      source: alkalinityAim.source,
    },
    {
      name: 'alkalinityTabletsHigh',
      value: alkalinityAim.tablets.value[1],
      unit: 'mg/L',
      of: `${file}#alkalinityAim.tablets.value.1`,
      source: alkalinityAim.source,
    },
    {
      name: 'alkalinityFastLow',
      value: alkalinityAim.fast.value[0],
      unit: 'mg/L',
      of: `${file}#alkalinityAim.fast.value.0`,
      source: alkalinityAim.source,
    },
    {
      name: 'alkalinityFastHigh',
      value: alkalinityAim.fast.value[1],
      unit: 'mg/L',
      of: `${file}#alkalinityAim.fast.value.1`,
      source: alkalinityAim.source,
    },
    {
      name: 'alkalinityDeadBand',
      value: alkalinityDeadBand.value,
      unit: 'mg/L',
      of: `${file}#alkalinityDeadBand.value`,
      source: alkalinityDeadBand.source,
    },
  ]),
  group('hardnessActs', ['calcium'], 'ours', hardness),
  group('companionAims', ['ph', 'calcium'], 'ours', [
    { name: 'aimPH', value: companionAim.pH, unit: 'pH', of: `${file}#companionAim.pH`, source: companionAim.source },
    {
      name: 'stabilizerAboveLow',
      value: companionAim.stabilizerAboveLow,
      unit: 'mg/L',
      of: `${file}#companionAim.stabilizerAboveLow`,
      source: companionAim.source,
    },
    {
      name: 'largestFallOfPH',
      value: companionAim.largestFallOfPH,
      unit: 'pH',
      of: `${file}#companionAim.largestFallOfPH`,
      source: companionAim.source,
    },
    {
      name: 'sodaHardness',
      value: sodaAshLimits.hardness,
      unit: 'mg/L',
      of: `${file}#sodaAshLimits.hardness`,
      source: sodaAshLimits.source,
    },
    {
      name: 'sodaPH',
      value: sodaAshLimits.pH,
      unit: 'pH',
      of: `${file}#sodaAshLimits.pH`,
      source: sodaAshLimits.source,
    },
  ]),
  group('retests', ['ph', 'alkalinity'], 'practice', entries(`${file}#retestHours`, retestHours, 'hours')),
  group('replaceWater', ['stabilizer'], 'ours', [
    ...replaceWaterFrom.map(({ swimLimit, stabilizer }, index): Constant<`replaceAt.${typeof swimLimit}`> => ({
      name: `replaceAt.${swimLimit}`,
      value: stabilizer,
      unit: 'mg/L',
      of: `${file}#replaceWaterFrom.${index}.stabilizer`,
    })),
    {
      name: 'exchangeADay',
      value: waterExchangeADay.value,
      unit: 'metres',
      of: `${file}#waterExchangeADay.value`,
      source: waterExchangeADay.source,
    },
  ]),
];
