import type { substances } from '@/lib/schemas/shelf-product';

export type ShelfSubstance = (typeof substances)[number] | 'other';

/**
 * Why two products must not stand, travel or meet in one bin, gravest first.
 *
 * - toxic-gas: acid with chlorine gives off chlorine, acid with thiosulfate sulphur dioxide
 * - fire-or-explosion: two chlorines, or chlorine with what it burns
 * - contaminated-chlorine: anything else that gets into a chlorine
 * - heat-and-spatter: acid with soda or bicarbonate foams over
 * - acid-fumes: hydrochloric acid eats lids, labels and metal near it; it stands in a spot of its own
 * - unknown-product: what is in it is not known
 */
export type ApartReason =
  'toxic-gas' | 'fire-or-explosion' | 'contaminated-chlorine' | 'heat-and-spatter' | 'acid-fumes' | 'unknown-product';

type Kind = 'chlorine' | 'acid' | 'soda' | 'reducer' | 'organic' | 'salt' | 'unknown';

const kinds: Readonly<Record<ShelfSubstance, Kind>> = {
  trichlor: 'chlorine',
  dichlor: 'chlorine',
  'calcium-hypochlorite': 'chlorine',
  'sodium-hypochlorite': 'chlorine',
  'hydrochloric-acid': 'acid',
  'sodium-bisulfate': 'acid',
  'sodium-bicarbonate': 'soda',
  'sodium-carbonate': 'soda',
  'calcium-chloride': 'salt',
  'cyanuric-acid': 'organic',
  'sodium-thiosulfate': 'reducer',
  other: 'unknown',
};

/**
 * Unordered pairs of kinds. Sources: CDC's page for operators and home owners via the Maryland Department of Health
 * (never mix, above all chlorine with acid); North Yorkshire Fire and Rescue and South Australian Metropolitan Fire
 * Service (different chlorines apart); US EPA 550-F-01-003 (contaminated or wetted chlorine burns); Bland Shire Council
 * (calcium hypochlorite and cyanurates not in one room). Thiosulfate, soda and fumes: general chemistry, [practice].
 */
const rules: readonly (readonly [Kind, Kind, ApartReason])[] = [
  ['chlorine', 'acid', 'toxic-gas'],
  ['acid', 'reducer', 'toxic-gas'],
  ['chlorine', 'chlorine', 'fire-or-explosion'],
  ['chlorine', 'reducer', 'fire-or-explosion'],
  ['chlorine', 'organic', 'fire-or-explosion'],
  ['chlorine', 'soda', 'contaminated-chlorine'],
  ['chlorine', 'salt', 'contaminated-chlorine'],
  ['acid', 'soda', 'heat-and-spatter'],
];

/**
 * Whether two products must stand and travel apart, and why; null when they may share a shelf. Order does not matter.
 * Sharing a shelf is never mixing: no two products share a scoop, a bucket or a tub, and an old tub of the *same*
 * product is never topped up from a new one.
 */
export function mustStayApart(a: ShelfSubstance, b: ShelfSubstance): ApartReason | null {
  if (a === 'other' || b === 'other') return 'unknown-product';
  if (a === b) return null;
  const [first, second] = [kinds[a], kinds[b]];
  const rule = rules.find(([x, y]) => (x === first && y === second) || (x === second && y === first));
  if (rule) return rule[2];
  return a === 'hydrochloric-acid' || b === 'hydrochloric-acid' ? 'acid-fumes' : null;
}
