'use client';

import { useRef } from 'react';
import { px } from './outline-path';

const size = 12;
const target = 44;

/**
 * A square that can be pulled, for hands on a drawing. The field beside it does the same for the keyboard, so it is hidden
 * from those who listen. `scale` in pixels a metre is taken when the pull begins: the drawing may be fitted anew meanwhile.
 */
export function Handle({
  x,
  y,
  along,
  value,
  scale,
  onPull,
}: {
  x: number;
  y: number;
  along: 'x' | 'y';
  /** Where it stands now [m]. */
  value: number;
  scale: number;
  onPull: (metres: number) => void;
}) {
  const pull = useRef<{ at: number; value: number; scale: number } | null>(null);
  const position = (event: React.PointerEvent) => (along === 'x' ? event.clientX : event.clientY);
  return (
    <g
      aria-hidden="true"
      className={`touch-none ${along === 'x' ? 'cursor-ew-resize' : 'cursor-ns-resize'}`}
      onPointerDown={(event) => {
        event.currentTarget.setPointerCapture(event.pointerId);
        pull.current = { at: position(event), value, scale };
      }}
      onPointerMove={(event) => {
        if (!pull.current) return;
        const metres = pull.current.value + (position(event) - pull.current.at) / pull.current.scale;
        // A tape measure at the edge of a pool is read to five centimetres.
        onPull(Math.max(0.2, Math.round(metres * 20) / 20));
      }}
      onPointerUp={() => {
        pull.current = null;
      }}
      onPointerCancel={() => {
        pull.current = null;
      }}
    >
      <rect x={px(x - target / 2)} y={px(y - target / 2)} width={target} height={target} fill="transparent" />
      <rect
        x={px(x - size / 2)}
        y={px(y - size / 2)}
        width={size}
        height={size}
        className="fill-paper-lift stroke-ink"
        strokeWidth="1.8"
      />
    </g>
  );
}
