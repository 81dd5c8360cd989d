import { useTranslations } from 'next-intl';
import { RulerSlider } from '@/components/ui/ruler-slider';
import { type SampleWater, sampleWaters } from '@/lib/schemas/sample-water';
import { convert, type UnitSystem } from '@/lib/units/unit';
import { useSampleWords } from './use-sample-words';

type Props = {
  water: SampleWater;
  unitSystem: UnitSystem;
  /** Left out on the server, where the sliders move and nothing follows yet. */
  onChange?: (water: SampleWater) => void;
};

const names = ['volume', 'sunshine', 'stabilizer'] as const;

const range = (from: number, to: number, step: number) =>
  Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, index) => from + index * step);

const rulers = {
  volume: { figures: range(20, 120, 20), lines: range(20, 120, 10) },
  sunshine: { figures: range(2, 14, 2), lines: range(2, 14, 1) },
  stabilizer: { figures: range(10, 100, 10), lines: range(10, 100, 5) },
};

/** Size, sun and stabilizer of the pool that the sheet is tried on. */
export function SampleControls({ water, unitSystem, onChange }: Props) {
  const t = useTranslations('start.sample');
  const words = useSampleWords(unitSystem);
  const values = {
    // Both measures stand here: whoever moves it knows one of them.
    volume: t('volumeValue', { cubicMetres: water.volume, gallons: thousands(convert(water.volume, 'm3', 'us-gal')) }),
    sunshine: t('sunshineValue', { hours: water.sunshine }),
    stabilizer: words.milligrams(water.stabilizer),
  };
  return (
    <div className="grid gap-1.5 [@media(scripting:none)]:hidden">
      {names.map((name) => (
        <RulerSlider
          key={name}
          name={name}
          label={t(name)}
          shown={<FirstFigure text={values[name]} />}
          spoken={values[name]}
          {...sampleWaters[name]}
          {...rulers[name]}
          value={water[name]}
          {...(onChange && { onChange: (value: number) => onChange({ ...water, [name]: value }) })}
        />
      ))}
    </div>
  );
}

/** The figure large, what it counts small. */
function FirstFigure({ text }: { text: string }) {
  const [figure, ...rest] = text.split(' ');
  return (
    <>
      <b className="font-display text-dose text-ink">{figure}</b> {rest.join(' ')}
    </>
  );
}

function thousands(value: number): number {
  return Math.round(value / 1000) * 1000;
}
