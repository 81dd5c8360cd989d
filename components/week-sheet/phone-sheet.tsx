'use client';

import { ChartPatterns } from '@/components/charts/patterns';
import { Colophon } from './colophon';
import { nextDose } from './dose-state';
import { NextDoses } from './next-doses';
import { margin, tryIt } from './parts-that-follow';
import { PoolFacts } from './pool-facts';
import { RestOfWeek } from './rest-of-week';
import { useSheet } from './sheet-context';
import { SheetTables } from './sheet-tables';
import { StopLine } from './stop-line';
import { Today } from './today';
import { useAsksStop } from './use-asks-stop';

/** Laid out only when the page is scrolled towards it; as wide as the page, for what sticks out of it is cut off. */
const further = '-mx-margin px-margin [content-visibility:auto] [contain-intrinsic-height:auto_var(--as-tall-as)]';

/** The day first: what to do next, the Stop, today's water, then the rest of the week. */
export function PhoneSheet() {
  const { sheet } = useSheet();
  // Where the next dose asks for it to be confirmed it stands there, and not twice.
  const asked = useAsksStop()(nextDose(sheet.doses));
  return (
    <div className="px-margin pb-6">
      <ChartPatterns />
      <NextDoses />
      {!asked && <StopLine className="mt-3.5 border-y border-rule py-3" />}
      <Today />
      <div className={`${further} [--as-tall-as:56rem]`}>{tryIt}</div>
      <div className={`${further} [--as-tall-as:34rem]`}>
        <RestOfWeek />
      </div>
      <div className={`${further} grid gap-4 pt-5.5 [--as-tall-as:90rem]`}>
        {margin}
        <SheetTables />
        <Colophon />
        <PoolFacts />
      </div>
    </div>
  );
}
