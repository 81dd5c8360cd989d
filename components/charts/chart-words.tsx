import { baselinesOf, type PlacedWords, type Weight } from './place-words';

const weights: Record<Weight, string> = {
  plain: 'fill-ink-2 font-chart',
  bold: 'fill-ink font-strong',
  figure: 'fill-current font-display font-headline',
  italic: 'fill-teal-ink font-display italic',
};

/** Words over a chart, each with a halo of its ground, so that a line under them does not strike them out. */
export function ChartWords({ words }: { words: readonly PlacedWords[] }) {
  return words.map(({ id, lines, x, y, anchor, ground, tone }) => {
    const baselines = baselinesOf(lines);
    const figure = tone === 'teal' ? 'text-teal-ink' : 'text-ink';
    const halo = ground === 'water' ? 'stroke-water-2' : 'stroke-paper';
    return (
      <g key={id} className={`[paint-order:stroke] [stroke-linejoin:round] [stroke-width:4px] ${halo} ${figure}`}>
        {lines.map((line, index) => (
          <text key={line[0]?.text} className="fill-ink" x={x} y={y + (baselines[index] ?? 0)} textAnchor={anchor}>
            {line.map(({ text, size, weight }) => (
              <tspan key={text} fontSize={size} className={weights[weight]}>
                {text}
              </tspan>
            ))}
          </text>
        ))}
      </g>
    );
  });
}
