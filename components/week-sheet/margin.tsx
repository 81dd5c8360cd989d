'use client';

import { FourWays } from './four-ways';
import { WhatChanged } from './what-changed';
import { WhyThisMix } from './why-this-mix';

/** Beside the lanes on a desk, under the week on a phone: why the plan is as it is, and what else it could be. */
export function Margin() {
  return (
    <>
      <div>
        <WhyThisMix />
        <WhatChanged />
      </div>
      <FourWays />
    </>
  );
}
