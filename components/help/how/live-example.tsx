'use client';

import { useTranslations } from 'next-intl';
import { useDeferredValue, useState } from 'react';
import { Button } from '@/components/ui/button';
import { RulerSlider } from '@/components/ui/ruler-slider';
import { useHydrated } from '@/components/ui/use-hydrated';
import { examples } from '@/lib/client/worked-out/examples/all-examples';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { ExampleFigures } from './example-figures';
import { ExamplePicture } from './example-picture';
import { useWritten } from './use-written';

/** Sliders over the very functions that work the week out. Without JavaScript it shows what follows from where they stand. */
export function LiveExample({ page }: { page: HowPage }) {
  const t = useTranslations('how-examples');
  const written = useWritten();
  const hydrated = useHydrated();
  const example = examples[page];
  const start = example?.inputs.map((input) => input.start) ?? [];
  const [values, setValues] = useState<readonly number[]>(start);
  const shown = useDeferredValue(values);
  if (example === undefined) return null;
  const worked = example.work(shown);
  const moved = values.some((value, index) => value !== start[index]);
  return (
    <section aria-labelledby="example" className="border-t border-ink pt-3.5">
      <div className="flex flex-wrap items-baseline justify-between gap-x-8">
        <h2 id="example" className="font-display text-section">
          {t('title')}
        </h2>
        <p className="flex-1 text-small text-ink-2">
          {t('lead')} <b className="font-strong">{t('notADose')}</b>
        </p>
        {moved ? (
          <Button variant="quiet" size="small" onClick={() => setValues(start)}>
            {t('putBack')}
          </Button>
        ) : null}
      </div>
      <noscript>
        <p className="mt-1 text-small text-ink-2">{t('still')}</p>
      </noscript>
      {/* What is moved before React listens would jump back. */}
      <div inert={!hydrated} className="mt-3 grid gap-x-8 gap-y-1 sm:grid-cols-2 lg:grid-cols-4">
        {example.inputs.map((input, index) => {
          const value = values[index] ?? input.start;
          return (
            <RulerSlider
              key={input.name}
              label={t(
                page === 'liquid-strength' && input.name === 'temperature'
                  ? 'storedTemperature'
                  : `input.${input.name}`,
              )}
              value={value}
              shown={<b className="font-display text-name text-ink">{written(value, input)}</b>}
              spoken={written(value, input)}
              least={input.low}
              most={input.high}
              step={input.step}
              lines={evenly(input)}
              onChange={(next) => setValues(values.map((old, at) => (at === index ? next : old)))}
            />
          );
        })}
      </div>
      <ExampleFigures worked={worked} />
      {worked.curve === undefined ? null : <ExamplePicture page={page} curve={worked.curve} />}
    </section>
  );
}

const RULER_PARTS = 8;

/** Lines that part a range evenly. */
function evenly({ low, high }: { low: number; high: number }): number[] {
  return Array.from({ length: RULER_PARTS + 1 }, (_, part) => low + ((high - low) * part) / RULER_PARTS);
}
