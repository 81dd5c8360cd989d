import { type DrawnPool, floorLine } from './drawn-pool';
import { px } from './outline-path';

/** How far the earth reaches beyond the walls, and how thick it is drawn [px]. */
const earth = { beside: 30, thick: 13 };
/** From the edge of the pool down to the water [px]. */
export const freeboard = 9;

/** The pool cut along its middle, on the scale of the plan above. `y` is the edge of the pool. */
export function PoolSection({
  pool,
  x,
  y,
  scale,
  id,
  sketched,
}: {
  pool: DrawnPool;
  x: number;
  y: number;
  scale: number;
  id: string;
  sketched: boolean;
}) {
  const w = pool.length * scale;
  const surface = y + freeboard;
  const bottom = floorLine(pool).map(([share, depth]) => [x + share * w, surface + depth * scale] as const);
  const line = bottom.map(([bx, by]) => `L${px(bx)} ${px(by)}`).join('');
  const under = [...bottom]
    .reverse()
    .map(
      ([bx, by]) => `L${px(bx + (bx === x ? -earth.thick : bx === x + w ? earth.thick : 0))} ${px(by + earth.thick)}`,
    )
    .join('');
  const left = px(x - earth.beside);
  const right = px(x + w + earth.beside);
  const walls = `M${left} ${px(y)}H${px(x)}${line}V${px(y)}H${right}`;
  return (
    <>
      <path
        d={`${walls}V${px(y + earth.thick)}H${px(x + w + earth.thick)}${under}V${px(y + earth.thick)}H${left}Z`}
        fill={`url(#${id}-hatch)`}
        opacity="0.5"
      />
      <path d={`M${px(x)} ${px(surface)}${line}V${px(surface)}Z`} className="fill-water" />
      <path d={`M${px(x)} ${px(surface)}${line}V${px(surface)}Z`} fill={`url(#${id}-waves)`} />
      <path
        d={`M${px(x)} ${px(surface)}${'q4.5 -3 9 0t9 0'.repeat(Math.floor(w / 18))}`}
        className="fill-none stroke-teal"
        strokeWidth="1.6"
      />
      <path
        d={walls}
        className="fill-none stroke-ink"
        strokeWidth="2"
        strokeLinejoin="round"
        {...(sketched ? { strokeDasharray: '2 3' } : {})}
      />
    </>
  );
}
