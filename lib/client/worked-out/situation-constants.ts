import { NEAR_ENOUGH, PH_NEAR_ENOUGH } from '@/lib/planner/treatment-week';
import { accidentTime, clearingRules, combinedRules, freshTest, replacedAtMost } from '@/lib/standards/situations';
import { group } from './constant';

const file = 'standards/situations';
const accident = { source: accidentTime.source } as const;
const clearing = { source: clearingRules.source } as const;
const combined = { source: combinedRules.source } as const;

/** What the procedures of the situations go by. */
export const situationConstants = [
  group('accident', ['free-chlorine'], 'ours', [
    {
      name: 'accidentChlorine',
      value: accidentTime.freeChlorine,
      unit: 'mg/L',
      of: `${file}#accidentTime.freeChlorine`,
      ...accident,
    },
    {
      name: 'accidentMinutes',
      value: accidentTime.minutes,
      unit: 'minutes',
      of: `${file}#accidentTime.minutes`,
      ...accident,
    },
    { name: 'accidentPH', value: accidentTime.pHAtMost, unit: 'pH', of: `${file}#accidentTime.pHAtMost`, ...accident },
    {
      name: 'accidentTemperature',
      value: accidentTime.temperatureAtLeast,
      unit: 'degC',
      of: `${file}#accidentTime.temperatureAtLeast`,
      ...accident,
    },
  ]),
  group('treatment', ['free-chlorine', 'combined-chlorine', 'stabilizer'], 'ours', [
    {
      name: 'treatmentChlorine',
      value: clearingRules.freeChlorine,
      unit: 'mg/L',
      of: `${file}#clearingRules.freeChlorine`,
      ...clearing,
    },
    {
      name: 'treatmentStabilizer',
      value: clearingRules.stabilizer,
      unit: 'mg/L',
      of: `${file}#clearingRules.stabilizer`,
      ...clearing,
    },
    { name: 'treatmentPH', value: clearingRules.pH, unit: 'pH', of: `${file}#clearingRules.pH`, ...clearing },
    {
      name: 'treatmentEvenings',
      value: clearingRules.evenings,
      unit: 'none',
      of: `${file}#clearingRules.evenings`,
      ...clearing,
    },
    {
      name: 'treatmentMornings',
      value: clearingRules.mornings,
      unit: 'none',
      of: `${file}#clearingRules.mornings`,
      ...clearing,
    },
    {
      name: 'hoursBetweenTests',
      value: clearingRules.hoursBetweenTests,
      unit: 'hours',
      of: `${file}#clearingRules.hoursBetweenTests`,
      ...clearing,
    },
    {
      name: 'waitHours',
      value: clearingRules.waitHours,
      unit: 'hours',
      of: `${file}#clearingRules.waitHours`,
      ...clearing,
    },
    { name: 'combinedRise', value: combinedRules.rise, unit: 'mg/L', of: `${file}#combinedRules.rise`, ...combined },
    {
      name: 'combinedEvenings',
      value: combinedRules.evenings,
      unit: 'none',
      of: `${file}#combinedRules.evenings`,
      ...combined,
    },
    {
      name: 'freshTest',
      value: freshTest.value,
      unit: 'hours',
      of: `${file}#freshTest.value`,
      source: freshTest.source,
    },
    {
      name: 'replacedAtMost',
      value: replacedAtMost.value,
      unit: 'none',
      of: `${file}#replacedAtMost.value`,
      source: replacedAtMost.source,
    },
    { name: 'nearEnough', value: NEAR_ENOUGH, unit: 'mg/L', of: 'planner/treatment-week#NEAR_ENOUGH' },
    { name: 'pHNearEnough', value: PH_NEAR_ENOUGH, unit: 'pH', of: 'planner/treatment-week#PH_NEAR_ENOUGH' },
  ]),
] as const;
