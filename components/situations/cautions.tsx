'use client';

import { useTranslations } from 'next-intl';
import { Callout } from '@/components/ui/callout';
import type { Procedure } from '@/lib/schemas/situation';
import { EmergencyLink } from './emergency-link';
import { useCodeWords } from './use-code-words';

const looks = {
  stop: { severity: 'stop', word: 'stop' },
  care: { severity: 'take-care', word: 'takeCare' },
  note: { severity: 'note', word: 'note' },
} as const;
const order = Object.keys(looks);

/** Cautions, every Stop before every other; the emergency card is one tap from each. */
export function Cautions({ cautions }: { cautions: Procedure['cautions'] }) {
  const t = useTranslations('situations');
  const common = useTranslations('common');
  const words = useCodeWords();
  const sorted = cautions.toSorted((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity));
  return (
    <section aria-label={t('cautionsLabel')} className="grid gap-3 lg:grid-cols-2 lg:gap-4">
      {sorted.map(({ code, severity }) => {
        const { title, text } = words.caution(code);
        if (title === undefined) return null;
        const { severity: look, word } = looks[severity];
        return (
          <Callout
            key={code}
            severity={look}
            word={common(word)}
            title={title}
            className={severity === 'note' ? 'lg:self-start' : ''}
            actions={severity === 'note' ? undefined : <EmergencyLink />}
          >
            <p className="mt-0.5 text-pretty">{text}</p>
          </Callout>
        );
      })}
    </section>
  );
}
