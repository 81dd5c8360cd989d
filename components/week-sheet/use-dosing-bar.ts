import { useTranslations } from 'next-intl';
import { useSheet } from './sheet-context';

/** The gravest first. */
const bars = ['drain-cover', 'storm', 'pump-failure'] as const;

/** Why nothing may go in now, whatever the plan says; undefined when nothing of the kind has happened. */
export function useDosingBar(): string | undefined {
  const t = useTranslations('events.dosing');
  const { events } = useSheet().sheet;
  const bar = bars.find((kind) => events.some((event) => event.kind === kind));
  return bar && t(bar);
}
