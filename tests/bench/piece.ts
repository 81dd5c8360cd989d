/**
 * One thing that is timed. `run(n)` does the work n times, each time on other input than the time before, and returns
 * something that depends on it, so that no compiler leaves it out.
 */
export type Piece = {
  /** Its key in ratios.json. */
  name: string;
  /** What one core should need at most [ms]; from the engine's paper, where that names the piece. */
  target?: number;
  run: (n: number) => number;
};

/** Work on the inputs in turn, n times in all. */
export function inTurn<Input>(inputs: readonly Input[], work: (input: Input) => number): Piece['run'] {
  return (n) => {
    let sum = 0;
    for (let index = 0; index < n; index++) sum += work(inputs[index % inputs.length]!);
    return sum;
  };
}
