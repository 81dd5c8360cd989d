import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';

const HOUR = 3_600_000;
/** Free chlorine of 1 g or mL of pure product at 100 % [g]. */
const caps: Record<string, number> = { 'calcium-hypochlorite': 4, 'sodium-hypochlorite': 4, dichlor: 2 };

/**
 * What is wrong with a plan, written from care.md 4 and engine.md 3 without a line of the planner: another clock (the
 * machine's own zone database by Intl), other arithmetic.
 */
export function wrongWith(scenario: Scenario, plan: WeekPlan): string[] {
  const { pool, shelf, reading, now, preferences } = scenario;
  const wrong: string[] = [];
  const say = (what: string, sound: boolean) => {
    if (!sound) wrong.push(what);
  };
  const newest = Math.max(...[reading].flat().map(({ takenAt }) => Date.parse(takenAt)));
  const from = now === undefined ? newest : Math.max(newest, Date.parse(now));
  const productOf = ({ product }: PlannedDose) => shelf.find(({ id }) => id === product);

  for (const dose of plan.doses) {
    const at = Date.parse(dose.at);
    const minute = minuteOfDay(at, pool.timeZone);
    const swimFrom = minutes(pool.swimHours.from);
    const swimTo = minutes(pool.swimHours.to);
    const swimming = swimFrom < swimTo ? minute >= swimFrom && minute < swimTo : minute >= swimFrom || minute < swimTo;
    say(`${dose.substance} while people swim`, !swimming);
    say(`${dose.substance} in the past`, at >= from);
    say(`${dose.substance} after the week`, at < newest + 168 * HOUR);
    say('a measure of nothing', dose.amount > 0);
    say(
      'an avoided product',
      !preferences.avoid.some((each) => [dose.product, dose.form, dose.substance].includes(each)),
    );
    const product = productOf(dose);
    say('a product from nowhere', product !== undefined || dose.toBuy);
    if (product?.form === 'granular')
      say(
        'granules against label or surface',
        product.labelWay === 'dissolve' ||
          (product.labelWay === 'broadcast' && ['plaster', 'tile'].includes(pool.surface)),
      );
    if (product && dose.unit !== 'tablet') {
      const measure = product.measure ?? (dose.unit === 'mL' ? 100 : 50);
      const count = dose.amount / measure;
      say('part of a measure', Math.abs(count - Math.round(count)) < 1e-6);
    }
    const cap = caps[dose.substance];
    if (cap !== undefined) {
      say('over the cap of an evening', dose.rise <= cap + 1e-6);
      const strength = product?.strength ?? (dose.substance === 'calcium-hypochlorite' ? 65 : 12.5);
      // A label can only promise more than is there.
      say('a rise that its amount cannot make', dose.rise <= (dose.amount * strength) / 100 / pool.volume + 1e-6);
    }
  }

  const tablets = plan.doses.filter(({ unit }) => unit === 'tablet');
  const mass = tablets.reduce((sum, dose) => sum + dose.amount * (productOf(dose)?.tabletMass ?? 227), 0);
  const count = tablets.reduce((sum, { amount }) => sum + amount, 0);
  if (tablets.length > 0) {
    say('tablets without their feeder', pool.feeder.kind !== 'none' && pool.feeder.ingredient === 'trichlor');
    say(
      'a part of a tablet',
      tablets.every(({ amount }) => Number.isInteger(amount)),
    );
    say('more than the feeder holds', count <= pool.feeder.capacity);
    say('more than one tablet of 230 g for 18 m3', mass <= (pool.volume / 18) * 230 + 1e-6);
    say('loaded more than twice', tablets.length <= 2);
    say(
      'tablets in acid water',
      [reading].flat().some(({ pH }) => pH !== undefined && middle(pH) >= 7.2),
    );
  }

  const sorted = plan.doses.map(({ at }) => Date.parse(at)).sort((a, b) => a - b);
  say(
    'two in one visit',
    sorted.every((at, index) => index === 0 || at - sorted[index - 1]! >= 4 * HOUR),
  );
  const touched = [...plan.doses.map(({ at }) => at), ...scenario.given.map(({ at }) => at)]
    .map((at) => Date.parse(at))
    .filter((at) => at >= newest);
  say('more evenings than wanted', new Set(plan.doses.map(({ at }) => at.slice(0, 10))).size <= preferences.visits);
  for (const { at } of scenario.given)
    say(
      'next to what was given',
      plan.doses.every((dose) => Math.abs(Date.parse(dose.at) - Date.parse(at)) >= 4 * HOUR),
    );
  say('more visits than are left', plan.doses.length === 0 || touched.length > 0);

  for (const product of shelf) {
    const owned = plan.doses.filter(({ product: id, toBuy }) => id === product.id && !toBuy);
    const used = owned.reduce(
      (sum, { amount, unit }) => sum + amount * (unit === 'tablet' ? (product.tabletMass ?? 227) : 1),
      0,
    );
    say('more than the shelf holds', used <= product.stock + 1e-6);
  }

  const { projection, hours, cost, openSwimShare } = plan;
  if (projection) {
    say('169 hours', hours.length === 169);
    hours.forEach((hour, index) => say('hours an hour apart', Date.parse(hour) === newest + index * HOUR));
    const first = sorted[0] ?? Infinity;
    projection.freeChlorine.p90.forEach((level, hour) =>
      say('over 10 mg/L', Date.parse(hours[hour]!) < first || level <= 10),
    );
    for (const band of [projection.freeChlorine, projection.pH, projection.cyanuricAcid])
      band.p50.forEach((level, hour) =>
        say('a range out of order', band.p10[hour]! <= level && level <= band.p90[hour]! && Number.isFinite(level)),
      );
    const series = [
      ...Object.values(projection.freeChlorine),
      ...Object.values(projection.pH),
      ...Object.values(projection.cyanuricAcid),
      ...Object.values(projection.median),
    ];
    say(
      'series of 169',
      series.every((values) => values.length === 169 && values.every(Number.isFinite)),
    );
  }
  if (cost) {
    const { total, ...parts } = cost;
    const sum = Object.values(parts).reduce((all, part) => all + part, 0);
    say('a cost that does not add up', Math.abs(sum - total) < 1e-9 * Math.max(1, total));
    say(
      'a negative cost',
      Object.values(parts).every((part) => part >= 0),
    );
  }
  if (openSwimShare !== null) say('an open share beyond 0 to 1', openSwimShare >= 0 && openSwimShare <= 1);
  return [...new Set(wrong)];
}

function middle(value: number | { low: number; high: number }): number {
  return typeof value === 'number' ? value : (value.low + value.high) / 2;
}

function minutes(wall: string): number {
  return Number(wall.slice(0, 2)) * 60 + Number(wall.slice(3));
}

function minuteOfDay(instant: number, timeZone: string): number {
  const clock = new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
  return minutes(clock.format(instant));
}
