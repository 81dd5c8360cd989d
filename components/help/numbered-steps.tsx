/** Short steps in the order they are done. The figure is the list's own, drawn in the display face. */
export function NumberedSteps({ steps }: { steps: readonly React.ReactNode[] }) {
  return (
    <ol className="mt-1">
      {steps.map((step, index) => (
        <li key={index} className="grid grid-cols-[22px_1fr] py-0.5 text-body">
          <span aria-hidden="true" className="font-display font-headline text-ink-2">
            {index + 1}
          </span>
          <span>{step}</span>
        </li>
      ))}
    </ol>
  );
}
