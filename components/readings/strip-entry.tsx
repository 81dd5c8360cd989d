'use client';

import { MoveHorizontal, Settings2, Sigma } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import type { Bottle } from './bottle';
import { BottleEditor } from './bottle-editor';
import { combinedOf, type Entered, middleOf } from './entered';
import { quickQuantities } from './quantities';
import { useReadingSetting } from './reading-setting';
import { StripPad } from './strip-pad';
import type { TestDraft } from './test-draft-schema';
import { useValueWords } from './use-value-words';

/** The strip as it is held: its pads from the top down, each beside its printed steps. */
export function StripEntry({
  draft,
  change,
  entered,
  bottle,
  onBottle,
}: {
  draft: TestDraft;
  change: (part: Partial<TestDraft>) => void;
  entered: Entered;
  bottle: Bottle;
  onBottle: (bottle: Bottle) => void;
}) {
  const t = useTranslations('readings');
  const { locale } = useReadingSetting();
  const words = useValueWords();
  const [editing, setEditing] = useState(false);
  const pads = draft.kind === 'quick' ? bottle.filter(({ quantity }) => quickQuantities.includes(quantity)) : bottle;
  const combined = combinedOf(entered.totalChlorine, entered.freeChlorine);

  if (editing)
    return (
      <BottleEditor
        bottle={bottle}
        onKeep={(next) => {
          onBottle(next);
          setEditing(false);
        }}
        onLeave={() => setEditing(false)}
      />
    );
  return (
    <>
      <ol>
        {pads.map(({ quantity, steps }, index) => {
          const read = draft.strip[quantity];
          const value = read && (read.low === read.high ? read.low : read);
          return (
            <li key={quantity} className="grid grid-cols-[26px_1fr] gap-x-3.5">
              <PadDrawing read={read !== undefined} first={index === 0} last={index === pads.length - 1} />
              <div className="pt-1 pb-3">
                <StripPad
                  label={words.name(quantity)}
                  aside={
                    value === undefined
                      ? t(quantity === 'cyanuricAcid' ? 'strip.tubeDecides' : 'notMeasured')
                      : words.printed(value, quantity)
                  }
                  steps={steps}
                  value={read}
                  locale={locale}
                  onChange={(next) => change({ strip: { ...draft.strip, [quantity]: next } })}
                />
              </div>
            </li>
          );
        })}
      </ol>
      <p className="mt-2 flex gap-2.5 border-t border-rule pt-2.5 text-small text-ink-2">
        <MoveHorizontal aria-hidden="true" className="mt-px size-4.75 shrink-0 text-ink" />
        {t('strip.seam')}
      </p>
      {combined === undefined ? null : (
        <p className="mt-2 flex gap-2.5 text-small text-ink-2">
          <Sigma aria-hidden="true" className="mt-px size-4.75 shrink-0 text-ink" />
          {middleOf(combined) === 0
            ? t('combined.none')
            : t('combined.some', { value: words.printed(combined, 'totalChlorine') })}
        </p>
      )}
      <Button variant="quiet" className="mt-0.5" onClick={() => setEditing(true)}>
        <Settings2 aria-hidden="true" className="size-4.75" />
        {t('bottle.open')}
      </Button>
    </>
  );
}

/** A piece of the drawn strip: dashed until its pad is read, then ink; never a kit's colours. */
function PadDrawing({ read, first, last }: { read: boolean; first: boolean; last: boolean }) {
  return (
    <span
      aria-hidden="true"
      className={classNames(
        'flex justify-center border-x-control border-ink bg-paper-lift pt-3 pb-2',
        first && 'rounded-t-[2px] border-t-control',
        last && 'rounded-b-[2px] border-b-control',
      )}
    >
      <span className={classNames('h-10 w-3.5 border-[1.3px] border-ink', read ? 'bg-ink-2' : 'border-dashed')} />
    </span>
  );
}
