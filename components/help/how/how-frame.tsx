import { HelpHead } from '../help-head';
import { HowList, type HowPlace } from './how-list';

/** Masthead, the page, and beside it (on a phone below it) the list of all pages. */
export function HowFrame({
  current,
  headline,
  lead,
  children,
}: {
  current: HowPlace;
  headline: string;
  lead: string;
  children: React.ReactNode;
}) {
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={headline} lead={lead} />
      <div className="lg:grid lg:grid-cols-[minmax(0,1fr)_300px] lg:gap-x-8">
        <div className="min-w-0">{children}</div>
        <aside className="mt-8 border-t border-ink pt-3 lg:mt-0 lg:border-t-0 lg:pt-3.5">
          <HowList current={current} />
        </aside>
      </div>
    </div>
  );
}
