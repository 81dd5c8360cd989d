'use client';

import { useTranslations } from 'next-intl';
import { classNames } from '@/components/ui/class-names';
import { bold } from '@/components/week-sheet/bold';
import { SheetSection } from './sheet-section';

const daily = ['gate', 'drain', 'level', 'baskets', 'swim', 'children'] as const;
const trouble = ['drain', 'ill', 'eyes', 'smoke', 'shock', 'cloudy', 'accident'] as const;

/** What is looked at every day. */
export function SheetDaily() {
  const t = useTranslations('house.sheet.daily');
  return (
    <SheetSection id="sheet-daily" title={t('title')}>
      <Lines lines={daily.map((line) => ({ key: line, words: t.rich(line, { b: bold }) }))} />
    </SheetSection>
  );
}

/** What to do when something is wrong, the gravest first. */
export function SheetTrouble() {
  const t = useTranslations('house.sheet.trouble');
  return (
    <SheetSection id="sheet-trouble" title={t('title')}>
      <Lines
        lines={trouble.map((line) => ({ key: line, words: t.rich(line, { b: bold }) }))}
        className="md:columns-2 md:gap-x-9 print:columns-2 print:gap-x-6"
      />
    </SheetSection>
  );
}

type LinesProps = { lines: readonly { key: string; words: React.ReactNode }[]; className?: string };

function Lines({ lines, className }: LinesProps) {
  return (
    <ul className={classNames('mt-1 text-body print:text-small', className)}>
      {lines.map(({ key, words }) => (
        <li key={key} className="mb-1.5 break-inside-avoid border-l-stop border-ink pl-2.5 print:mb-0.5">
          {words}
        </li>
      ))}
    </ul>
  );
}
