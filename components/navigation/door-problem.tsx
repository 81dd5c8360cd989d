/** At the foot of a phone the words of a problem stand above their button, in a bar below it. */
export type ProblemSide = 'above' | 'below';

/** What went wrong behind a button of the navigation, which has no room for it in its line. */
export function DoorProblem({ side, children }: { side: ProblemSide; children: string }) {
  return (
    <span
      role="alert"
      className={`absolute right-0 z-10 w-64 border-due border-ink bg-paper-lift p-3 text-small font-emphasis text-terra-ink ${side === 'above' ? 'bottom-full' : 'top-full'}`}
    >
      {children}
    </span>
  );
}
