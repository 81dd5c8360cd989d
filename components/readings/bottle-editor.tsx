'use client';

import { ArrowDown, ArrowUp } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { TickBox } from '@/components/ui/tick-box';
import { formatForInput } from '@/lib/units/format';
import { type Bottle, firstBottle, mostSteps, parseSteps, stepsProblem } from './bottle';
import { type PadQuantity, padQuantities } from './quantities';
import { useReadingSetting } from './reading-setting';
import { useValueWords } from './use-value-words';

type Row = { quantity: PadQuantity; onStrip: boolean; steps: string };

/** Once per bottle: which pads the strip has, in which order, and the steps printed for each. */
export function BottleEditor({
  bottle,
  onKeep,
  onLeave,
}: {
  bottle: Bottle;
  onKeep: (bottle: Bottle) => void;
  onLeave: () => void;
}) {
  const t = useTranslations('readings.bottle');
  const common = useTranslations('common');
  const words = useValueWords();
  const { locale } = useReadingSetting();
  const [rows, setRows] = useState<Row[]>(() => rowsOf(bottle, locale));
  const [tried, setTried] = useState(false);
  const used = rows.filter(({ onStrip }) => onStrip);
  const problemOf = ({ quantity, steps, onStrip }: Row) =>
    onStrip ? stepsProblem(quantity, parseSteps(steps)) : undefined;
  const needsBoth = !(['freeChlorine', 'pH'] as const).every((quantity) =>
    used.some((row) => row.quantity === quantity),
  );

  const change = (quantity: PadQuantity, part: Partial<Row>) =>
    setRows(rows.map((row) => (row.quantity === quantity ? { ...row, ...part } : row)));
  const move = (index: number, by: 1 | -1) => {
    const next = [...rows];
    const [row] = next.splice(index, 1);
    if (row) next.splice(index + by, 0, row);
    setRows(next);
  };
  const keep = () => {
    setTried(true);
    if (needsBoth || rows.some((row) => problemOf(row) !== undefined)) return;
    onKeep(used.flatMap(({ quantity, steps }) => ({ quantity, steps: parseSteps(steps) ?? [] })));
  };

  return (
    <section aria-label={t('title')} className="grid gap-3 border-y-due border-ink bg-paper-lift p-4">
      <h2 className="font-display text-section">{t('title')}</h2>
      <p className="text-small text-ink-2">{t('lead', { most: mostSteps })}</p>
      <ol className="grid gap-3">
        {rows.map((row, index) => {
          const problem = tried ? problemOf(row) : undefined;
          const name = words.name(row.quantity);
          return (
            <li key={row.quantity} className="border-t border-rule pt-1">
              <div className="flex items-center justify-between gap-2">
                <TickBox label={name} checked={row.onStrip} onChange={(onStrip) => change(row.quantity, { onStrip })} />
                <span className="flex">
                  <Button
                    variant="quiet"
                    aria-label={t('up', { name })}
                    onClick={() => move(index, -1)}
                    className={index === 0 ? 'invisible' : ''}
                  >
                    <ArrowUp aria-hidden="true" className="size-5" />
                  </Button>
                  <Button
                    variant="quiet"
                    aria-label={t('down', { name })}
                    onClick={() => move(index, 1)}
                    className={index === rows.length - 1 ? 'invisible' : ''}
                  >
                    <ArrowDown aria-hidden="true" className="size-5" />
                  </Button>
                </span>
              </div>
              {row.onStrip ? (
                <TextField
                  label={t('steps', { name })}
                  inputMode="text"
                  autoComplete="off"
                  value={row.steps}
                  onChange={(event) => change(row.quantity, { steps: event.target.value })}
                  problem={problem === undefined ? undefined : t(`problem.${problem}`, { most: mostSteps })}
                />
              ) : null}
            </li>
          );
        })}
      </ol>
      {tried && needsBoth ? (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {t('needsBoth')}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-2.5">
        <Button variant="primary" onClick={keep}>
          {t('keep')}
        </Button>
        <Button onClick={onLeave}>{common('cancel')}</Button>
      </div>
    </section>
  );
}

/** The pads of the bottle first, then those it does not have. */
function rowsOf(bottle: Bottle, locale: string): Row[] {
  const text = (steps: readonly number[]) =>
    steps.map((step) => formatForInput(step, 'totalAlkalinity', 'mg/L', locale)).join('  ');
  const missing = padQuantities.filter((quantity) => !bottle.some((pad) => pad.quantity === quantity));
  return [
    ...bottle.map(({ quantity, steps }) => ({ quantity, onStrip: true, steps: text(steps) })),
    ...missing.map((quantity) => ({
      quantity,
      onStrip: false,
      steps: text(firstBottle.find((pad) => pad.quantity === quantity)?.steps ?? []),
    })),
  ];
}
