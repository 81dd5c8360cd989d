import { leaderEnd } from './leader-end';
import type { PlacedWords } from './place-words';
import type { TimeAxis } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import type { WaterPoint } from './water-curve';

type Props = {
  words: PlacedWords | undefined;
  points: readonly WaterPoint[];
  axis: TimeAxis;
  width: number;
  value: ValueAxis;
};

/** The curved line from the words about the likely range up to its lower edge. */
export function LikelyLeader({ words, points, axis, width, value }: Props) {
  const leader = words && leaderEnd({ axis, width, points }, words.x);
  if (words === undefined || leader === undefined) return null;
  const { fromX, toX, edge } = leader;
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
