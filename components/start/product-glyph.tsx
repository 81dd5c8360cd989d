export type ProductForm = 'tablets' | 'granules' | 'liquid';

/** The three forms of chlorine: a short cylinder, a heap of six dots, a drop. The shape carries the meaning. */
export function ProductGlyph({ form, className = 'size-5' }: { form: ProductForm; className?: string }) {
  return (
    <svg viewBox="-8 -8 16 16" aria-hidden="true" className={`shrink-0 ${className}`}>
      {form === 'tablets' ? (
        <g className="fill-paper-lift stroke-ink" strokeWidth="1.5">
          <path d="M-6.2 -2.4V2.6C-6.2 4.4 -3.4 5.7 0 5.7S6.2 4.4 6.2 2.6V-2.4" />
          <ellipse cx="0" cy="-2.4" rx="6.2" ry="3" />
        </g>
      ) : null}
      {form === 'granules' ? (
        <g className="fill-ink">
          <circle cx="0" cy="-4.9" r="1.75" />
          <circle cx="-3" cy="-.1" r="1.75" />
          <circle cx="3" cy="-.1" r="1.75" />
          <circle cx="-6" cy="4.7" r="1.75" />
          <circle cx="0" cy="4.7" r="1.75" />
          <circle cx="6" cy="4.7" r="1.75" />
        </g>
      ) : null}
      {form === 'liquid' ? (
        <path
          d="M0 -7C2.6 -3.4 4.9 -1 4.9 1.9A4.9 4.9 0 0 1 -4.9 1.9C-4.9 -1 -2.6 -3.4 0 -7Z"
          className="fill-paper-lift stroke-ink"
          strokeWidth="1.5"
          strokeLinejoin="round"
        />
      ) : null}
    </svg>
  );
}
