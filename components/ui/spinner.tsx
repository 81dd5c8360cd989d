/** A ring with a gap. It only accompanies words ("Saving"), so it is hidden from screen readers. */
export function Spinner() {
  return (
    <span
      aria-hidden="true"
      className="inline-block size-4.5 shrink-0 animate-spin rounded-full border-[2.4px] border-current border-r-transparent"
    />
  );
}
