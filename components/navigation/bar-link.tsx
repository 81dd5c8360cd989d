'use client';

import { usePathname } from 'next/navigation';
import { classNames } from '@/components/ui/class-names';
import { PageLink } from './page-link';
import { isCurrent } from './addresses';

export type BarLinkProps = {
  href: string;
  children: React.ReactNode;
  loud?: boolean;
  /** Marked only at this very address, not at those below it. */
  exact?: boolean;
};

/** A place in the bar of a desk: the current one is underlined in ink and heavier. */
export function BarLink({ href, children, loud = false, exact = false }: BarLinkProps) {
  const path = usePathname();
  const current = exact ? path === href : isCurrent(href, path);
  return (
    <PageLink
      href={href}
      aria-current={current ? 'page' : undefined}
      className={classNames(
        'inline-flex min-h-11 items-center gap-1.5 text-[15px] leading-5 whitespace-nowrap hover:text-ink',
        loud || current ? 'font-emphasis text-ink' : 'text-ink-2',
      )}
    >
      <span
        className={classNames(
          'inline-flex items-center gap-1.5 border-y-due border-t-transparent py-1.5',
          current ? 'border-b-ink' : 'border-b-transparent',
        )}
      >
        {children}
      </span>
    </PageLink>
  );
}
