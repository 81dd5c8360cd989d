import { render, waitFor } from '@testing-library/react';
import { Line } from 'recharts';
import { expect, it } from 'vitest';
import { LaneChart, still } from '@/components/charts/lane-chart';
import type { Stretch } from '@/components/charts/time-axis';
import { valueAxis } from '@/components/charts/value-axis';
import { LimitLines } from '@/components/charts/water-lines';

const HOUR = 3_600_000;
const WEEK = 168 * HOUR;
const value = valueAxis({ low: 0, high: 6, height: 268, above: 18, below: 8 });

/** One week of a chart with a night and a limit; `hours` of its curve. */
function Week({ number, hours }: { number: number; hours: number }) {
  const axis: Stretch = { from: number * WEEK, to: (number + 1) * WEEK };
  const rows = Array.from({ length: hours }, (_, hour) => ({ at: axis.from + hour * HOUR, level: 3 }));
  const night = { from: axis.from + 10 * HOUR, to: axis.from + 20 * HOUR };
  return (
    <LaneChart
      time={{ axis, width: 910, nights: [night], now: 0, syncId: 'again' }}
      value={value}
      rows={rows}
      label="Free chlorine"
      reading={{ name: 'Free chlorine', words: () => '3', level: () => 3 }}
    >
      <LimitLines limits={[{ ...axis, value: 4, forbidden: 'above' }]} axis={value} />
      <Line {...still} dataKey="level" />
    </LaneChart>
  );
}

/** A night, and the hatch and the line of the limit: whoever comes back to a week has to see what nobody may go over. */
it('draws nights and limits of every week, also after one that has no curve', async () => {
  const { container, rerender } = render(<Week number={3} hours={168} />);
  const drawn = () => ['area', 'line'].map((what) => container.querySelectorAll(`.recharts-reference-${what}`).length);
  const first = [2, 1];
  await waitFor(() => expect(drawn()).toEqual(first));
  rerender(<Week number={4} hours={0} />);
  await waitFor(() => expect(drawn()).toEqual(first));
  rerender(<Week number={3} hours={168} />);
  await waitFor(() => expect(drawn()).toEqual(first));
});
