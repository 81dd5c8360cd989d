/** Fill of the likely range on paper, which knows no greys. */
export const STIPPLE = 'url(#paper-stipple)';
/** Fill of night columns on paper: fine upright strokes. */
export const NIGHT = 'url(#paper-night)';

export function PaperPatterns() {
  return (
    <defs>
      <pattern id="paper-stipple" width="5" height="5" patternUnits="userSpaceOnUse">
        <circle cx="1.3" cy="1.3" r="0.55" className="fill-ink" />
        <circle cx="3.8" cy="3.8" r="0.55" className="fill-ink" />
      </pattern>
      <pattern id="paper-night" width="3.2" height="4" patternUnits="userSpaceOnUse">
        <path fill="none" d="M1.6 0V4" className="stroke-ink" strokeWidth="0.35" />
      </pattern>
    </defs>
  );
}
