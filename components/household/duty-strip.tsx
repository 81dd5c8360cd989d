import { useTranslations } from 'next-intl';
import { classNames } from '@/components/ui/class-names';
import { dayAndMonth, dayHeading } from '@/lib/calendar/format';
import type { HandOvers } from '@/lib/schemas/hand-over';
import { type DutySegment, dutyStripDays } from './duty-strip-days';
import type { HouseholdSetting } from './household-setting';
import { useDutyWords } from './use-duty-words';

/** The narrowest strip of each screen [px], and what a letter and the room beside the words take of it. */
const narrowest = { phone: 288, desk: 840 } as const;
type Screen = keyof typeof narrowest;
const letter = 9.5;
const margins = 20;

const firstLetter = (name: string) => [...name][0] ?? '';
const percent = (share: number) => `${share * 100}%`;

/** Some weeks on one line: who is on duty when. The words beside it say the same, so it is one picture to who listens. */
export function DutyStrip({ duty, setting }: { duty: HandOvers; setting: HouseholdSetting }) {
  const t = useTranslations('household.duty');
  const words = useDutyWords(setting);
  const { locale } = setting;
  const { first, last, days, segments, ticks } = dutyStripDays(duty.today, duty.handOvers);
  const usually = words.names(duty.usually);
  const owners = words.names(duty.usually.filter(({ role }) => role === 'owner'));
  /** All that a segment could say, the fullest first. */
  const wordsFor = (segment: DutySegment): string[] => {
    if (segment.kind === 'standIn') {
      const { name, agreedAt } = segment.handOver;
      return [t(agreedAt === null ? 'asked' : 'alone', { name }), name, firstLetter(name)];
    }
    const again = segment.kind === 'again' ? [t('again', { names: usually })] : [];
    return [...again, usually, owners, duty.usually.map(({ name }) => firstLetter(name)).join(' ')];
  };
  const fitting = (segment: DutySegment, screen: Screen) =>
    wordsFor(segment).find((text) => text.length * letter + margins <= (segment.days / days) * narrowest[screen]);
  return (
    <div role="img" aria-label={t('strip', { from: dayAndMonth(first, locale), until: dayAndMonth(last, locale) })}>
      <div aria-hidden="true" className="relative h-6">
        {ticks.map(({ day, at, handOver }) => (
          <span
            key={day}
            className={classNames(
              'absolute inset-y-0 max-w-[24%] truncate border-l pl-1.5 text-small',
              handOver ? 'border-ink font-emphasis' : 'border-rule-2 text-ink-2',
            )}
            style={{ left: percent(at) }}
          >
            {handOver || day === first ? dayAndMonth(day, locale, 'short') : dayHeading(day, locale)}
          </span>
        ))}
      </div>
      <div aria-hidden="true" className="relative flex h-10 border-y-control border-ink">
        {segments.map((segment, index) => (
          <span
            key={segment.day}
            className={classNames(
              'relative min-w-0 font-display text-name leading-9',
              segment.kind === 'standIn' ? 'bg-paper-lift text-ink' : 'bg-ink text-on-ink',
              segment.kind === 'standIn' && segment.handOver.agreedAt === null && 'bg-hatch-ink',
            )}
            style={{ width: percent(segment.days / days) }}
          >
            {(['phone', 'desk'] as const).map((screen) => (
              <SegmentWords key={screen} screen={screen} standsIn={segment.kind === 'standIn'}>
                {fitting(segment, screen)}
              </SegmentWords>
            ))}
            {index === 0 ? null : (
              <span className="absolute -bottom-1.5 -left-1.5 size-2.5 border-control border-ink bg-paper-lift" />
            )}
          </span>
        ))}
      </div>
    </div>
  );
}

type WordsProps = { screen: Screen; standsIn: boolean; children: string | undefined };

/** On a ground of their own, for where the segment is hatched. */
function SegmentWords({ screen, standsIn, children }: WordsProps) {
  if (children === undefined) return null;
  return (
    <span
      className={classNames(
        'overflow-hidden px-1.5 whitespace-nowrap',
        screen === 'phone' ? 'block md:hidden' : 'hidden md:block',
      )}
    >
      <span className={classNames('px-1', standsIn && 'bg-paper-lift')}>{children}</span>
    </span>
  );
}
