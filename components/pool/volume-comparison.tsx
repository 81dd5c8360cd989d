'use client';

import { DrawingText } from './drawing/drawing-text';
import { px } from './drawing/outline-path';
import { useWidth } from './drawing/use-width';

/** An Olympic pool: 50 m by 25 m, 2 m deep. */
export const olympicPool = { length: 50, width: 25, volume: 2500 };
const mostDrawn = 8;
/** Depth for drawing a garden pool of which only the volume is known [m]. */
const usualDepth = 1.4;

/** Both readings of a doubtful volume from above, on one scale. */
export function VolumeComparison({
  typed,
  likely,
  label,
  likelyFigure,
  toScale,
}: {
  /** [m3] */
  typed: number;
  likely: number;
  label: string;
  likelyFigure: string;
  toScale: string;
}) {
  const [frame, width] = useWidth(320);
  const figureRoom = 84;
  const gap = 10;
  const olympic = Math.round(typed / olympicPool.volume);
  const first =
    olympic >= 1
      ? { count: Math.min(mostDrawn, olympic), length: olympicPool.length, width: olympicPool.width }
      : { count: 1, ...gardenPool(typed) };
  const second = gardenPool(likely);
  const columns = Math.min(first.count, 4);
  const scale = Math.min(
    (width - figureRoom - gap * columns) / (columns * first.length + second.length),
    62 / first.width,
    62 / second.width,
  );
  const lane = { x: first.length * scale + gap, y: first.width * scale + gap };
  const rows = Math.ceil(first.count / 4);
  const x = columns * lane.x;
  const height = Math.max(rows * lane.y, second.width * scale + 4, 44);
  return (
    <div ref={frame} className="w-full">
      <svg
        width={width}
        height={px(height)}
        viewBox={`0 0 ${width} ${px(height)}`}
        role="img"
        aria-label={label}
        className="block max-w-full"
      >
        {Array.from({ length: first.count }, (_, index) => (
          <Seen
            key={index}
            x={1 + (index % 4) * lane.x}
            y={1 + Math.floor(index / 4) * lane.y}
            width={first.length * scale}
            height={first.width * scale}
            lanes={olympic >= 1}
          />
        ))}
        <rect
          x={px(x + 1)}
          y="1"
          width={px(Math.max(2, second.length * scale))}
          height={px(Math.max(1.5, second.width * scale))}
          className="fill-water stroke-ink"
          strokeWidth="1.4"
        />
        <DrawingText x={px(x + second.length * scale + 8)} y="14" ground="care">
          {likelyFigure}
        </DrawingText>
        <DrawingText x={px(x + second.length * scale + 8)} y="30" weight="plain" ground="care">
          {toScale}
        </DrawingText>
      </svg>
    </div>
  );
}

function gardenPool(volume: number): { length: number; width: number } {
  const width = Math.sqrt(volume / usualDepth / 2);
  return { length: 2 * width, width };
}

function Seen({ x, y, width, height, lanes }: { x: number; y: number; width: number; height: number; lanes: boolean }) {
  return (
    <>
      <rect
        x={px(x)}
        y={px(y)}
        width={px(Math.max(2, width))}
        height={px(Math.max(1.5, height))}
        className="fill-water-2 stroke-ink"
        strokeWidth="1.2"
      />
      {lanes ? (
        <path
          d={[1, 2, 3, 4, 5, 6, 7].map((lane) => `M${px(x)} ${px(y + (lane * height) / 8)}h${px(width)}`).join('')}
          className="fill-none stroke-ink"
          strokeWidth="0.5"
          opacity="0.45"
        />
      ) : null}
    </>
  );
}
