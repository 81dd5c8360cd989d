'use client';

import { useTranslations } from 'next-intl';
import { Skeleton } from '@/components/ui/skeleton';
import { MethodChoice } from './method-choice';
import { useReadingSetting } from './reading-setting';
import { emptyTest } from './empty-test';
import type { AskedTest } from './test-for-now';
import { TestHead } from './test-head';
import { TestNote } from './test-note';

const nothing = () => {};

/** The head of a test while its form is on the way, at the places where that will have it: to be read, not yet to be used. */
export function TestComing({ kind, serverNow }: AskedTest) {
  const common = useTranslations('common');
  const { unitSystem } = useReadingSetting();
  const draft = emptyTest('', kind, 'strip', unitSystem);
  return (
    <div className="flex min-h-[calc(100dvh-9rem)] flex-col md:min-h-0">
      <div inert>
        <TestHead draft={draft} change={nothing} now={serverNow} time={{ takenAt: serverNow, problem: undefined }} />
      </div>
      <div className="grid flex-1 content-start gap-x-10 px-margin pt-3 pb-5 lg:grid-cols-[minmax(0,600px)_minmax(0,420px)]">
        <div inert>
          <MethodChoice value={draft.method} onChange={nothing} />
          <TestNote kind={kind} />
        </div>
        <Skeleton label={common('loading')} className="h-96 lg:col-start-1" />
      </div>
    </div>
  );
}
