import { SUBSTANCES } from '@/lib/chemistry';

/** Amount [g; mL of liquid] at its default strength that brings 1 m3 of water this much free chlorine [mg/L]. */
export function amountOf(
  substance: 'trichlor' | 'dichlor' | 'calcium-hypochlorite' | 'sodium-hypochlorite',
  chlorine: number,
): number {
  return (chlorine * 100) / SUBSTANCES[substance].defaultStrength;
}
