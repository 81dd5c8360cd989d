import { bandOfCourses, seriesOf } from '@/lib/projection';
import type { Course } from '@/lib/projection/integrate';
import type { PlanProjection } from '@/lib/schemas/plan';
import { lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';

/** The projection as a plan promises it: bands, limits and the median run, hour by hour. */
export function projectionOf(
  courses: readonly Course[],
  median: Course,
  { scenario }: PlanContext,
  stabilized: boolean,
): PlanProjection {
  const { freeChlorine, pH, cyanuricAcid } = bandOfCourses(courses);
  const run = seriesOf(median);
  return {
    freeChlorine: {
      ...freeChlorine,
      lowestLevel: cyanuricAcid.p50.map((stabilizer) => lowestLevel(stabilizer, stabilized)),
      swimLimit: cyanuricAcid.p50.map(() => scenario.pool.swimLimit),
    },
    pH,
    cyanuricAcid,
    median: {
      freeChlorine: Array.from(run.freeChlorine),
      pH: Array.from(run.pH),
      cyanuricAcid: Array.from(run.cyanuricAcid),
      calciumHardness: Array.from(run.calciumHardness),
      totalAlkalinity: Array.from(run.totalAlkalinity),
    },
  };
}
