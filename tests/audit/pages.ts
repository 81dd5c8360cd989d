/** A page that is measured, and how much script it may ask for at first over the empty page [kB, gzip]. */
export type Measured = { path: string; as: 'nobody' | 'member'; firstLoad?: number };

export const measured: readonly Measured[] = [
  { path: '/week', as: 'member', firstLoad: 75 },
  { path: '/test', as: 'member', firstLoad: 60 },
  { path: '/week/print', as: 'member' },
  { path: '/situations', as: 'member' },
  { path: '/rounds', as: 'member' },
  { path: '/pool', as: 'member' },
  { path: '/house', as: 'member' },
  { path: '/help', as: 'member' },
  { path: '/help/emergency', as: 'nobody' },
  { path: '/help/how/free-chlorine', as: 'nobody' },
  { path: '/sign-up', as: 'nobody' },
  { path: '/', as: 'nobody', firstLoad: 25 },
];

/** The bars. */
export const bars = {
  /** Points of performance under the empty page at most. */
  performance: 10,
  accessibility: 100,
  bestPractices: 100,
  layoutShift: 0.02,
  /** From an input of Try it until its sentence and its curve are painted, on a quarter of this machine's speed [ms]. */
  sentence: 100,
  curve: 250,
} as const;

export const widths = [320, 390, 768, 1440] as const;
