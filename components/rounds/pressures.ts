import { GAUGE } from '@/lib/schemas/round-items';
import { formatQuantity } from '@/lib/units/format';
import { parseQuantity } from '@/lib/units/parse';
import { fromInside, toInside, type UnitSystem } from '@/lib/units/unit';

/** What was typed; empty where nothing was. */
export type PressureText = { now: string; clean: string };

export const pressureUnit = { metric: 'bar', us: 'psi' } as const;

/** A pressure [bar] in the household's unit. */
export function writePressure(bar: number, system: UnitSystem, locale: string): string {
  const { value, unitCode } = formatQuantity(toInside(bar, 'bar'), 'pressure', system, locale);
  return `${value} ${unitCode}`;
}

/** The pressures that were typed [bar]; null where one of them is no gauge's. An empty field was not read. */
export function readPressures(
  { now, clean }: PressureText,
  system: UnitSystem,
): { pressure?: number; cleanPressure?: number } | null {
  const [pressure, cleanPressure] = [now, clean].map((text) => readPressure(text, system));
  if (pressure === null || cleanPressure === null) return null;
  return { ...(pressure === undefined ? {} : { pressure }), ...(cleanPressure === undefined ? {} : { cleanPressure }) };
}

function readPressure(text: string, system: UnitSystem): number | null | undefined {
  if (text.trim() === '') return undefined;
  const value = parseQuantity(text, 'pressure', pressureUnit[system]);
  if (value === undefined) return null;
  const bar = fromInside(value, 'bar');
  return bar >= GAUGE[0] && bar <= GAUGE[1] ? bar : null;
}
