import type { Source } from './limits';

type Range = readonly [low: number, high: number];
export type SurfaceRange = { calciumHardness: Range; saturationIndex: Range; source: Source };

const source: Source = {
  kind: 'practice',
  text: "hardness 150 to 1000 allowed, 200 to 400 ideal (Montana ARM 37.115.1308); the split by surface is practice. The surface maker's paper comes first.",
};

const hardSurface: SurfaceRange = { calciumHardness: [200, 400], saturationIndex: [-0.2, 0.3], source };

/** Where hardness [mg/L as CaCO3] and the handbook's saturation index are kept on each surface. */
export const surfaceRanges = {
  plaster: hardSurface,
  tile: hardSurface,
  vinyl: { calciumHardness: [100, 250], saturationIndex: [-0.5, 0.3], source },
  fibreglass: { calciumHardness: [120, 250], saturationIndex: [-0.5, 0.2], source },
  painted: { calciumHardness: [150, 300], saturationIndex: [-0.3, 0.3], source },
} as const satisfies Record<string, SurfaceRange>;

/** Surfaces on which granules are planned only when the label lets them be dissolved first. */
export const dissolveFirstSurfaces: readonly string[] = ['vinyl', 'fibreglass', 'painted'];
