'use client';

import { useTranslations } from 'next-intl';
import { useId } from 'react';
import { DimensionAcross, DimensionDown } from './dimension';
import { DrawingText } from './drawing-text';
import { breadth, type DrawnPool, type Measure } from './drawn-pool';
import { Engravings } from './engravings';
import { Handle } from './handle';
import { px } from './outline-path';
import { PoolPlan } from './pool-plan';
import { freeboard, PoolSection } from './pool-section';
import { useWidth } from './use-width';

export type PoolDrawingProps = {
  pool: DrawnPool;
  /** The figures with their unit; left out for what is not measured yet. */
  figures: Partial<Record<Measure, string>>;
  /** A sentence for those who listen. */
  label: string;
  /** Words in the water of the section. */
  words?: string | undefined;
  onPull?: ((measure: Measure, metres: number) => void) | undefined;
  /** Drawn when it comes near what is seen of the page; its place is kept for it. */
  whenNear?: boolean | undefined;
};

/** From this width on the drawing has room for names and a larger plan [px]; in the class below, too. */
const LARGE_FROM = 520;
type Layout = Record<'left' | 'right' | 'top' | 'between' | 'highest', number>;
/** Room around the plan, from plan to section, and the most that the plan may be high [px]. */
const small: Layout = { left: 76, right: 76, top: 46, between: 44, highest: 170 };
const large: Layout = { left: 110, right: 100, top: 64, between: 56, highest: 300 };
/** Below the deep end [px]. */
const FOOT = 26;
/** Less than that cannot be seen [px for a metre]. */
const LEAST_SCALE = 3;

/** Plan above section on one scale, drawn for the room there is. */
export function PoolDrawing({ whenNear, ...drawn }: PoolDrawingProps) {
  const [frame, width] = useWidth(358, { whenNear });
  const kept = { '--small': heightIn(small, drawn.pool), '--large': heightIn(large, drawn.pool) };
  return (
    <div ref={frame} className="@container w-full">
      <div style={kept as React.CSSProperties} className="min-h-(--small) @min-[520px]:min-h-(--large)">
        {width > 0 && <DrawnAt {...drawn} width={width} />}
      </div>
    </div>
  );
}

/** How high the drawing becomes, for the style sheet: it knows the room before any script has come. */
function heightIn({ left, right, top, between, highest }: Layout, pool: DrawnPool): string {
  const across = breadth(pool);
  const scale = `max(${LEAST_SCALE}px, min((100cqw - ${left + right}px) / ${pool.length}, ${highest / across}px))`;
  return `calc(${top + between + freeboard + FOOT}px + ${across + pool.deep} * ${scale})`;
}

function DrawnAt({
  pool,
  figures,
  label,
  words,
  onPull,
  width,
}: Omit<PoolDrawingProps, 'whenNear'> & { width: number }) {
  const t = useTranslations('pool.drawing');
  const id = useId();
  const isLarge = width >= LARGE_FROM;
  const { left, right, top, between, highest } = isLarge ? large : small;
  const across = breadth(pool);
  // Never less than can be seen, while the page is still finding its width.
  const scale = Math.max(LEAST_SCALE, Math.min((width - left - right) / pool.length, highest / across));
  const w = pool.length * scale;
  const h = across * scale;
  const x = left + Math.max(0, (width - left - right - w) / 2);
  const edge = top + h + between;
  const surface = edge + freeboard;
  const shallowEnd = surface + pool.shallow * scale;
  const deepEnd = surface + pool.deep * scale;
  const height = deepEnd + FOOT;
  const sketched = figures.length === undefined;
  const pull = (measure: Measure) => (metres: number) => onPull?.(measure, metres);

  return (
    <svg
      width={width}
      height={px(height)}
      viewBox={`0 0 ${width} ${px(height)}`}
      className="block max-w-full"
      role="img"
      aria-label={label}
    >
      <Engravings id={id} />
      {isLarge ? (
        <>
          <DrawingText x="0" y="18" weight="title">
            {t('plan')}
          </DrawingText>
          <DrawingText x="0" y={px(edge - 18)} weight="title">
            {t('section')}
          </DrawingText>
        </>
      ) : null}
      <PoolPlan pool={pool} x={x} y={top} scale={scale} id={id} sketched={sketched} />
      <DimensionAcross from={x} to={x + w} y={top - 18} figure={figures.length ?? t('length')} />
      {pool.shape === 'round' ? null : (
        <DimensionDown x={x - 22} from={top} to={top + h} figure={figures.width ?? t('width')} side="left" />
      )}
      <path
        d={[x, x + w].map((at) => `M${px(at)} ${px(top + h + 11)}V${px(edge)}`).join('')}
        className="fill-none stroke-ink"
        strokeWidth="0.8"
        strokeDasharray="1 4"
        opacity="0.7"
      />
      <PoolSection pool={pool} x={x} y={edge} scale={scale} id={id} sketched={sketched} />
      <DimensionDown
        x={x - (isLarge ? 46 : 33)}
        from={surface}
        to={shallowEnd}
        figure={figures.shallow ?? t('depth')}
        side="left"
        bare={!isLarge}
      />
      {pool.floor === 'flat' ? null : (
        <DimensionDown
          x={x + w + (isLarge ? 46 : 33)}
          from={surface}
          to={deepEnd}
          figure={figures.deep ?? t('deep')}
          side="right"
          bare={!isLarge}
        />
      )}
      {words === undefined || pool.shallow * scale < 20 ? null : (
        <DrawingText
          x={px(x + w / 2)}
          y={px(surface + Math.min(34, (pool.shallow * scale) / 2 + (isLarge ? 10 : 7)))}
          anchor="middle"
          weight={isLarge ? 'name' : 'smallName'}
          ground="water"
        >
          {words}
        </DrawingText>
      )}
      {onPull === undefined ? null : (
        <>
          <Handle x={x + w} y={top + h / 2} along="x" value={pool.length} scale={scale} onPull={pull('length')} />
          {pool.shape === 'round' ? null : (
            <Handle x={x + w / 2} y={top + h} along="y" value={pool.width} scale={scale} onPull={pull('width')} />
          )}
          <Handle x={x} y={shallowEnd} along="y" value={pool.shallow} scale={scale} onPull={pull('shallow')} />
          {pool.floor === 'flat' ? null : (
            <Handle x={x + w} y={deepEnd} along="y" value={pool.deep} scale={scale} onPull={pull('deep')} />
          )}
        </>
      )}
    </svg>
  );
}
