'use client';

import { ChartPatterns } from '@/components/charts/patterns';
import { TryIt } from '@/components/try-out/try-it';
import { Colophon } from './colophon';
import { nextDose } from './dose-state';
import { FourWays } from './four-ways';
import { NextDoses } from './next-doses';
import { PoolFacts } from './pool-facts';
import { RestOfWeek } from './rest-of-week';
import { useSheet } from './sheet-context';
import { SheetTables } from './sheet-tables';
import { StopLine } from './stop-line';
import { Today } from './today';
import { useAsksStop } from './use-asks-stop';
import { WhatChanged } from './what-changed';
import { WhyThisMix } from './why-this-mix';

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
      <TryIt />
      <RestOfWeek />
      <div className="mt-5.5 grid gap-4">
        <WhyThisMix />
        <WhatChanged />
        <FourWays />
        <SheetTables />
        <Colophon />
        <PoolFacts />
      </div>
    </div>
  );
}
