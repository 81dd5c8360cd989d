import { Phone } from 'lucide-react';
import { classNames } from './class-names';
import { textLink } from './text-link';

/** What a phone dials. The zero in brackets of "+49 (0)30" is only for calls within the country. */
export function dialled(number: string): string {
  const abroad = number.trim().startsWith('+');
  return `tel:${(abroad ? number.replace('(0)', '') : number).replace(/[^0-9+]/g, '')}`;
}

/** A number to tap, and to read where it cannot be tapped. */
export function PhoneLink({
  number,
  label,
  className,
}: {
  number: string;
  /** What is read out: whom it calls, with the number. */
  label: string;
  className?: string;
}) {
  return (
    <a
      href={dialled(number)}
      aria-label={label}
      className={classNames(textLink, 'inline-flex min-h-11 items-center gap-2 font-strong print:min-h-0', className)}
    >
      <Phone aria-hidden="true" className="size-4.5 shrink-0 print:hidden" />
      {number}
    </a>
  );
}
