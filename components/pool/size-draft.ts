import type { z } from 'zod';
import type { PoolSizeAnswer } from '@/lib/schemas/pool-size';
import { formatForInput } from '@/lib/units/format';
import { parseQuantity, parseVolume } from '@/lib/units/parse';
import { fromInside, toInside, type UnitSystem } from '@/lib/units/unit';
import { likelyUnitMistake, type UnitQuestion, type VolumeUnit } from '@/lib/units/unit-mistake';
import type { sizeDraftSchema } from './kept-size';

/** Lengths as they are typed: metres, or feet with decimals. */
const lengthFields = ['meanDepth', 'length', 'width', 'secondWidth', 'diameter', 'depth', 'shallow', 'deep'] as const;
export type LengthField = (typeof lengthFields)[number];

export type SizeDraft = z.infer<typeof sizeDraftSchema>;

export const lengthUnit = (system: UnitSystem) => (system === 'metric' ? 'm' : 'ft');

export function emptySize(system: UnitSystem): SizeDraft {
  const lengths = Object.fromEntries(lengthFields.map((field) => [field, ''])) as Record<LengthField, string>;
  return {
    how: 'entered',
    volume: '',
    unit: system === 'metric' ? 'm3' : 'us-gal',
    sure: null,
    confirmed: '',
    shape: 'rectangle',
    floor: 'slope',
    system,
    ...lengths,
  };
}

/** The answers of the server as text in the fields. */
export function sizeDraftOf(size: PoolSizeAnswer, system: UnitSystem, locale: string): SizeDraft {
  const text = (metres: number) => formatForInput(metres, 'length', lengthUnit(system), locale);
  const texts = (values: object) =>
    Object.fromEntries(
      Object.entries(values).flatMap(([name, value]) => (typeof value === 'number' ? [[name, text(value)]] : [])),
    );
  if (size.how === 'entered') {
    const volume = formatForInput(toInside(size.volume, size.unit), 'volume', size.unit, locale);
    return {
      ...emptySize(system),
      how: 'entered',
      volume,
      unit: size.unit,
      sure: size.sure,
      confirmed: size.unitConfirmed ? confirmation(volume, size.unit) : '',
      meanDepth: size.meanDepth === undefined ? '' : text(size.meanDepth),
    };
  }
  const { outline, floor } = size;
  const widths = outline.shape === 'freeform' ? { width: outline.widthA, secondWidth: outline.widthB } : {};
  return {
    ...emptySize(system),
    how: 'measured',
    shape: outline.shape,
    floor: floor.floor,
    ...texts(outline),
    ...texts(floor),
    ...texts(widths),
  };
}

/** The same measures in the other system; what is no number stays as it was typed. */
export function inSystem(draft: SizeDraft, system: UnitSystem, locale: string): SizeDraft {
  if (draft.system === system) return draft;
  const lengths = Object.fromEntries(
    lengthFields.map((field) => {
      const metres = parseQuantity(draft[field], 'length', lengthUnit(draft.system));
      return [field, metres === undefined ? draft[field] : rounded(metres, system, locale)];
    }),
  );
  // A volume keeps the unit it was read in; an empty field follows the switch.
  const unit = draft.volume === '' ? emptySize(system).unit : draft.unit;
  return { ...draft, ...lengths, unit, system };
}

/** To a hundredth of a metre or foot: finer than a tape at a pool, so that switching there and back shows the same. */
function rounded(metres: number, system: UnitSystem, locale: string): string {
  const unit = lengthUnit(system);
  const hundredths = Math.round(fromInside(metres, unit) * 100) / 100;
  return formatForInput(toInside(hundredths, unit), 'length', unit, locale);
}

/** What the fields say, as the schema of the answers wants it; what is no number becomes NaN, which it refuses in words. */
export function sizeAnswersOf(draft: SizeDraft): unknown {
  const metres = (field: LengthField) => parseQuantity(draft[field], 'length', lengthUnit(draft.system));
  if (draft.how === 'entered') {
    const meanDepth = metres('meanDepth');
    return {
      how: 'entered',
      volume: parseVolume(draft.volume),
      unit: draft.unit,
      sure: draft.sure ?? undefined,
      unitConfirmed: isConfirmed(draft),
      ...(draft.meanDepth.trim() === '' ? {} : { meanDepth: meanDepth ?? Number.NaN }),
    };
  }
  return { how: 'measured', outline: outlineOf(draft, metres), floor: floorOf(draft, metres) };
}

function outlineOf({ shape }: SizeDraft, metres: (field: LengthField) => number | undefined) {
  if (shape === 'round') return { shape, diameter: metres('diameter') };
  if (shape === 'freeform')
    return { shape, length: metres('length'), widthA: metres('width'), widthB: metres('secondWidth') };
  return { shape, length: metres('length'), width: metres('width') };
}

function floorOf({ floor }: SizeDraft, metres: (field: LengthField) => number | undefined) {
  if (floor === 'flat') return { floor, depth: metres('depth') };
  return { floor, shallow: metres('shallow'), deep: metres('deep') };
}

/** The question to ask back about the unit of a typed volume; undefined when there is none, or it was answered. */
export function unitQuestionOf(draft: SizeDraft): (UnitQuestion & { likelier: object; value: number }) | undefined {
  const value = parseVolume(draft.volume);
  if (draft.how !== 'entered' || value === undefined || value <= 0 || isConfirmed(draft)) return undefined;
  const question = likelyUnitMistake(value, draft.unit);
  return question?.likelier && { ...question, likelier: question.likelier, value };
}

export function confirmation(volume: string, unit: VolumeUnit): string {
  return `${volume.trim()} ${unit}`;
}

function isConfirmed({ volume, unit, confirmed }: SizeDraft): boolean {
  return confirmed === confirmation(volume, unit);
}
