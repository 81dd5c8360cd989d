'use client';

import { useEffect, useRef, useState } from 'react';
import { isSameWater, type SampleWater, type SampleWeek } from '@/lib/schemas/sample-water';
import type { SampleAnswer } from './messages';
import { SampleSession } from './session';

export type SampleAnswered = {
  /** The newest week that has been worked out; of an earlier water while the next one is under way. */
  week: SampleWeek | undefined;
  /** What is asked has not been worked out yet. */
  waiting: boolean;
  /** No plan could be made for what is asked. */
  failed: boolean;
};

/**
 * The engine behind the sheet on the start page. It is loaded with the first water that differs from the one the server has
 * planned.
 */
export function useSampleWeek(water: SampleWater, start: SampleWeek | undefined): SampleAnswered {
  const session = useRef<SampleSession>(undefined);
  const [answer, setAnswer] = useState<SampleAnswer>();
  const [shown, show] = useState(start);

  useEffect(() => {
    const opened = new SampleSession((heard) => {
      setAnswer(heard);
      if ('week' in heard) show(heard.week);
    });
    session.current = opened;
    return () => opened.close();
  }, []);

  const fromServer = start !== undefined && isSameWater(water, start.water);
  const { volume, sunshine, stabilizer } = water;
  useEffect(() => {
    if (!fromServer) session.current?.ask({ volume, sunshine, stabilizer });
  }, [fromServer, volume, sunshine, stabilizer]);

  if (fromServer) return { week: start, waiting: false, failed: false };
  const failed = answer !== undefined && 'failed' in answer && isSameWater(answer.failed, water);
  const waiting = !failed && (shown === undefined || !isSameWater(shown.water, water));
  return { week: shown, waiting, failed };
}
