/** A box to tick with a pen. */
export function PaperBox({ label }: { label: React.ReactNode }) {
  return (
    <p className="grid grid-cols-[14px_minmax(0,1fr)] items-start gap-x-1.5">
      <span aria-hidden="true" className="h-3.5 rounded-tick border-control border-ink" />
      <span>{label}</span>
    </p>
  );
}

/** A line to write on, named at its left. */
export function WriteLine({ label }: { label: string }) {
  return (
    <p className="flex h-[18px] items-end gap-1">
      <span>{label}</span>
      <span aria-hidden="true" className="mb-0.5 flex-1 border-b border-ink" />
    </p>
  );
}
