'use client';

import { useTranslations } from 'next-intl';
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
      <Lines lines={trouble.map((line) => ({ key: line, words: t.rich(line, { b: bold }) }))} />
    </SheetSection>
  );
}

function Lines({ lines }: { lines: readonly { key: string; words: React.ReactNode }[] }) {
  return (
    <ul className="mt-1 space-y-1.5 text-body print:space-y-0.5">
      {lines.map(({ key, words }) => (
        <li key={key} className="border-l-stop border-ink pl-2.5">
          {words}
        </li>
      ))}
    </ul>
  );
}
