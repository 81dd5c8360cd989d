import { formatQuantity } from '@/lib/units/format';
import { parseQuantity } from '@/lib/units/parse';
import type { UnitSystem } from '@/lib/units/unit';

/** The farthest that water falls in a day or two without everybody seeing it [m]: more is a slip of the pen. */
export const HIGHEST_DROP = 0.3;

export const dropUnit = { metric: 'mm', us: 'in' } as const;

/** How far the water fell [m]; undefined for what is no such thing. */
export function readDrop(text: string, system: UnitSystem): number | undefined {
  const drop = parseQuantity(text, 'rain', dropUnit[system]);
  return drop !== undefined && drop >= 0 && drop <= HIGHEST_DROP ? drop : undefined;
}

/** A drop [m] in the household's unit, as finely as a mark can be read. */
export function writtenDrop(drop: number, system: UnitSystem, locale: string) {
  return formatQuantity(drop, 'rain', system, locale);
}
