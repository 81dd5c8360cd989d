'use client';

import { useMutation } from '@tanstack/react-query';
import { useLocale, useTranslations } from 'next-intl';
import { textLink } from '@/components/ui/text-link';
import { chooseLanguage, leaveFor } from '@/lib/client/session';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { languages } from '@/lib/schemas/languages';
import { DoorProblem, type ProblemSide } from './door-problem';

/** The other languages, each by its own name, for whoever is signed in. */
export function LanguageButton({ problem = 'below' }: { problem?: ProblemSide }) {
  const t = useTranslations('navigation.language');
  const words = useProblemWords();
  const current = useLocale();
  const choosing = useMutation({ mutationFn: chooseLanguage, onSuccess: () => leaveFor(thisPage()) });
  const busy = choosing.isPending || choosing.isSuccess;
  return (
    <span className="relative">
      {languages
        .filter((language) => language !== current)
        .map((language) => (
          <button
            key={language}
            type="button"
            lang={language}
            aria-disabled={busy || undefined}
            className={`min-h-11 cursor-pointer whitespace-nowrap ${textLink}`}
            onClick={() => {
              if (!busy) choosing.mutate({ language });
            }}
          >
            {t(language)}
          </button>
        ))}
      {choosing.isError ? <DoorProblem side={problem}>{words(choosing.error)}</DoorProblem> : null}
    </span>
  );
}

/** To be loaded anew, for every word of it is another one; an address with a place in the page would only scroll there. */
function thisPage(): string {
  return `${window.location.pathname}${window.location.search}`;
}
