/** Fill for the far side of a limit. */
export const HATCH = 'url(#chart-hatch)';
/** Fill for the good range: engraved water. */
export const WAVES = 'url(#chart-waves)';

/** The engravings that charts fill with; stands once on a page, outside any chart. */
export function ChartPatterns() {
  return (
    <svg width="0" height="0" className="absolute" aria-hidden="true">
      <defs>
        <pattern
          id="chart-hatch"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(-45)"
          className="text-ink"
        >
          <path d="M0 3H6" fill="none" stroke="currentColor" strokeWidth="1.1" />
        </pattern>
        <pattern id="chart-waves" width="36" height="11" patternUnits="userSpaceOnUse" className="text-wave">
          <path d="M0 5.5q4.5 -3 9 0t9 0t9 0t9 0" fill="none" stroke="currentColor" strokeWidth="0.7" />
        </pattern>
      </defs>
    </svg>
  );
}
