import { useTranslations } from 'next-intl';

/** Two weeks of one line: the range grows with time, and each test brings it back. */
const steps = Array.from({ length: 61 }, (_, index) => index / 60);
const wave = (part: number) => 12 * Math.sin(part * 5.6 + 0.4) + 4 * Math.sin(part * 15);
const tested = [48, 38, 52] as const;

const weeks = [0, 1].map((week) => {
  const from = (tested[week] ?? 0) - wave(0);
  return steps.map((part) => ({
    x: 1 + (week + part) * 49,
    y: from + wave(part) + (week === 0 ? 6 : -4) * part,
    half: 5 + 18 * Math.sqrt(part),
  }));
});

/** Room above the first point for the widest range. */
const headroom = 12;
const height = 100;

const shown = (figure: number) => Math.round(figure * 10) / 10;

export function TestFigure() {
  const t = useTranslations('start.why');
  return (
    <figure>
      <div className="relative h-22" role="img" aria-label={t('testPicture')}>
        <svg
          viewBox={`0 ${-headroom} 100 ${height}`}
          preserveAspectRatio="none"
          aria-hidden="true"
          className="absolute inset-0 size-full"
        >
          {weeks.map((points, week) => (
            <g key={week}>
              <path
                className="fill-band"
                d={`M${[
                  ...points.map(({ x, y, half }) => `${shown(x)} ${shown(y - half)}`),
                  ...[...points].reverse().map(({ x, y, half }) => `${shown(x)} ${shown(y + half)}`),
                ].join('L')}Z`}
              />
              <path
                className="fill-none stroke-teal"
                strokeWidth="2.6"
                strokeLinejoin="round"
                vectorEffect="non-scaling-stroke"
                d={`M${points.map(({ x, y }) => `${shown(x)} ${shown(y)}`).join('L')}`}
              />
            </g>
          ))}
        </svg>
        {tested.map((y, index) => (
          <span
            key={index}
            className="absolute h-5 w-0 -translate-x-1/2 -translate-y-1/2 border-l-[1.6px] border-ink before:absolute before:top-1/2 before:left-0 before:size-2.75 before:-translate-x-[6.3px] before:-translate-y-1/2 before:rounded-full before:border-[1.8px] before:border-ink before:bg-paper-lift"
            style={{ left: `${1 + index * 49}%`, top: `${((y + headroom) / height) * 100}%` }}
          />
        ))}
        <b className="absolute bottom-0 left-[54%] text-chart font-strong">{t('testCorrects')}</b>
      </div>
      <figcaption className="flex justify-between border-t border-rule-2 pt-1 text-chart text-ink-2">
        <span>{t('sunday')}</span>
        <span>{t('sunday')}</span>
        <span>{t('sunday')}</span>
      </figcaption>
    </figure>
  );
}
