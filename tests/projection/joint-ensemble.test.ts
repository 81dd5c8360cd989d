import { describe, expect, it } from 'vitest';
import { analysisOf } from '@/lib/chemistry';
import { settingOf } from '@/lib/projection';
import { ensembleOf, isQuantity } from '@/lib/projection/ensemble';
import { priorSigma } from '@/lib/projection/parameters';
import { jointOrder } from '@/lib/schemas/posterior';
import { aPool, someWater } from './pools';

const water = someWater();
const setting = settingOf(aPool(), water.temperature);
const errors = { freeChlorine: 0.3, pH: 0.1, totalAlkalinity: 10, calciumHardness: 10, cyanuricAcid: 15 };
const sigmaOf = (name: (typeof jointOrder)[number]) => (isQuantity(name) ? errors[name] : priorSigma[name]);
const diagonal = jointOrder.map((name, row) =>
  jointOrder.map((_, column) => (row === column ? sigmaOf(name) ** 2 : 0)),
);

describe('an ensemble with a joint covariance', () => {
  it('is the independent one where the covariance is diagonal', () => {
    const independent = ensembleOf(water, errors, [], setting);
    const joint = ensembleOf(water, errors, [], setting, { covariance: diagonal });
    joint.forEach(({ start, setting: { parameters } }, index) => {
      const other = independent[index]!;
      for (const name of ['sunStrength', 'volume', 'tabletLife'] as const)
        expect(parameters[name] / other.setting.parameters[name]).toBeCloseTo(1, 9);
      expect(start.ledger.freeChlorine).toBeCloseTo(other.start.ledger.freeChlorine, 9);
      expect(start.ledger.inorganicCarbon).toBeCloseTo(other.start.ledger.inorganicCarbon, 9);
    });
  });

  it('draws members that go together as the covariance says', () => {
    const sun = jointOrder.indexOf('sunStrength');
    const dark = jointOrder.indexOf('darkDemand');
    const chlorine = jointOrder.indexOf('freeChlorine');
    const covariance = diagonal.map((row) => [...row]);
    covariance[sun]![dark] = covariance[dark]![sun] = -0.9 * 0.25 * 0.5;
    covariance[chlorine]![dark] = covariance[dark]![chlorine] = 0.3 * 0.3 * 0.5;
    const drawn = ensembleOf(water, errors, [], setting, { covariance, size: 1024 }).map((member) => [
      Math.log(member.setting.parameters.sunStrength / setting.parameters.sunStrength),
      Math.log(member.setting.parameters.darkDemand / setting.parameters.darkDemand),
      member.start.ledger.freeChlorine - water.freeChlorine,
    ]);
    const mean = (value: (row: number[]) => number) => drawn.reduce((sum, row) => sum + value(row), 0) / drawn.length;
    expect(mean(([a, b]) => a! * b!)).toBeCloseTo(-0.9 * 0.25 * 0.5, 2);
    expect(mean(([, b, c]) => b! * c!)).toBeCloseTo(0.3 * 0.3 * 0.5, 2);
    expect(mean(([a]) => a! ** 2)).toBeCloseTo(0.0625, 3);
    expect(mean(([, b]) => b! ** 2)).toBeCloseTo(0.25, 2);
  });

  it('keeps each member a water that can be', () => {
    for (const { start } of ensembleOf(water, errors, [], setting, { covariance: diagonal }))
      expect(Number.isFinite(analysisOf(start.ledger).pH)).toBe(true);
  });
});
