import { CupSoda, Eye, Hand, Waves, Wind } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { NumberedSteps } from './numbered-steps';

/** What to do for a person, by how the chemical reached them; the words are those of care.md 8. */
export function FirstAid() {
  const t = useTranslations('help.emergency');
  const bodies = [
    {
      Icon: Wind,
      title: t('breathed.title'),
      steps: [t('breathed.one'), <b key="call">{t('breathed.two')}</b>, t('breathed.three')],
    },
    { Icon: Eye, title: t('eyes.title'), steps: [<b key="rinse">{t('eyes.one')}</b>, t('eyes.two'), t('eyes.three')] },
    { Icon: Hand, title: t('skin.title'), steps: [t('skin.one'), <b key="rinse">{t('skin.two')}</b>] },
    {
      Icon: CupSoda,
      title: t('swallowed.title'),
      steps: [t('swallowed.one'), <b key="sick">{t('swallowed.two')}</b>, t('swallowed.three')],
    },
    {
      Icon: Waves,
      title: t('inPool.title'),
      steps: [t('inPool.one'), t('inPool.two'), <b key="call">{t('inPool.three')}</b>],
    },
  ];
  return (
    <div>
      {bodies.map(({ Icon, title, steps }) => (
        <section
          key={title}
          className="grid break-inside-avoid grid-cols-[46px_1fr] border-t border-rule py-3.5 first:border-t-0 md:first:pt-0 print:py-2 print:first:pt-0"
        >
          <Icon aria-hidden="true" className="mt-px size-7" />
          <div>
            <h2 className="font-display text-section">{title}</h2>
            <NumberedSteps steps={steps} />
          </div>
        </section>
      ))}
    </div>
  );
}
