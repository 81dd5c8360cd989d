import { BELIEVED_AT, MOST_OF_LOSS_SPARED } from '@/lib/learning/assimilate';
import { CHLORINE_REMEMBERS_DAYS, FORGETTING_DAYS, unrecordedPerDay } from '@/lib/learning/drift';
import {
  assumed,
  ASSUMED_COMBINED_CHLORINE,
  ASSUMED_DISSOLVED_SOLIDS,
  ASSUMED_TEMPERATURE,
} from '@/lib/learning/fresh-start';
import { DOUBT, NO_BELIEF, QUESTIONED_BELOW, STRONG_DOUBT } from '@/lib/learning/hampel';
import { leastError } from '@/lib/learning/measurement';
import { VOLUME_REACH } from '@/lib/learning/posterior-of';
import { LONGEST_GAP, TABLETS_LAST } from '@/lib/learning/step';
import { EYE } from '@/lib/learning/tablets-left';
import { type UncertainQuantity, uncertainQuantities } from '@/lib/projection/reading-error';
import { type Constant, type ConstantUnit, group } from './constant';

const unitOf = (quantity: UncertainQuantity): ConstantUnit => (quantity === 'pH' ? 'pH' : 'mg/L');

const eachQuantity = <Kind extends 'unrecorded' | 'leastError' | 'assumedValue' | 'assumedSigma'>(
  kind: Kind,
  valueOf: (quantity: UncertainQuantity) => number,
  of: (quantity: UncertainQuantity) => string,
) =>
  uncertainQuantities.map((quantity): Constant<`${Kind}.${UncertainQuantity}`> => ({
    name: `${kind}.${quantity}`,
    value: valueOf(quantity),
    unit: unitOf(quantity),
    of: of(quantity),
  }));

/** What learning one pool from its tests rests on. */
export const learningConstants = [
  group('wildValues', ['learning'], 'hampel1974', [
    { name: 'doubt', value: DOUBT, unit: 'sigma', of: 'learning/hampel#DOUBT' },
    { name: 'strongDoubt', value: STRONG_DOUBT, unit: 'sigma', of: 'learning/hampel#STRONG_DOUBT' },
    { name: 'noBelief', value: NO_BELIEF, unit: 'sigma', of: 'learning/hampel#NO_BELIEF' },
    {
      name: 'questionedBelow',
      value: QUESTIONED_BELOW,
      unit: 'none',
      of: 'learning/hampel#QUESTIONED_BELOW',
      source: 'ours',
    },
    { name: 'believedAt', value: BELIEVED_AT, unit: 'sigma', of: 'learning/assimilate#BELIEVED_AT', source: 'ours' },
  ]),
  group('forgetting', ['learning'], 'ours', [
    { name: 'forgettingDays', value: FORGETTING_DAYS, unit: 'days', of: 'learning/drift#FORGETTING_DAYS' },
    {
      name: 'chlorineRemembers',
      value: CHLORINE_REMEMBERS_DAYS,
      unit: 'days',
      of: 'learning/drift#CHLORINE_REMEMBERS_DAYS',
    },
    ...eachQuantity(
      'unrecorded',
      (quantity) => unrecordedPerDay[quantity],
      (quantity) => `learning/drift#unrecordedPerDay.${quantity}`,
    ),
    { name: 'longestGap', value: LONGEST_GAP, unit: 'days', of: 'learning/step#LONGEST_GAP' },
    { name: 'tabletsLast', value: TABLETS_LAST, unit: 'days', of: 'learning/step#TABLETS_LAST' },
  ]),
  group('learningBounds', ['learning'], 'ours', [
    { name: 'volumeReach', value: VOLUME_REACH, unit: 'none', of: 'learning/posterior-of#VOLUME_REACH' },
    { name: 'lossSpared', value: MOST_OF_LOSS_SPARED, unit: 'none', of: 'learning/assimilate#MOST_OF_LOSS_SPARED' },
    { name: 'eye', value: EYE, unit: 'tablets', of: 'learning/tablets-left#EYE' },
    ...eachQuantity(
      'leastError',
      (quantity) => leastError[quantity],
      (quantity) => `learning/measurement#leastError.${quantity}`,
    ),
  ]),
  group('learningStarts', ['learning'], 'ours', [
    ...eachQuantity(
      'assumedValue',
      (quantity) => assumed[quantity].value,
      (quantity) => `learning/fresh-start#assumed.${quantity}.value`,
    ),
    ...eachQuantity(
      'assumedSigma',
      (quantity) => assumed[quantity].sigma,
      (quantity) => `learning/fresh-start#assumed.${quantity}.sigma`,
    ),
    {
      name: 'assumedCombined',
      value: ASSUMED_COMBINED_CHLORINE,
      unit: 'mg/L',
      of: 'learning/fresh-start#ASSUMED_COMBINED_CHLORINE',
    },
    {
      name: 'assumedTemperature',
      value: ASSUMED_TEMPERATURE,
      unit: 'degC',
      of: 'learning/fresh-start#ASSUMED_TEMPERATURE',
    },
    {
      name: 'assumedSolids',
      value: ASSUMED_DISSOLVED_SOLIDS,
      unit: 'mg/L',
      of: 'learning/fresh-start#ASSUMED_DISSOLVED_SOLIDS',
    },
  ]),
];
