import { NumberedSteps } from './numbered-steps';

/** A handful of rules under one heading. */
export function RuleList({ title, rules }: { title: string; rules: readonly string[] }) {
  return (
    <section className="break-inside-avoid border-t border-rule py-3.5">
      <h2 className="font-display text-section">{title}</h2>
      <NumberedSteps steps={rules} />
    </section>
  );
}
