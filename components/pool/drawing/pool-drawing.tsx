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
};

/** Plan above section on one scale, drawn for the room there is. */
export function PoolDrawing({ pool, figures, label, words, onPull }: PoolDrawingProps) {
  const t = useTranslations('pool.drawing');
  const id = useId();
  const [frame, width] = useWidth<HTMLDivElement>(358);
  const large = width >= 520;
  const left = large ? 110 : 76;
  const right = large ? 100 : 76;
  const top = large ? 64 : 46;
  const across = breadth(pool);
  // Never less than can be seen, while the page is still finding its width.
  const scale = Math.max(3, Math.min((width - left - right) / pool.length, (large ? 300 : 170) / across));
  const w = pool.length * scale;
  const h = across * scale;
  const x = left + Math.max(0, (width - left - right - w) / 2);
  const edge = top + h + (large ? 56 : 44);
  const surface = edge + freeboard;
  const shallowEnd = surface + pool.shallow * scale;
  const deepEnd = surface + pool.deep * scale;
  const height = deepEnd + 26;
  const sketched = figures.length === undefined;
  const pull = (measure: Measure) => (metres: number) => onPull?.(measure, metres);

  return (
    <div ref={frame} className="w-full">
      <svg
        width={width}
        height={px(height)}
        viewBox={`0 0 ${width} ${px(height)}`}
        className="block max-w-full"
        role="img"
        aria-label={label}
      >
        <Engravings id={id} />
        {large ? (
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
          x={x - (large ? 46 : 33)}
          from={surface}
          to={shallowEnd}
          figure={figures.shallow ?? t('depth')}
          side="left"
          bare={!large}
        />
        {pool.floor === 'flat' ? null : (
          <DimensionDown
            x={x + w + (large ? 46 : 33)}
            from={surface}
            to={deepEnd}
            figure={figures.deep ?? t('deep')}
            side="right"
            bare={!large}
          />
        )}
        {words === undefined || pool.shallow * scale < 20 ? null : (
          <DrawingText
            x={px(x + w / 2)}
            y={px(surface + Math.min(34, (pool.shallow * scale) / 2 + (large ? 10 : 7)))}
            anchor="middle"
            weight={large ? 'name' : 'smallName'}
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
    </div>
  );
}
