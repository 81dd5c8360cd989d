import { Check, Minus } from 'lucide-react';

/** Something that was done: an inked box, what it was, who and when. */
export function DoneLine({ what, who, skipped = false }: { what: string; who: string; skipped?: boolean }) {
  const Mark = skipped ? Minus : Check;
  return (
    <div className="grid grid-cols-[17px_minmax(0,1fr)] gap-1.75">
      <span
        aria-hidden="true"
        className={`mt-px flex size-4.25 items-center justify-center rounded-tick border-[1.6px] border-ink ${skipped ? 'bg-paper-lift' : 'bg-ink text-on-ink'}`}
      >
        <Mark className="size-3 [stroke-width:3]" />
      </span>
      <span className="min-w-0">
        <b className="block font-emphasis">{what}</b>
        <span className="block text-fine text-ink-2">{who}</span>
      </span>
    </div>
  );
}
