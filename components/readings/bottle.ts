import { parseDecimal } from '@/lib/units/parse';
import { type PadQuantity, padQuantities, permitted } from './quantities';

/** One pad of the strip with the steps printed for it on the bottle. */
type Pad = { quantity: PadQuantity; steps: number[] };

/** The pads of one bottle of strips, from the top of the strip down. Kept on the device: the bottle stands beside it. */
export type Bottle = Pad[];

/** Checks a bottle that was kept; by hand, since the form does not wait for zod. */
export const keptBottle = {
  safeParse: (value: unknown) =>
    isBottle(value) ? { success: true as const, data: value } : { success: false as const },
};

function isBottle(value: unknown): value is Bottle {
  return Array.isArray(value) && value.length > 0 && value.every(isPad);
}

function isPad(value: unknown): value is Pad {
  if (typeof value !== 'object' || value === null || !('quantity' in value && 'steps' in value)) return false;
  const { quantity, steps } = value;
  const numbers = Array.isArray(steps) && steps.every((step) => typeof step === 'number');
  return padQuantities.some((known) => known === quantity) && numbers && steps.length >= 2;
}

/** An invented bottle to begin with; its steps are changed once to those of the real one. */
export const firstBottle: Bottle = [
  { quantity: 'totalChlorine', steps: [0, 1, 3, 5, 10] },
  { quantity: 'freeChlorine', steps: [0, 1, 3, 5, 10] },
  { quantity: 'pH', steps: [6.2, 6.8, 7.2, 7.8, 8.4] },
  { quantity: 'totalAlkalinity', steps: [0, 40, 80, 120, 180, 240] },
  { quantity: 'cyanuricAcid', steps: [0, 30, 60, 100, 200] },
  { quantity: 'calciumHardness', steps: [0, 100, 250, 500, 1000] },
];

export const mostSteps = 7;

/** Steps as they are typed, "0 1 3 5 10"; commas stay decimal signs, so spaces or semicolons part them. */
export function parseSteps(text: string): number[] | undefined {
  const steps = text
    .split(/[\s;]+/)
    .filter((part) => part !== '')
    .map(parseDecimal);
  return steps.every((step) => step !== undefined) ? steps : undefined;
}

/** What is wrong with the steps of a pad; undefined when they can be used. */
export function stepsProblem(
  quantity: PadQuantity,
  steps: number[] | undefined,
): 'unreadable' | 'count' | 'order' | 'range' | undefined {
  if (steps === undefined) return 'unreadable';
  if (steps.length < 2 || steps.length > mostSteps) return 'count';
  if (steps.some((step, index) => index > 0 && step <= (steps[index - 1] ?? step))) return 'order';
  const [low, high] = permitted(quantity);
  return steps.some((step) => step < low || step > high) ? 'range' : undefined;
}
