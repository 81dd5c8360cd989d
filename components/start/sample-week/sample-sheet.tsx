import type { SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { SampleChlorine } from './sample-chlorine';
import { SampleHeads } from './sample-heads';
import { SampleToDo } from './sample-to-do';

type Props = {
  week: SampleWeek;
  /** The week before anything was moved, drawn in dots under it. */
  before?: SampleWeek | undefined;
  unitSystem: UnitSystem;
};

/** The lanes of a week sheet on one time axis, for a pool that somebody only tries. */
export function SampleSheet({ week, before, unitSystem }: Props) {
  return (
    <div className="md:grid md:grid-cols-[118px_1fr]">
      <SampleHeads week={week} unitSystem={unitSystem} />
      <SampleChlorine week={week} before={before} unitSystem={unitSystem} />
      <SampleToDo week={week} unitSystem={unitSystem} />
    </div>
  );
}
