/** A rectangle in pixels, from its upper left corner. */
export type Box = { x: number; y: number; width: number; height: number };
type Anchor = 'start' | 'middle' | 'end';
export type Place = { x: number; y: number; anchor: Anchor };

export type Weight = 'plain' | 'bold' | 'figure' | 'italic';
export type Run = { text: string; size: number; weight: Weight };
/** One line of words; its runs follow each other on one baseline. */
export type WordLine = Run[];

/** Words for a place in a chart: where they may stand, the best place first. `y` is the top of the first line. */
export type Words = {
  id: string;
  lines: WordLine[];
  /** The same in less room, each tried where there is no place for what stands before it. */
  shorter?: WordLine[][];
  places: Place[];
  /** The colour of the ground they stand on, for their halo. */
  ground?: 'water';
  /** The colour of their figures; ink when left out. */
  tone?: 'teal';
  /** Room above their left end that a leader line needs, free of other words. */
  leader?: { width: number; height: number };
  /** Left out when every place is taken; other words then stand where they cover least. */
  mayBeLeftOut?: true;
};
export type PlacedWords = Words & Place;

const LINE_GAP = 2.5;
/** Widest mean of a character as a share of its size, measured on the words of the sheet in the two fonts. */
const characterWidth: Record<Weight, number> = { plain: 0.49, bold: 0.525, figure: 0.55, italic: 0.52 };

/** Air round words, so that what is close is not read as one [px]. */
const AIR = { across: 4, down: 2 };
/** Words under words can be read by nobody; a mark under words can still be seen round them. */
const COVERED_WORDS_WEIGH = 20;

/**
 * Places words so that none covers other words, a mark or the curve. In the order given: what stands first chooses first.
 */
export function placeWords(words: readonly Words[], taken: readonly Box[], bounds: Box): PlacedWords[] {
  const placed: PlacedWords[] = [];
  for (const candidate of words) {
    const others = placed.map(({ lines, ...place }) => boxOf(lines, place));
    const isFree = (lines: WordLine[], place: Place) => {
      const box = boxOf(lines, place);
      if (!holds(bounds, box) || taken.some((other) => overlap(box, other))) return false;
      if (others.some((other) => overlap(grown(box), other))) return false;
      return candidate.leader === undefined || !crossesWords(box, candidate.leader, others);
    };
    const said = [candidate.lines, ...(candidate.shorter ?? [])];
    const lines = said.find((each) => candidate.places.some((place) => isFree(each, place))) ?? candidate.lines;
    const free = candidate.places.find((place) => isFree(lines, place));
    const place = free ?? (candidate.mayBeLeftOut ? undefined : leastCovering(candidate, taken, others, bounds));
    if (place !== undefined) placed.push({ ...candidate, lines, ...place });
  }
  return placed;
}

/** Where indispensable words hide least, when no place is free: always inside the chart. */
function leastCovering(
  { lines, places }: Words,
  taken: readonly Box[],
  others: readonly Box[],
  bounds: Box,
): Place | undefined {
  const inside = places.map((place) => movedInto(bounds, lines, place));
  const costs = inside.map((place) => {
    const box = boxOf(lines, place);
    const over = (boxes: readonly Box[]) => boxes.reduce((sum, other) => sum + shared(box, other), 0);
    return over(taken) + COVERED_WORDS_WEIGH * over(others);
  });
  return inside[costs.indexOf(Math.min(...costs))];
}

function movedInto(bounds: Box, lines: readonly WordLine[], place: Place): Place {
  const box = boxOf(lines, place);
  const within = (from: number, size: number, low: number, room: number) =>
    Math.max(low, Math.min(from, low + room - size)) - from;
  return {
    ...place,
    x: place.x + within(box.x, box.width, bounds.x, bounds.width),
    y: place.y + within(box.y, box.height, bounds.y, bounds.height),
  };
}

/** Room that lines of words take at a place. */
export function boxOf(lines: readonly WordLine[], { x, y, anchor }: Place): Box {
  const width = Math.max(...lines.map(widthOf));
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { x: left, y, width, height: heightOf(lines) };
}

export function widthOf(line: WordLine): number {
  return line.reduce((width, { text, size, weight }) => width + text.length * size * characterWidth[weight], 0);
}

function heightOf(lines: readonly WordLine[]): number {
  return lines.reduce((height, line) => height + sizeOf(line), 0) + LINE_GAP * (lines.length - 1);
}

/** Baseline of each line below the top of the first. */
export function baselinesOf(lines: readonly WordLine[]): number[] {
  return lines.map((line, index) => heightOf(lines.slice(0, index + 1)) - sizeOf(line) * 0.2);
}

function sizeOf(line: WordLine): number {
  return Math.max(...line.map(({ size }) => size));
}

function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}

function grown({ x, y, width, height }: Box): Box {
  const { across, down } = AIR;
  return { x: x - across, y: y - down, width: width + 2 * across, height: height + 2 * down };
}

/** Area that two boxes have in common. */
function shared(a: Box, b: Box): number {
  const across = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const down = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return Math.max(0, across) * Math.max(0, down);
}

function crossesWords({ x, y }: Box, leader: { width: number; height: number }, others: readonly Box[]): boolean {
  const room = { x, y: y - leader.height, ...leader };
  return others.some((other) => overlap(room, other));
}

function holds(outer: Box, inner: Box): boolean {
  return (
    inner.x >= outer.x &&
    inner.y >= outer.y &&
    inner.x + inner.width <= outer.x + outer.width &&
    inner.y + inner.height <= outer.y + outer.height
  );
}
