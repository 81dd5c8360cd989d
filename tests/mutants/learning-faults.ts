import type { PlantedFault } from './planted-fault';

const wild = ['tests/learning/wild-readings.test.ts'];
const companions = ['tests/planner/companions.test.ts'];
const learnt = ['tests/planner/learnt-start.test.ts'];

/** Faults in what a pool teaches and in what goes in beside chlorine. */
export const learningFaults: readonly PlantedFault[] = [
  {
    file: 'lib/learning/assimilate.ts',
    find: 'const MOST_OF_LOSS_SPARED = 0.7;',
    plant: 'const MOST_OF_LOSS_SPARED = 70;',
    noticedBy: wild,
    fault: 'chlorine that nobody recorded teaches a small loss',
  },
  {
    file: 'lib/learning/hampel.ts',
    find: 'const NO_BELIEF = 5;',
    plant: 'const NO_BELIEF = 500;',
    noticedBy: wild,
    fault: 'a wild reading counts almost in full',
  },
  {
    file: 'lib/learning/posterior-of.ts',
    find: 'export const VOLUME_REACH = 0.15;',
    plant: 'export const VOLUME_REACH = 1.5;',
    noticedBy: ['tests/learning/describe-learnt.test.ts'],
    fault: 'learnt volume without its clamp',
  },
  {
    file: 'lib/planner/context.ts',
    find: 'volumeRatio: pool.volume / taught.medians.volume',
    plant: 'volumeRatio: taught.medians.volume / pool.volume',
    noticedBy: learnt,
    fault: 'learnt volume taken the wrong way round',
  },
  {
    file: 'lib/planner/context.ts',
    find: 'parseInstant(posterior.readingAt) !== start.takenAt',
    plant: 'parseInstant(posterior.readingAt) === start.takenAt',
    noticedBy: learnt,
    fault: 'a posterior of another reading starts the week',
  },
  {
    file: 'lib/planner/companions/amount.ts',
    find: '/ strength / (halved ? 2 : 1)',
    plant: '/ strength / (halved ? 1 : 1)',
    noticedBy: companions,
    fault: 'acid at its whole cap the first time',
  },
  {
    file: 'lib/planner/companions/amount.ts',
    find: 'limits.pHRangeLow.value + TO_TENTH_PERCENTILE * pHError',
    plant: 'limits.pHRangeLow.value - TO_TENTH_PERCENTILE * pHError',
    noticedBy: companions,
    fault: 'acid reckoned as if a strip were exact',
  },
  {
    file: 'lib/planner/companions/need.ts',
    find: 'water.calciumHardness <= sodaAshLimits.hardness',
    plant: 'water.calciumHardness >= 0',
    noticedBy: companions,
    fault: 'soda into hard water',
  },
  {
    file: 'lib/planner/companions/companion.ts',
    find: 'if (untested(context) || plan.choice.visits < 2)',
    plant: 'if (plan.choice.visits < 2)',
    noticedBy: companions,
    fault: 'a second companion without a test between',
  },
  {
    file: 'lib/planner/companion-week.ts',
    find: 'const MOST_HOURS_LOST = 0.25;',
    plant: 'const MOST_HOURS_LOST = 2.5;',
    noticedBy: companions,
    fault: 'a companion that takes an evening chlorine needs',
  },
  {
    file: 'lib/planner/mid-week-test.ts',
    find: ' - riskFrom(levelsOf(plan.middle, [plan.middle]))',
    plant: '',
    noticedBy: ['tests/planner/week-plan.test.ts'],
    fault: 'a mid-week test where knowing more helps nothing',
  },
  {
    file: 'lib/planner/cost.ts',
    find: 'riskOf(levelsOf(middle, members)',
    plant: 'riskOf(levelsOf(median.hourly.freeChlorine, members)',
    noticedBy: ['tests/planner/infeasible.test.ts'],
    fault: 'the median priced in place of the middle of the ensemble',
  },
];
