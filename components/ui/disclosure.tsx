import { ChevronDown } from 'lucide-react';
import { classNames } from './class-names';

export type DisclosureProps = {
  summary: React.ReactNode;
  children: React.ReactNode;
  defaultOpen?: boolean;
  className?: string;
};

/** A row that opens, also before the scripts of the page have come. The browser's own search finds what is inside. */
export function Disclosure({ summary, children, defaultOpen = false, className }: DisclosureProps) {
  return (
    <details
      open={defaultOpen || undefined}
      className={classNames('disclosure group/disclosure border-t border-rule', className)}
    >
      <summary className="flex min-h-[66px] w-full cursor-pointer list-none items-center gap-3 text-left md:min-h-14 [&::-webkit-details-marker]:hidden">
        <span className="min-w-0 flex-1">{summary}</span>
        <ChevronDown
          aria-hidden="true"
          className="size-5 shrink-0 text-ink-3 transition-[rotate] duration-expand group-open/disclosure:rotate-180"
        />
      </summary>
      <div className="pb-4">{children}</div>
    </details>
  );
}
