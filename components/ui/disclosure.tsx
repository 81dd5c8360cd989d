'use client';

import { Collapsible } from '@base-ui/react/collapsible';
import { ChevronDown } from 'lucide-react';
import { classNames } from './class-names';

export type DisclosureProps = {
  summary: React.ReactNode;
  children: React.ReactNode;
  defaultOpen?: boolean;
  className?: string;
};

/** A row that opens. What is inside can be found by the browser's own search while it is closed. */
export function Disclosure({ summary, children, defaultOpen = false, className }: DisclosureProps) {
  return (
    <Collapsible.Root defaultOpen={defaultOpen} className={classNames('border-t border-rule', className)}>
      <Collapsible.Trigger className="group flex min-h-[66px] w-full cursor-pointer items-center gap-3 text-left md:min-h-14">
        <span className="min-w-0 flex-1">{summary}</span>
        <ChevronDown
          aria-hidden="true"
          className="size-5 shrink-0 text-ink-3 transition-[rotate] duration-expand group-data-panel-open:rotate-180"
        />
      </Collapsible.Trigger>
      <Collapsible.Panel
        hiddenUntilFound
        className="h-[var(--collapsible-panel-height)] overflow-hidden transition-[height] duration-expand data-ending-style:h-0 data-starting-style:h-0 [&[hidden]:not([hidden=until-found])]:hidden"
      >
        <div className="pb-4">{children}</div>
      </Collapsible.Panel>
    </Collapsible.Root>
  );
}
