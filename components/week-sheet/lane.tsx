import type { Stretch, TimeAxis } from '@/components/charts/time-axis';
import { shareOf } from '@/components/charts/time-axis';

/** Heights of the lanes [px]; the page and the plumb lines through it have to agree on them. */
export const laneHeight = { head: 50, sun: 74, chlorine: 268, highLow: 36, pH: 58, stabilizer: 58 } as const;

/** Where the drawn lanes end and the to-do lane begins [px]. */
export const lanesFoot = Object.values(laneHeight).reduce((sum, height) => sum + height, 0);

export type LaneName = keyof typeof laneHeight;

/** One lane: its name in the gutter, its picture on the shared time axis. The gutter stays when the sheet is scrolled. */
export function Lane({
  name,
  gutter,
  children,
  first = false,
}: {
  name: LaneName;
  gutter: React.ReactNode;
  children: React.ReactNode;
  first?: boolean;
}) {
  return (
    <div
      className={`relative grid grid-cols-[var(--gutter)_minmax(0,1fr)] ${first ? '' : 'border-t border-rule-2'}`}
      style={{ height: laneHeight[name] }}
    >
      <div className="sticky left-0 z-2 bg-paper">{gutter}</div>
      <div className="relative min-w-0">{children}</div>
    </div>
  );
}

/** A stretch of time as a place in a lane, in shares of its width. */
export function placeOf(axis: TimeAxis, { from, to }: Stretch): { left: string; width: string } {
  const left = shareOf(axis, from);
  return { left: `${left * 100}%`, width: `${(shareOf(axis, to) - left) * 100}%` };
}

/** Night columns of a lane that is not a chart. */
export function Nights({ axis, nights }: { axis: TimeAxis; nights: readonly Stretch[] }) {
  return nights.map((night) => (
    <div key={night.from} aria-hidden="true" className="absolute inset-y-0 bg-night" style={placeOf(axis, night)} />
  ));
}

/** The line of now through a lane that is not a chart; `left` as a share of its width. */
export function NowRule({ left, top = 0 }: { left: number; top?: number }) {
  return (
    <div
      aria-hidden="true"
      className="absolute bottom-0 border-l-[1.6px] border-ink"
      style={{ left: `calc(${left * 100}% - 0.8px)`, top }}
    />
  );
}
