import { cautionHolds } from './cautions';
import { brokenHolds, silentLimits } from './limits';
import { openShareOf, reasonHolds } from './reasons';
import { companionDoses, fastDoses, tabletDoses, type Told } from './told';
import { wrongWithWay } from './ways';

/** Every sentence of a plan that is not so, and whatever has to be said and is not. */
export function untrueOf(told: Told): string[] {
  const { plan } = told;
  const written = (fact: object) => JSON.stringify(fact);
  return [
    ...plan.reasons.filter((fact) => !reasonHolds[fact.code]?.(fact, told)).map(written),
    ...plan.cautions.filter((fact) => !cautionHolds[fact.code]?.(fact, told)).map(written),
    ...plan.broken.filter((limit) => !brokenHolds(limit, told)).map(written),
    ...plan.alternatives.flatMap((way) => wrongWithWay(way, told)),
    ...unsaidOf(told),
  ];
}

/** What a plan holds or lacks and does not say. */
export function unsaidOf(told: Told): string[] {
  const { plan, scenario } = told;
  if (plan.cost === null) return [];
  const reasons = plan.reasons.map(({ code }) => code);
  const cautions = plan.cautions.map(({ code }) => code);
  const unsaid = silentLimits(told).map((limit) => `nothing of ${limit}`);
  const wanted = (code: string, said: readonly string[], holds: boolean) => {
    if (holds && !said.includes(code)) unsaid.push(`not said: ${code}`);
  };
  wanted('tablets-carry', reasons, tabletDoses(told).length > 0);
  wanted('fast-closes-gap', reasons, fastDoses(told).length > 0);
  wanted('few-open-hours', reasons, openShareOf(told) < 0.899);
  wanted('lowest-level-follows-stabilizer', reasons, true);
  wanted('volume-estimated', cautions, scenario.pool.volumeEstimated);
  for (const { reason } of companionDoses(told)) wanted(reason, reasons, true);
  return unsaid;
}
