'use client';

import { capitalised } from '@/components/week-sheet/capitalised';
import type { OpenSituation } from '@/lib/schemas/situation';
import { useCodeWords } from './use-code-words';
import { instantOf, useSituationTimes } from './use-situation-times';

/** The headline of what is open, its sentence, and when the next test is asked for. */
export function useHeadline({ procedure }: OpenSituation, now: number) {
  const words = useCodeWords();
  const times = useSituationTimes(now);
  const { headline, nextTestAt } = procedure;
  const given = typeof headline.at === 'string' ? headline.at : null;
  const at = given ?? (headline.code === 'test-next' ? nextTestAt : null);
  const instant = at === null ? null : instantOf(at);
  const figures =
    instant === null
      ? { when: 'none', time: '', day: '', late: 'no' }
      : {
          when: times.partAt(instant),
          time: times.clock(instant),
          day: times.dayInWords(instant),
          late: times.dayOf(instant) < times.today ? 'yes' : 'no',
        };
  return {
    headline: words.headline(headline.code, figures),
    lead: words.headlineLead(headline.code),
    nextTest: nextTestAt === null ? undefined : capitalised(times.partAt(instantOf(nextTestAt))),
  };
}
