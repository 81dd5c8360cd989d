import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tabletOf } from '@/lib/planner/product-facts';
import { erode, erodedShareAt, lifeOf, loadOfMass, massLeft } from '@/lib/projection/tablets';

const whole = { tabletMass: 227, count: 3, strength: 90, erodedShare: 0 };

describe('massLeft', () => {
  it.each([
    // m / m0 = (1 - s / 3)^2 (1 - s) by hand.
    [0, 1],
    [0.25, (11 / 12) ** 2 * 0.75],
    [0.5, (5 / 6) ** 2 * 0.5],
    [1, 0],
  ])('at %d of its life is %d', (share, left) => expect(massLeft(share)).toBeCloseTo(left, 12));

  it('holds still before and after its life', () => {
    expect(massLeft(-1)).toBe(1);
    expect(massLeft(2)).toBe(0);
  });

  it('is the volume of a disc, half as thick as a third of its radius, that loses the same depth everywhere', () => {
    const radius = 3;
    const halfThickness = radius / 3;
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (share) => {
        const depth = share * halfThickness;
        const volume = (r: number, h: number) => Math.PI * r ** 2 * 2 * h;
        const left = volume(radius - depth, halfThickness - depth) / volume(radius, halfThickness);
        expect(massLeft(share)).toBeCloseTo(left, 12);
      }),
    );
  });

  it('is undone by erodedShareAt', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (share) => {
        expect(massLeft(erodedShareAt(share))).toBeCloseTo(share, 9);
      }),
    );
  });
});

describe('lifeOf', () => {
  it('is the same for 200 to 230 g and goes with the cube root outside', () => {
    expect([200, 215, 230].map((mass) => lifeOf(mass, 48))).toEqual([48, 48, 48]);
    expect(lifeOf(25, 48)).toBeCloseTo(48 * (25 / 200) ** (1 / 3), 12);
    expect(lifeOf(460, 48)).toBeCloseTo(48 * 2 ** (1 / 3), 12);
  });
});

describe('loadOfMass', () => {
  const usual = { tabletMass: 227, strength: 90 };

  it('makes a mass up from as few tablets as can be, eroded alike', () => {
    const load = loadOfMass(300, usual);
    expect(load).toMatchObject({ count: 2, tabletMass: 227, strength: 90 });
    expect(2 * 227 * massLeft(load!.erodedShare)).toBeCloseTo(300, 6);
    expect(loadOfMass(227, usual)).toMatchObject({ count: 1, erodedShare: expect.closeTo(0, 9) as number });
    expect(loadOfMass(0, usual)).toBeUndefined();
  });
});

describe('erode', () => {
  it('releases what the formula says, its stabilizer with it, and all of it in the end', () => {
    const loads = [{ ...whole }];
    const release = erode(loads, 12, 24, { tabletLife: 48, volume: 60 });
    const chlorine = (3 * 227 * 0.9 * (1 - massLeft(0.25))) / 60 / 24;
    expect(release.chlorine).toBeCloseTo(chlorine, 12);
    // 0.607 mg/L of cyanuric acid for each mg/L of chlorine: Wahman and Alexander 2019.
    expect((release.cyanurate * 129_074) / release.chlorine).toBeCloseTo(0.607, 3);
    erode(loads, 100, 24, { tabletLife: 48, volume: 60 });
    expect(loads[0]!.erodedShare).toBe(1);
    expect(erode(loads, 24, 24, { tabletLife: 48, volume: 60 }).chlorine).toBe(0);
  });
});

describe('tablets that are not trichlor', () => {
  const parameters = { tabletLife: 48, volume: 50 };
  const releaseOf = (substance: 'calcium-hypochlorite' | 'dichlor', strength: number) => {
    const load = { ...tabletOf(substance, { strength }), count: 2, erodedShare: 0 };
    // Half the life and a step of 6 h: rates times hours is what went into the water.
    const release = erode([load], 24, 6, parameters);
    return { release, mass: 2 * 227 * (1 - massLeft(0.5)) };
  };

  // Ca(OCl)2: A+2, FC+2, Ca+1 for each mol; available chlorine is 2 Cl2.
  it('of calcium hypochlorite bring calcium and alkalinity and no stabilizer', () => {
    const { release, mass } = releaseOf('calcium-hypochlorite', 65);
    const chlorine = (mass * 0.65) / 50;
    expect(release.chlorine * 6).toBeCloseTo(chlorine, 9);
    expect(release.cyanurate).toBe(0);
    const moles = chlorine / 1000 / 70.906;
    expect(release.calcium * 6).toBeCloseTo(moles / 2, 8);
    expect(release.alkalinity * 6).toBeCloseTo(moles, 8);
  });

  it('of dichlor bring half a mol of stabilizer for each mol of chlorine', () => {
    const { release, mass } = releaseOf('dichlor', 56);
    expect(release.chlorine * 6).toBeCloseTo((mass * 0.56) / 50, 9);
    expect(release.cyanurate * 6).toBeCloseTo((release.chlorine * 6) / 1000 / 70.906 / 2, 8);
    expect(release.calcium).toBe(0);
  });
});
