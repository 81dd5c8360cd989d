import { poolSize } from '@/lib/units/volume';
import type { Example } from './example';

export const volumeExample: Example<'length' | 'width' | 'shallow' | 'deep'> = {
  inputs: [
    { name: 'length', low: 3, high: 20, step: 0.5, start: 9, unit: 'm', decimals: 1 },
    { name: 'width', low: 2, high: 10, step: 0.5, start: 4.5, unit: 'm', decimals: 1 },
    { name: 'shallow', low: 0.6, high: 2, step: 0.1, start: 1.1, unit: 'm', decimals: 1 },
    { name: 'deep', low: 0.6, high: 3.5, step: 0.1, start: 1.9, unit: 'm', decimals: 1 },
  ],
  work({ length, width, shallow, deep }) {
    const ends = { shallow: Math.min(shallow, deep), deep: Math.max(shallow, deep) };
    const slope = { floor: 'slope', ...ends } as const;
    const volumeOf = (shape: Parameters<typeof poolSize>[0], floor: Parameters<typeof poolSize>[1] = slope) =>
      poolSize(shape, floor).volume;
    const box = { shape: 'rectangle', length, width } as const;
    return {
      figures: [
        { name: 'rectangle', value: volumeOf(box), unit: 'm3', decimals: 1 },
        { name: 'dropOff', value: volumeOf(box, { floor: 'drop-off', ...ends }), unit: 'm3', decimals: 1 },
        { name: 'oval', value: volumeOf({ shape: 'oval', length, width }), unit: 'm3', decimals: 1 },
        {
          name: 'kidney',
          value: volumeOf({ shape: 'freeform', length, widthA: width, widthB: width }),
          unit: 'm3',
          decimals: 1,
        },
      ],
    };
  },
};
