import { longDay, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import type { Quantity } from '@/lib/units/quantity';

// The command speaks the scenario's own units and one kind of English.
const locale = 'en-GB';

/** A plan as plain text, for people at a terminal. */
export function explain(scenario: Scenario, plan: WeekPlan): string {
  const { timeZone } = scenario.pool;
  const when = (iso: string) => {
    const instant = Date.parse(iso);
    return `${longDay(dayOf(instant, timeZone), locale)}, ${timeOfDay(instant, timeZone, locale)}`;
  };
  const parts: [title: string, lines: string[]][] = [
    [
      'Missing',
      plan.needs.map(
        ({ code, quantity, since }) => `${quantity}: ${words(code)}${since ? `, last on ${when(since)}` : ''}`,
      ),
    ],
    [
      'What the week does not keep',
      plan.broken.map(
        (broken) =>
          `${words(broken.limit)}: ${plain(broken.value)} ${broken.unit} against ${plain(broken.bound)}, ${when(broken.at)}`,
      ),
    ],
    ['To do', plan.doses.map((dose) => `${when(dose.at)}: ${doseWords(dose)}`)],
    ['Test', plan.checks.map(({ at, kind, reason }) => `${when(at)}: ${kind} test, ${words(reason)}`)],
    ['Why', plan.reasons.map(factWords)],
    ['Mind', plan.cautions.map(factWords)],
    ['Free chlorine and pH at noon, likely range', middays(plan, timeZone)],
    ['At the end of the week', plan.endOfWeek ? [waterWords(plan.endOfWeek)] : []],
    [
      'Cost',
      plan.cost
        ? [
            Object.entries(plan.cost)
              .map(([part, value]) => `${part} ${plain(value)}`)
              .join(', '),
          ]
        : [],
    ],
  ];
  const head = `Plan from the reading of ${when(plan.takenAt)} (${timeZone}), engine ${plan.engineVersion}.`;
  const nothing = plan.doses.length === 0 ? ['Nothing goes in.'] : [];
  const body = parts
    .filter(([, lines]) => lines.length > 0)
    .map(([title, lines]) => [title, ...lines.map((line) => `  ${line}`)].join('\n'));
  return [head, ...nothing, ...body].join('\n\n');
}

function doseWords({ amount, unit, substance, product, toBuy, rise, effect, reason }: PlannedDose): string {
  const quantity =
    unit === 'tablet'
      ? `${plain(amount)} ${amount === 1 ? 'tablet' : 'tablets'}`
      : written(amount, unit === 'g' ? 'mass' : 'liquidVolume');
  const from = toBuy ? ', to buy' : ` (${product})`;
  const raises = rise > 0 ? `, free chlorine +${written(rise, 'freeChlorine')}` : '';
  const moves = effect
    ? `, ${effect.quantity} ${effect.change < 0 ? '' : '+'}${written(effect.change, effect.quantity)}`
    : '';
  return `${quantity} of ${words(substance)}${from}${raises}${moves}: ${words(reason)}`;
}

function middays({ hours, projection }: WeekPlan, timeZone: string): string[] {
  if (!projection) return [];
  const { freeChlorine, pH } = projection;
  return hours.flatMap((hour, index) => {
    const instant = Date.parse(hour);
    if (!timeOfDay(instant, timeZone, locale).startsWith('12:')) return [];
    const range = (band: { p10: number[]; p90: number[] }, quantity: Quantity) =>
      `${written(band.p10[index]!, quantity)} to ${written(band.p90[index]!, quantity)}`;
    return [
      `${longDay(dayOf(instant, timeZone), locale)}: ${range(freeChlorine, 'freeChlorine')}, pH ${range(pH, 'pH')}`,
    ];
  });
}

function waterWords(water: NonNullable<WeekPlan['endOfWeek']>): string {
  const quantities = ['freeChlorine', 'pH', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const;
  return quantities.map((quantity) => `${words(quantity)} ${written(water[quantity], quantity)}`).join(', ');
}

function factWords({ code, ...figures }: WeekPlan['reasons'][number]): string {
  const told = Object.entries(figures).map(
    ([name, value]) => `${words(name)} ${typeof value === 'number' ? plain(value) : String(value)}`,
  );
  return told.length === 0 ? words(code) : `${words(code)} (${told.join(', ')})`;
}

function written(value: number, quantity: Quantity): string {
  const { value: text, unitCode } = formatQuantity(value, quantity, 'metric', locale);
  return unitCode === 'pH' ? text : `${text} ${unitCode === 'L-poured' ? 'L' : unitCode}`;
}

function plain(value: number): string {
  return formatNumber(value, { decimals: Number.isInteger(value) ? 0 : 2, locale });
}

/** Codes and names are written as people would: `closes-gap` and `freeChlorine` become words. */
function words(code: string): string {
  if (/^pH/.test(code)) return code.replaceAll('-', ' ');
  return code
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .replaceAll('-', ' ')
    .toLowerCase();
}
