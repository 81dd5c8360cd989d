import { Hourglass, OctagonX, TestTubeDiagonal, Waves } from 'lucide-react';
import { classNames } from './class-names';

export type VerdictFrameState = 'stay-out' | 'wait' | 'test-first' | 'fine';

const frames: Record<VerdictFrameState, { Icon: typeof Waves; box: string; word: string }> = {
  'stay-out': {
    Icon: OctagonX,
    box: 'relative border-stop border-terra-ink bg-paper-lift py-3 pr-4 pl-8 before:absolute before:inset-y-0 before:left-0 before:w-4.25 before:bg-hatch-stop',
    word: 'text-terra-ink',
  },
  wait: { Icon: Hourglass, box: 'border-[1.6px] border-dashed border-ink bg-paper-lift px-4 py-3', word: '' },
  'test-first': {
    Icon: TestTubeDiagonal,
    box: 'border-t-stop border-b border-ink bg-paper-lift px-4 py-3',
    word: '',
  },
  fine: { Icon: Waves, box: '', word: '' },
};

export type VerdictFrameProps = {
  state: VerdictFrameState;
  /** The state in a word: "Stay out", "Wait", "Test first", "Fine". */
  word: string;
  /** The sentence itself. */
  headline: React.ReactNode;
  /** The heading's level on this page. */
  level?: 1 | 2;
  children?: React.ReactNode;
  className?: string;
};

/** The swim verdict: word, sign and frame differ for each of the four states. A Fine stands without a frame. */
export function VerdictFrame({ state, word, headline, level = 1, children, className }: VerdictFrameProps) {
  const { Icon, box, word: wordColour } = frames[state];
  const Heading = level === 1 ? 'h1' : 'h2';
  return (
    <section className={classNames('text-body', box, className)} data-verdict={state}>
      <p className={classNames('flex items-center gap-2 text-label font-severity', wordColour)}>
        <Icon aria-hidden="true" className="size-5.5" />
        {word}
      </p>
      <Heading className="mt-1.5 mb-1 font-display text-verdict text-balance">{headline}</Heading>
      {children}
    </section>
  );
}

/** The line that always stands under a Fine. */
export function StandingLine({ children, className }: { children: React.ReactNode; className?: string }) {
  return <p className={classNames('border-l-stop border-ink pl-3 text-body text-pretty', className)}>{children}</p>;
}
