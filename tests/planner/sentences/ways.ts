import { projectScenario } from '@/lib/planner';
import type { Alternative } from '@/lib/schemas/plan';
import { companionDoses, isAvoided, isSwimHour, type Told } from './told';

const formOf = { tablets: 'tablet', granular: 'granular', liquid: 'liquid' } as const;

/**
 * What is wrong with what the sheet says of a form alone: that it holds the week, or for how many hours not, or that nothing
 * of it goes in. Its doses are projected again and the hours counted.
 */
export function wrongWithWay(way: Alternative, told: Told): string[] {
  const wrong: string[] = [];
  const say = (what: string, sound: boolean) => {
    if (!sound) wrong.push(`${way.kind} alone: ${what}`);
  };
  const { doses, feasible, hoursOutside } = way;
  say(
    'something else goes in',
    doses.every(({ form }) => form === formOf[way.kind]),
  );
  const counted = hoursOutsideOf(way, told);
  say(`${hoursOutside} hours out of range, and there are ${counted}`, hoursOutside === counted);
  say('holds the week, and does not', !feasible || counted === 0);
  say('does not hold the week, and does', feasible || counted > 0 || doses.length === 0);
  say(
    'avoided',
    doses.every(({ product }) => told.scenario.shelf.every((each) => each.id !== product || !isAvoided(told, each))),
  );
  say('as many visits as doses', way.visits === new Set(doses.map(({ at }) => at)).size);
  return wrong;
}

function hoursOutsideOf({ doses }: Alternative, told: Told): number {
  const { scenario } = told;
  // What goes in beside chlorine goes in with every form.
  const projected = projectScenario({ ...scenario, doses: [...doses, ...companionDoses(told)] }).projection;
  if (!projected) return 0;
  const { freeChlorine, cyanuricAcid } = projected.median;
  return projected.freeChlorine.p50.filter((_, hour) => {
    const level = freeChlorine[hour]!;
    const swims = isSwimHour(Date.parse(told.plan.hours[hour]!), told);
    const minimum = projected.freeChlorine.lowestLevel[hour]! > 1 || cyanuricAcid[hour]! >= 10 ? 2 : 1;
    const lowest = Math.max(minimum, cyanuricAcid[hour]! / 20);
    return level < lowest || (swims && level > scenario.pool.swimLimit);
  }).length;
}
