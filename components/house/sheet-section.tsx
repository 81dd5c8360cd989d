/** A part of the sheet under its heading; on paper it is not torn between two pages. */
export function SheetSection({ id, title, children }: { id: string; title: string; children: React.ReactNode }) {
  return (
    <section aria-labelledby={id} className="break-inside-avoid border-t border-ink py-2.5 print:py-1.5">
      <h2 id={id} className="font-display text-section">
        {title}
      </h2>
      {children}
    </section>
  );
}
