import type { HowPage } from '../how-page';
import { alkalinityExample } from './alkalinity';
import { calciumExample } from './calcium';
import { chlorineForms } from './chlorine-forms';
import { combinedChlorineExample } from './combined-chlorine';
import type { Input, InputName, Worked } from './example';
import { freeChlorine } from './free-chlorine';
import { evaporationExample } from './evaporation';
import { learningExample } from './learning';
import { likelyRangeExample } from './likely-range';
import { liquidStrengthExample } from './liquid-strength';
import { pHExample } from './ph';
import { stabilizerExample } from './stabilizer';
import { sunExample } from './sun';
import { swimmersExample } from './swimmers';
import { tabletsExample } from './tablets';
import { volumeExample } from './volume';
import type { Example } from './example';

/** An example whose sliders are not known by name: what moves is handed over in their order. */
export type OpenExample = { inputs: readonly Input[]; work: (values: readonly number[]) => Worked };

function open<Name extends InputName>({ inputs, work }: Example<Name>): OpenExample {
  const named = (values: readonly number[]) =>
    Object.fromEntries(inputs.map(({ name, start }, index) => [name, values[index] ?? start])) as Record<Name, number>;
  return { inputs, work: (values) => work(named(values)) };
}

/** The pages that have an example. */
export const examples: Partial<Record<HowPage, OpenExample>> = {
  'free-chlorine': open(freeChlorine),
  'chlorine-forms': open(chlorineForms),
  stabilizer: open(stabilizerExample),
  sun: open(sunExample),
  tablets: open(tabletsExample),
  swimmers: open(swimmersExample),
  'combined-chlorine': open(combinedChlorineExample),
  ph: open(pHExample),
  alkalinity: open(alkalinityExample),
  calcium: open(calciumExample),
  'likely-range': open(likelyRangeExample),
  'liquid-strength': open(liquidStrengthExample),
  volume: open(volumeExample),
  learning: open(learningExample),
  evaporation: open(evaporationExample),
};
