import { useTranslations } from 'next-intl';
import { HowFrame } from './how-frame';

/** What no arithmetic about a pool can know, and what finds it. */
export function HowUnknown() {
  const t = useTranslations('how.unknown');
  return (
    <HowFrame current="unknown" headline={t('title')} lead={t('lead')}>
      <div className="grid gap-x-9 md:grid-cols-2">
        <Unknowns
          title={t('eyesTitle')}
          words={[t('eyes.drain'), t('eyes.cover'), t('eyes.thunder'), t('eyes.label')]}
        />
        <Unknowns
          title={t('waterTitle')}
          words={[
            t('water.guests'),
            t('water.leaves'),
            t('water.algae'),
            t('water.mixed'),
            t('water.ammonia'),
            t('water.germs'),
          ]}
        />
        <Unknowns
          title={t('measureTitle')}
          words={[t('measure.misread'), t('measure.volume'), t('measure.bottle'), t('measure.sky')]}
        />
        <Unknowns
          title={t('scienceTitle')}
          words={[
            t('science.cyanurate'),
            t('science.temperature'),
            t('science.bound'),
            t('science.carbonDioxide'),
            t('science.companions'),
          ]}
        />
      </div>
    </HowFrame>
  );
}

function Unknowns({ title, words }: { title: string; words: readonly string[] }) {
  return (
    <section className="border-t border-rule py-3.5">
      <h2 className="font-display text-section">{title}</h2>
      <ul className="mt-1.5 space-y-2 text-body">
        {words.map((sentence) => (
          <li key={sentence} className="border-l-stop border-ink pl-3">
            {sentence}
          </li>
        ))}
      </ul>
    </section>
  );
}
