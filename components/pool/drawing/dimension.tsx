import { DrawingText } from './drawing-text';
import { px } from './outline-path';

const slash = 3;
const end = 5;

/** A dimension line along the length: end ticks, slashes, the figure above. */
export function DimensionAcross({ from, to, y, figure }: { from: number; to: number; y: number; figure: string }) {
  return (
    <>
      <path
        d={`M${px(from)} ${px(y)}H${px(to)}${[from, to]
          .map((x) => `M${px(x)} ${px(y - end)}v${2 * end}M${px(x - slash)} ${px(y + slash)}l6 -6`)
          .join('')}`}
        className="fill-none stroke-ink"
        strokeWidth="1"
      />
      <DrawingText x={px((from + to) / 2)} y={px(y - 7)} anchor="middle">
        {figure}
      </DrawingText>
    </>
  );
}

/** A dimension line upright; its figure stands at one side. Where there is no room for the line, the figure alone. */
export function DimensionDown({
  x,
  from,
  to,
  figure,
  side,
  bare = false,
}: {
  x: number;
  from: number;
  to: number;
  figure: string;
  side: 'left' | 'right';
  bare?: boolean;
}) {
  return (
    <>
      {bare ? null : (
        <path
          d={`M${px(x)} ${px(from)}V${px(to)}${[from, to]
            .map((y) => `M${px(x - end)} ${px(y)}h${2 * end}M${px(x - slash)} ${px(y + slash)}l6 -6`)
            .join('')}`}
          className="fill-none stroke-ink"
          strokeWidth="1"
        />
      )}
      <DrawingText
        x={px(x + (side === 'left' ? -1 : 1) * (bare ? 0 : 9))}
        y={px((from + to) / 2 + 4)}
        anchor={side === 'left' ? 'end' : 'start'}
      >
        {figure}
      </DrawingText>
    </>
  );
}
