import 'server-only';
import { sharedEngine } from '@/lib/engine-worker/shared-engine';
import { sampleScenario } from '@/lib/planner/sample-scenario';
import { sampleWeekOf } from '@/lib/planner/sample-week';
import { type SampleWeek, startingSample } from '@/lib/schemas/sample-water';

let known: Promise<SampleWeek> | undefined;

/** The week with which the sheet on the start page begins. The same for everybody, so it is planned once. */
export function showSampleWeek(): Promise<SampleWeek> {
  known ??= planned().catch((problem: unknown) => {
    known = undefined;
    throw problem;
  });
  return known;
}

async function planned(): Promise<SampleWeek> {
  const plan = await sharedEngine().run('plan', sampleScenario(startingSample));
  return sampleWeekOf(startingSample, plan);
}
