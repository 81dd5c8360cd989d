import type { Glyph } from './chart-doses';

export type Mark = Glyph | 'mix';

/** Shape carries the meaning: short cylinder, heap of six grains, drop, and a solid diamond for this week's mix. */
export function GlyphShape({ mark }: { mark: Mark }) {
  switch (mark) {
    case 'tablet':
      return (
        <g className="fill-paper-lift stroke-ink" strokeWidth="1.5">
          <path d="M-6.2 -2.4V2.6C-6.2 4.4 -3.4 5.7 0 5.7S6.2 4.4 6.2 2.6V-2.4" />
          <ellipse cx="0" cy="-2.4" rx="6.2" ry="3" />
        </g>
      );
    case 'granules':
      return (
        <g className="fill-ink">
          {grains.map(([x, y]) => (
            <circle key={`${x} ${y}`} cx={x} cy={y} r="1.75" />
          ))}
        </g>
      );
    case 'liquid':
      return (
        <path
          d="M0 -7C2.6 -3.4 4.9 -1 4.9 1.9A4.9 4.9 0 0 1 -4.9 1.9C-4.9 -1 -2.6 -3.4 0 -7Z"
          className="fill-paper-lift stroke-ink"
          strokeWidth="1.5"
          strokeLinejoin="round"
        />
      );
    case 'mix':
      return <path d="M0 -7L7 0L0 7L-7 0Z" className="fill-ink" />;
  }
}

const grains = [
  [0, -4.9],
  [-3, -0.1],
  [3, -0.1],
  [-6, 4.7],
  [0, 4.7],
  [6, 4.7],
] as const;

/** The glyph in a line of text; the words beside it say the same. */
export function ProductGlyph({ mark, size = 16 }: { mark: Mark; size?: number }) {
  return (
    <svg
      viewBox="-8 -8 16 16"
      width={size}
      height={size}
      aria-hidden="true"
      className="inline-block flex-none align-[-0.18em]"
    >
      <GlyphShape mark={mark} />
    </svg>
  );
}
