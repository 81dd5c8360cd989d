import { type ValueAxis, yOf } from '@/components/charts/value-axis';

const tones = { ink: 'text-ink', teal: 'text-teal-ink', plum: 'text-plum-ink', ochre: 'text-ochre-ink' } as const;

/** A lane's name in the gutter, with what its figures mean. */
export function LaneName({ name, note, tone = 'ink' }: { name: string; note: string; tone?: keyof typeof tones }) {
  return (
    <div className="pt-1.25 pr-5">
      <p className={`font-display text-name ${tones[tone]}`}>{name}</p>
      <p className="mt-px text-figure text-ink-2">{note}</p>
    </div>
  );
}

/** Figures of a lane's axis at the right of the gutter; those of the limits are bold. */
export function AxisFigures({
  value,
  figures,
}: {
  value: ValueAxis;
  figures: readonly { at: number; words: string; limit?: boolean }[];
}) {
  return figures.map(({ at, words, limit }) => (
    <span
      key={at}
      aria-hidden="true"
      className={`absolute right-2 -translate-y-1/2 text-figure ${limit ? 'font-strong text-ink' : 'text-ink-2'}`}
      style={{ top: yOf(value, at) }}
    >
      {words}
    </span>
  ));
}
