import { accident } from './kinds/accident';
import { away } from './kinds/away';
import { clearing } from './kinds/clearing';
import { combinedChlorine } from './kinds/combined-chlorine';
import { quickRaise } from './kinds/quick-raise';
import { closing, opening } from './kinds/season';
import { cover, drainCover, stain, storm } from './kinds/short';
import { hardnessHigh, stabilizerHigh } from './kinds/too-high';
import type { SituationRecord } from './record';
import type { Way } from './way';

export { drainSeenOn, morningsOf, type PromiseAt } from './mornings';
export { procedureOf, type SituationDose } from './procedure';
export { lowestOf, type SituationRecord, type Taken } from './record';
export type { Way } from './way';

/**
 * Where a procedure stands: by its answers, the readings, doses and ticks since it was opened. What time it is makes no
 * difference, so a plan that it leads changes only when something happens.
 */
export function wayOf(record: SituationRecord): Way {
  const { situation } = record;
  switch (situation.kind) {
    case 'accident':
      return accident(situation.answers, record);
    case 'clearing':
      return clearing(situation.answers, record);
    case 'combined-chlorine':
      return combinedChlorine(record);
    case 'drain-cover':
      return drainCover(record);
    case 'quick-raise':
      return quickRaise(record);
    case 'storm':
      return storm(situation.answers, record);
    case 'cover':
      return cover(situation.answers, record);
    case 'stain':
      return stain(record);
    case 'away':
      return away(situation.answers, record);
    case 'stabilizer-high':
      return stabilizerHigh(situation.answers, record);
    case 'hardness-high':
      return hardnessHigh(situation.answers, record);
    case 'opening':
      return opening(situation.answers, record);
    case 'closing':
      return closing(situation.answers, record);
  }
}
