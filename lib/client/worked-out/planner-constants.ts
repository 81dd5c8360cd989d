import { MOST_HOURS_LOST } from '@/lib/planner/companion-week';
import { ENOUGH_ALKALINITY } from '@/lib/planner/cost';
import { FEW_OPEN_HOURS } from '@/lib/planner/explain';
import { MID_WEEK_FROM } from '@/lib/planner/mid-week-test';
import { QUICK_RAISE } from '@/lib/planner/planned-doses';
import { assumed } from '@/lib/planner/starting-water';
import { weights } from '@/lib/planner/weights';
import { measuredQuantities, type MeasuredQuantity } from '@/lib/schemas/measured-range';
import { type Constant, type ConstantUnit, group } from './constant';

const weightNames = Object.keys(weights) as (keyof typeof weights)[];

const unitOf = (quantity: MeasuredQuantity): ConstantUnit =>
  quantity === 'pH' ? 'pH' : quantity === 'temperature' ? 'degC' : 'mg/L';

/** What the plan weighs, and what it takes where nothing was measured. */
export const plannerConstants = [
  group(
    'weights',
    [],
    'ours',
    weightNames.map((name): Constant<`weight.${typeof name}`> => ({
      name: `weight.${name}`,
      value: weights[name],
      unit: name === 'overMaximum' || name === 'weakWater' ? 'none' : 'money',
      of: `planner/weights#weights.${name}`,
    })),
  ),
  group('planRules', [], 'ours', [
    { name: 'fewOpenHours', value: FEW_OPEN_HOURS, unit: 'none', of: 'planner/explain#FEW_OPEN_HOURS' },
    { name: 'mostHoursLost', value: MOST_HOURS_LOST, unit: 'none', of: 'planner/companion-week#MOST_HOURS_LOST' },
    { name: 'midWeekFrom', value: MID_WEEK_FROM, unit: 'hours', of: 'planner/mid-week-test#MID_WEEK_FROM' },
    { name: 'quickRaise', value: QUICK_RAISE, unit: 'mg/L', of: 'planner/planned-doses#QUICK_RAISE' },
    { name: 'enoughAlkalinity', value: ENOUGH_ALKALINITY, unit: 'mg/L', of: 'planner/cost#ENOUGH_ALKALINITY' },
  ]),
  group(
    'planStarts',
    [],
    'ours',
    measuredQuantities.flatMap((quantity): Constant<`planAssumed.${MeasuredQuantity}.${'value' | 'sigma'}`>[] =>
      (['value', 'sigma'] as const).map((part) => ({
        name: `planAssumed.${quantity}.${part}`,
        value: assumed[quantity][part],
        unit: unitOf(quantity),
        of: `planner/starting-water#assumed.${quantity}.${part}`,
      })),
    ),
  ),
];
