/** The sign of the product: a gauge board standing in water. */
export function BrandMark({ className = 'size-6.5' }: { className?: string }) {
  return (
    <svg viewBox="0 0 26 26" aria-hidden="true" className={`shrink-0 ${className}`}>
      <circle cx="13" cy="13" r="11.6" className="fill-none stroke-ink" strokeWidth="1.8" />
      <path
        d="M2.2 14.2c2.7-2.4 4.7-2.4 7.2 0s4.5 2.4 7.2 0 4.5-2.4 7.2 0A11 11 0 0 1 2.2 14.2Z"
        className="fill-ink"
      />
      <path d="M13 2.6V8.6M10.6 5h2.4M10.9 7.8h2.1" className="fill-none stroke-ink" strokeWidth="1.5" />
    </svg>
  );
}
