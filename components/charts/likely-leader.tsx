import type { PlacedWords } from './place-words';
import { type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import { waterAt, type WaterPoint } from './water-curve';

const HOUR = 3_600_000;

type Props = {
  words: PlacedWords | undefined;
  points: readonly WaterPoint[];
  axis: TimeAxis;
  width: number;
  value: ValueAxis;
};

/** The curved line from the words about the likely range up to its lower edge. */
export function LikelyLeader({ words, points, axis, width, value }: Props) {
  if (words === undefined) return null;
  const startsAt = axis.from + ((words.x + 14) / width) * (axis.to - axis.from);
  const endsAt = startsAt + 3 * HOUR;
  const edge = waterAt(points, endsAt)?.freeChlorine.low;
  if (edge === undefined) return null;
  const [fromX, toX] = [xOf(axis, width, startsAt), xOf(axis, width, endsAt)];
  const [fromY, toY] = [words.y - 4, yOf(value, edge) + 3];
  const bend = (fromY - toY) / 2;
  return (
    <path
      d={`M${fromX} ${fromY}C${fromX} ${fromY - bend} ${toX - 4} ${toY + bend / 2} ${toX} ${toY}`}
      fill="none"
      className="stroke-ink"
      strokeWidth="1"
    />
  );
}
