import type { SituationKind } from '@/lib/schemas/situation';

/** The index, by when a situation has to be seen to. */
export const groups = [
  { name: 'now', kinds: ['accident', 'clearing', 'combined-chlorine', 'drain-cover'] },
  { name: 'tonight', kinds: ['quick-raise', 'storm', 'cover'] },
  { name: 'week', kinds: ['stain', 'away'] },
  { name: 'season', kinds: ['stabilizer-high', 'hardness-high'] },
  { name: 'year', kinds: ['opening', 'closing'] },
] as const satisfies readonly { name: string; kinds: readonly SituationKind[] }[];
