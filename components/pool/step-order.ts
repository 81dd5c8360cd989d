import { type SetupState, type SetupStep, setupSteps } from '@/lib/schemas/pool-profile';

/** Figure on the ruler: the scope questions come before it, and the label belongs to the fifth step. */
export const rulerPart: Record<SetupStep, number> = {
  scope: 0,
  size: 1,
  lining: 2,
  sun: 3,
  water: 4,
  shelf: 5,
  label: 5,
};
export const rulerParts = 5;

export function stepBefore(step: SetupStep): SetupStep | undefined {
  return setupSteps[setupSteps.indexOf(step) - 1];
}

export function stepAfter(step: SetupStep): SetupStep | undefined {
  return setupSteps[setupSteps.indexOf(step) + 1];
}

/** Whether a step may be opened: it was answered, or it is the next one. */
export function isOpen(step: SetupStep, { nextStep }: Pick<SetupState, 'nextStep'>): boolean {
  return nextStep === null || setupSteps.indexOf(step) <= setupSteps.indexOf(nextStep);
}

export function isDone(step: SetupStep, { nextStep }: Pick<SetupState, 'nextStep'>): boolean {
  return nextStep === null || setupSteps.indexOf(step) < setupSteps.indexOf(nextStep);
}

/** The step whose answers stop everything: the size of a paddling pool, else the scope questions. */
export function stoppingStep({ decision }: Pick<SetupState, 'decision'>): SetupStep | undefined {
  if (decision.result !== 'stop') return undefined;
  return decision.reasons.every((reason) => reason === 'under-2-cubic-metres') ? 'size' : 'scope';
}

/** The step of an address; undefined for what is none. */
export function stepNamed(name: string): SetupStep | undefined {
  return setupSteps.find((step) => step === name);
}
