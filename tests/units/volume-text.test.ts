import { describe, expect, it } from 'vitest';
import { parseVolume } from '@/lib/units/parse';

describe('the volume of a pool as people write it', () => {
  it.each([
    ['18,000', 18_000],
    ['18.000', 18_000],
    ['18 000', 18_000],
    ['18\u202f000', 18_000],
    ['1,234,567', 1_234_567],
    [' 18000 ', 18_000],
    ['68,1', 68.1],
    ['68.13', 68.13],
    ['0,5', 0.5],
    ['1234,567', 1234.567],
  ])('%s is %d', (text, volume) => {
    expect(parseVolume(text)).toBe(volume);
  });

  it.each(['', 'many', '18,00,000', '1,234.567', '18,000.5', '18 0000'])('"%s" is no volume', (text) => {
    expect(parseVolume(text)).toBeUndefined();
  });
});
