import { DoubleRule } from '@/components/ui/double-rule';

/** The masthead of a help page. */
export function HelpHead({ headline, lead, aside }: { headline: string; lead: string; aside?: React.ReactNode }) {
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-2 pt-3.5 pb-4 md:border-t md:border-rule">
        <div>
          <h1 className="font-display text-headline text-balance">{headline}</h1>
          <p className="mt-1 max-w-[60rem] font-display text-lead text-pretty">{lead}</p>
        </div>
        {aside}
      </div>
      <DoubleRule className="hidden md:block print:block" />
    </>
  );
}
