import { z } from 'zod';
import { toInside } from '@/lib/units/unit';
import { likelyUnitMistake, type VolumeUnit } from '@/lib/units/unit-mistake';
import { poolSize } from '@/lib/units/volume';

export const volumeUnits = ['m3', 'L', 'us-gal'] as const satisfies readonly VolumeUnit[];
export const poolShapes = ['rectangle', 'oval', 'round', 'freeform'] as const;
export const poolFloors = ['flat', 'slope', 'drop-off'] as const;

/** Smallest and largest volume that can be written down [m3]; what is planned for is narrower. */
const smallest = 0.2;
const largest = 1000;

const askBack: Record<VolumeUnit, string> = {
  m3: 'That would be an unusual pool. Did you mean cubic metres?',
  L: 'That would be an unusual pool. Did you mean litres?',
  'us-gal': 'That would be an unusual pool. Did you mean US gallons?',
};

const metres = (what: string, least: number, most: number) =>
  z
    .number({ error: `Write the ${what}.` })
    .min(least, `The ${what} is ${least} m at least.`)
    .max(most, `The ${what} is ${most} m at most.`);

const enteredSizeSchema = z
  .strictObject({
    how: z.literal('entered'),
    volume: z.number({ error: 'Write the volume.' }).gt(0, 'Write the volume.').max(1e7, 'No garden pool is that big.'),
    unit: z.enum(volumeUnits, { error: 'Choose the unit of the volume.' }),
    /** From the builder's sheet, the permit or a water meter; otherwise it counts as an estimate. */
    sure: z.boolean({ error: 'Say whether the figure is known or guessed.' }),
    /** The unit was asked back, and it is the one. */
    unitConfirmed: z.boolean().default(false),
    /** Mean depth of the water [m], where known. */
    meanDepth: metres('depth', 0.2, 6).optional(),
  })
  .superRefine(({ volume, unit, unitConfirmed }, context) => {
    if (!(volume > 0)) return;
    const likelier = likelyUnitMistake(volume, unit)?.likelier;
    if (likelier && !unitConfirmed)
      context.addIssue({ code: 'custom', path: ['unit'], message: askBack[likelier.unit] });
    else if (!isPossible(toInside(volume, unit)))
      context.addIssue({ code: 'custom', path: ['volume'], message: impossible });
  });

const length = metres('length', 1, 60);
const width = metres('width', 1, 40);
const depth = metres('depth of the water', 0.2, 6);

const outlineSchema = z.discriminatedUnion(
  'shape',
  [
    z.strictObject({ shape: z.literal('rectangle'), length, width }),
    z.strictObject({ shape: z.literal('oval'), length, width }),
    z.strictObject({ shape: z.literal('round'), diameter: metres('diameter', 1, 40) }),
    z.strictObject({ shape: z.literal('freeform'), length, widthA: width, widthB: width }),
  ],
  { error: 'Choose the shape.' },
);

const deepest = { path: ['deep'], message: 'The deep end is at least as deep as the shallow end.' };
const floorSchema = z.discriminatedUnion(
  'floor',
  [
    z.strictObject({ floor: z.literal('flat'), depth }),
    z
      .strictObject({ floor: z.literal('slope'), shallow: depth, deep: depth })
      .refine(({ shallow, deep }) => shallow <= deep, deepest),
    z
      .strictObject({ floor: z.literal('drop-off'), shallow: depth, deep: depth })
      .refine(({ shallow, deep }) => shallow <= deep, deepest),
  ],
  { error: 'Choose how the floor runs.' },
);

/** Measures of the water, not of the basin [m]. */
const measuredSizeSchema = z
  .strictObject({ how: z.literal('measured'), outline: outlineSchema, floor: floorSchema })
  // A floor that is refused for itself has no volume to check.
  .refine(
    ({ outline, floor }) => !floorSchema.safeParse(floor).success || isPossible(poolSize(outline, floor).volume),
    {
      path: ['outline'],
      message: 'No garden pool is that big. Check the measures.',
    },
  );

export const poolSizeSchema = z.discriminatedUnion('how', [enteredSizeSchema, measuredSizeSchema], {
  error: 'Say whether you know the volume or measure the pool.',
});
export type PoolSizeAnswer = z.output<typeof poolSizeSchema>;

/** Volume [m3] and mean depth [m] of the water; the depth is undefined when nobody said. */
export function waterOf(size: PoolSizeAnswer): { volume: number; meanDepth: number | undefined } {
  return size.how === 'entered'
    ? { volume: toInside(size.volume, size.unit), meanDepth: size.meanDepth }
    : poolSize(size.outline, size.floor);
}

/** Whether the first dose has to be halved because the volume is a guess or a drawing. */
export function isVolumeEstimated(size: PoolSizeAnswer): boolean {
  return size.how === 'measured' || !size.sure;
}

const impossible = `A garden pool holds ${smallest} to ${largest} cubic metres. Check the figure and its unit.`;

function isPossible(volume: number): boolean {
  return volume >= smallest && volume <= largest;
}
