'use client';

import { type ComponentType, useEffect, useRef, useState } from 'react';
import { whenLeftAlone } from '@/components/ui/when-left-alone';
import { type SampleWater, type SampleWeek, startingSample } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import type { LiveSampleProps } from './live-sample';

type Props = {
  start: SampleWeek | undefined;
  unitSystem: UnitSystem;
  /** The same sheet as the server drew it. */
  children: React.ReactNode;
};
type Live = { Sheet: ComponentType<LiveSampleProps>; begin: LiveSampleProps['begin'] };

/**
 * Shows what the server drew, and puts the sheet that follows the sliders in its place when the page has been left alone for
 * a while or somebody begins to use it: never while a slider is held, and from where the sliders then stand.
 */
export function SampleSlot({ start, unitSystem, children }: Props) {
  const drawn = useRef<HTMLDivElement>(null);
  const [live, setLive] = useState<Live>();
  useEffect(
    () =>
      whenLeftAlone(() => {
        // Without an answer the drawn sheet stays; it is asked for again with the page.
        void load(drawn).then(setLive, () => undefined);
      }),
    [],
  );
  if (live !== undefined) return <live.Sheet start={start} unitSystem={unitSystem} begin={live.begin} />;
  return <div ref={drawn}>{children}</div>;
}

async function load(drawn: React.RefObject<HTMLDivElement | null>): Promise<Live> {
  const { default: Sheet } = await import('./live-sample');
  const held = drawn.current?.querySelector('input:active');
  if (held) await new Promise((release) => held.addEventListener('change', release, { once: true }));
  return { Sheet, begin: standOf(drawn.current) };
}

function standOf(drawn: HTMLDivElement | null): LiveSampleProps['begin'] {
  const sliders = [...(drawn?.querySelectorAll<HTMLInputElement>('input[type=range]') ?? [])];
  const water: SampleWater = { ...startingSample };
  for (const { name, valueAsNumber } of sliders) if (name in water) water[name as keyof SampleWater] = valueAsNumber;
  const { activeElement } = document;
  return { water, moved: sliders.find((slider) => slider === activeElement)?.name };
}
