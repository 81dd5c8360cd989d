import { useTranslations } from 'next-intl';

/** Ten readings, how far each lies from the line in half-widths of the range: two are outside. */
const readings = [-0.36, 0.55, 0.14, -0.68, 1.5, 0.32, -0.18, 0.64, -1.5, 0.23] as const;

/** The range takes the middle half of the drawing's height. */
const down = (offset: number) => `${50 + offset * 25}%`;

export function RangeFigure() {
  const t = useTranslations('start.why');
  return (
    <figure>
      <div className="relative h-22" role="img" aria-label={t('rangePicture')}>
        <div className="absolute inset-x-0 top-1/4 bottom-1/4 bg-band" />
        <div className="absolute inset-x-0 top-1/2 border-t-[2.2px] border-teal" />
        {readings.map((offset, index) => {
          const outside = Math.abs(offset) > 1;
          return (
            <span
              key={index}
              className="absolute flex -translate-y-1/2 items-center gap-1.5"
              style={{ left: `${4 + index * 9.6}%`, top: down(offset) }}
            >
              <span
                className={`block size-2.75 rounded-full border-[1.8px] border-ink ${outside ? 'bg-ink' : 'bg-paper-lift'}`}
              />
              {outside ? <b className="text-chart font-strong">{t('out')}</b> : null}
            </span>
          );
        })}
      </div>
      <figcaption className="pt-1 text-chart text-ink-2">{t('rangeNote')}</figcaption>
    </figure>
  );
}
