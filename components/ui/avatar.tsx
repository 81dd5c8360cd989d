import { classNames } from './class-names';

export type AvatarRing = 'solid' | 'line' | 'dashed';

const rings: Record<AvatarRing, string> = {
  solid: 'border-solid border-ink bg-ink text-on-ink',
  line: 'border-solid border-ink bg-paper-lift text-ink',
  dashed: 'border-dashed border-ink bg-paper-lift text-ink',
};

/** A face: the first letter of a name in a ring. The ring repeats what a word beside it says. */
export function Avatar({ name, ring, className }: { name: string; ring: AvatarRing; className?: string }) {
  const letter = [...name.trim()][0]?.toLocaleUpperCase() ?? '';
  return (
    <span
      aria-hidden="true"
      className={classNames(
        'inline-flex size-7.5 shrink-0 items-center justify-center rounded-full border-control text-[13px] leading-none font-strong',
        rings[ring],
        className,
      )}
    >
      {letter}
    </span>
  );
}
