import type { AnswersOf } from '@/lib/schemas/situation';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { Call, Caution } from '../codes';
import { newest, type SituationRecord } from '../record';
import { type Dissolved, replacingReason, replacingSteps } from '../replacing-steps';
import { allTicked, follow, test, ticksNow, type Way } from '../way';

const cautions: readonly Caution[] = ['shell-can-float', 'pump-before-skimmer', 'outlet'];
const callWhen: readonly Call[] = ['ground-water', 'level-falls'];
/** Linings and shells that can lift or float when the level falls. */
const floats: readonly string[] = ['vinyl', 'fibreglass'];

/** Stabilizer over its band: some water is replaced, never in one go. */
export function stabilizerHigh(answers: AnswersOf<'stabilizer-high'>, record: SituationRecord): Way {
  const [low, high] = record.pool.stabilizerBand;
  return tooHigh('cyanuricAcid', { from: high, target: (low + high) / 2, ...answers }, record);
}

/** Hardness over what the surface is kept at. */
export function hardnessHigh(answers: AnswersOf<'hardness-high'>, record: SituationRecord): Way {
  const [, high] = surfaceRanges[record.pool.surface].calciumHardness;
  return tooHigh('calciumHardness', { from: high, target: high, ...answers }, record);
}

function tooHigh(
  quantity: Dissolved,
  { from, target, ground }: { from: number; target: number; ground: 'no' | 'yes' | 'unsure' },
  record: SituationRecord,
): Way {
  const value = newest(record, quantity);
  const isStabilizer = quantity === 'cyanuricAcid';
  const code = isStabilizer ? 'test-stabilizer' : 'test-hardness';
  const base = {
    lead: follow,
    stayOut: false,
    cautions,
    doneWhen: isStabilizer ? 'stabilizer-low' : 'hardness-low',
    callWhen,
    callNow: false,
    done: false,
  } as const;
  if (!value)
    return {
      ...base,
      branch: 'never-measured',
      headline: 'test-next',
      reasons: [],
      steps: [test(code, record.openedAt, [quantity])],
    };
  if (value.value <= from) {
    const retested = value.takenAt >= record.openedAt;
    return {
      ...base,
      branch: 'not-high',
      headline: retested ? 'done' : 'nothing-to-do',
      reasons: [{ code: 'stabilizer-under', stabilizer: value.value, limit: from }].filter(
        () => isStabilizer,
      ) as Way['reasons'],
      steps: [],
      done: true,
    };
  }
  const { calciumHardness } = record.pool.fillWater;
  if (!isStabilizer && calciumHardness >= target)
    return {
      ...base,
      branch: 'fill-water-hard',
      headline: 'ask-professional',
      reasons: [{ code: 'fill-water-hard', fill: calciumHardness, aim: target }],
      steps: [...ticksNow(record, ['fill-elsewhere']), test(code, record.openedAt, [quantity], record.openedAt + 1)],
      callWhen: ['fill-water', ...callWhen],
      callNow: true,
    };
  const asks = (ground !== 'no' || floats.includes(record.pool.surface)) && !record.ticks.has('ask-before-lowering');
  const reasons = replacingReason(quantity, value.value, target, record);
  if (asks)
    return {
      ...base,
      branch: 'ask-before-lowering',
      headline: 'ask-professional',
      reasons,
      steps: ticksNow(record, ['ask-before-lowering']),
      callNow: true,
    };
  const asked = record.ticks.has('ask-before-lowering') ? ticksNow(record, ['ask-before-lowering']) : [];
  const steps = replacingSteps(quantity, value.value, target, record);
  return {
    ...base,
    branch: 'replace-water',
    headline: allTicked(record, steps) ? 'test-next' : 'replace-water',
    reasons,
    steps: [...asked, ...steps],
  };
}
