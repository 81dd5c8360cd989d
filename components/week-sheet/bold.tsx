/** For `t.rich`: what a message marks as bold. */
export function bold(words: React.ReactNode) {
  return <b className="text-ink">{words}</b>;
}
