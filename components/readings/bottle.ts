import { z } from 'zod';
import { parseDecimal } from '@/lib/units/parse';
import { type PadQuantity, padQuantities, permitted } from './quantities';

/** One pad of the strip with the steps printed for it on the bottle. */
const padSchema = z.object({ quantity: z.enum(padQuantities), steps: z.array(z.number()).min(2) });

/** The pads of one bottle of strips, from the top of the strip down. Kept on the device: the bottle stands beside it. */
export const bottleSchema = z.array(padSchema).min(1);
export type Bottle = z.infer<typeof bottleSchema>;

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
