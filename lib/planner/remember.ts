/** Computes once for each input, or for each key of it. */
export function remember<Input, Output>(
  compute: (input: Input) => Output,
  keyOf: (input: Input) => unknown = (input) => input,
): (input: Input) => Output {
  const known = new Map<unknown, Output>();
  return (input) => {
    const key = keyOf(input);
    const value = known.get(key) ?? compute(input);
    known.set(key, value);
    return value;
  };
}
