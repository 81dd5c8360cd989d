import { Pencil } from 'lucide-react';
import { PageLink } from '@/components/navigation/page-link';
import type { SetupStep } from '@/lib/schemas/pool-profile';
import { addressOf } from './step-address';

export type ProfileRow = { name: string; value: string };

/** A part of the profile in rows, with the way to correct it. */
export function ProfileRows({
  step,
  title,
  rows,
  change,
}: {
  step: SetupStep;
  title: string;
  rows: readonly ProfileRow[];
  /** Words of the link; left out for those who only look. */
  change: string | undefined;
}) {
  return (
    <section className="border-t border-rule pt-3.5 pb-4 first:border-t-0">
      <div className="flex items-baseline justify-between gap-3">
        <h2 className="font-display text-section">{title}</h2>
        {change === undefined ? null : (
          <PageLink
            href={addressOf(step, 'profile')}
            aria-label={[change, title].join(', ')}
            className="inline-flex min-h-11 items-center gap-1.5 text-body underline decoration-1 underline-offset-[3px]"
          >
            <Pencil aria-hidden="true" className="size-4" />
            {change}
          </PageLink>
        )}
      </div>
      <dl className="text-body">
        {rows.map(({ name, value }) => (
          <div key={name} className="grid grid-cols-[122px_1fr] gap-x-3 border-t border-rule py-1.75 first:border-t-0">
            <dt className="text-ink-2">{name}</dt>
            <dd className="min-w-0 font-emphasis">{value}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
