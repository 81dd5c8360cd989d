import { breadth, type DrawnPool } from './drawn-pool';
import { outlinePath, px } from './outline-path';

/** The pool from above: coping, water, the deeper part darker, steps where a rectangle usually has them. */
export function PoolPlan({
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
  /** Prefix of the drawing's engravings. */
  id: string;
  /** Not measured yet: the edge is dotted. */
  sketched: boolean;
}) {
  const edge = outlinePath(pool, x, y, scale);
  const w = pool.length * scale;
  const h = breadth(pool) * scale;
  const deepFrom = pool.floor === 'drop-off' ? 0.75 : 0.5;
  return (
    <>
      <clipPath id={`${id}-edge`}>
        <path d={edge} />
      </clipPath>
      <path d={edge} className="fill-none stroke-ink" strokeWidth="20" strokeLinejoin="miter" />
      <path d={edge} className="fill-none stroke-paper-lift" strokeWidth="17.8" strokeLinejoin="miter" />
      <path d={edge} className="fill-water-2" />
      <g clipPath={`url(#${id}-edge)`}>
        <rect x={px(x)} y={px(y)} width={px(w)} height={px(h)} fill={`url(#${id}-waves)`} />
        {pool.floor === 'flat' ? null : (
          <rect
            x={px(x + w * deepFrom)}
            y={px(y)}
            width={px(w * (1 - deepFrom))}
            height={px(h)}
            className="fill-water"
            opacity="0.6"
          />
        )}
      </g>
      {pool.shape === 'rectangle' ? <Steps x={x} y={y + h * 0.3} height={h * 0.4} tread={0.34 * scale} /> : null}
      <path
        d={edge}
        className="fill-none stroke-ink"
        strokeWidth="2"
        {...(sketched ? { strokeDasharray: '2 3' } : {})}
      />
    </>
  );
}

function Steps({ x, y, height, tread }: { x: number; y: number; height: number; tread: number }) {
  const far = x + 3 * tread;
  return (
    <path
      d={`${[1, 2, 3].map((step) => `M${px(x + step * tread)} ${px(y)}v${px(height)}`).join('')}M${px(x)} ${px(y)}H${px(far)}M${px(x)} ${px(y + height)}H${px(far)}`}
      className="fill-none stroke-ink"
      strokeWidth="1.1"
    />
  );
}
