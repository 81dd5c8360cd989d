import { describe, expect, it } from 'vitest';
import {
  activityCoefficients,
  debyeHuckelCoefficient,
  dielectricConstant,
  ionicStrengthOf,
  waterActivity,
} from '@/lib/chemistry/activity';
import {
  boricAcidDissociation,
  calciumBicarbonatePairing,
  calciumCarbonatePairing,
} from '@/lib/chemistry/published-constants';
import { hydrochloricAcidDensity } from '@/lib/chemistry/substances';
import { referenceRows } from './reference-table';

describe('activities', () => {
  it('dielectric constant of water: 87.74 at 0, 78.30 at 25, 69.88 at 50 deg C (Malmberg & Maryott 1956, table)', () => {
    expect(dielectricConstant(0)).toBeCloseTo(87.74, 2);
    expect(dielectricConstant(25)).toBeCloseTo(78.3, 2);
    expect(dielectricConstant(50)).toBeCloseTo(69.88, 1);
  });

  it('Debye-Hueckel coefficient: 0.49 at 0, 0.51 at 25 deg C (Stumm & Morgan)', () => {
    expect(debyeHuckelCoefficient(0)).toBeCloseTo(0.49, 2);
    expect(debyeHuckelCoefficient(25)).toBeCloseTo(0.51, 2);
  });

  it('Davies coefficients of one and two charges at I 0.1: 0.78 and 0.37 (Stumm & Morgan, table 3.3)', () => {
    const { single, double, triple, neutral } = activityCoefficients(25, 0.1);
    expect(single).toBeCloseTo(0.78, 2);
    expect(double).toBeCloseTo(0.37, 2);
    expect(triple).toBeCloseTo(single ** 9, 12);
    expect(neutral).toBeCloseTo(10 ** 0.01, 12);
    expect(activityCoefficients(25, 0.1, 'ideal')).toEqual({ neutral: 1, single: 1, double: 1, triple: 1 });
  });

  it('ionic strength from dissolved solids: within a fifth of every row of hocl.csv, whose salt is sodium chloride', () => {
    for (const row of referenceRows('hocl.csv')) {
      const ratio = ionicStrengthOf(row.number('tds')) / row.number('ionic_strength');
      expect(ratio, row.text('id')).toBeGreaterThan(0.8);
      expect(ratio, row.text('id')).toBeLessThan(1.25);
    }
  });

  it('activity of water over half-molar sodium chloride: 0.983 (Robinson & Stokes)', () => {
    expect(waterActivity(0.5)).toBeCloseTo(0.983, 3);
  });
});

describe('constants without a row in the tables', () => {
  it('ion pairs at 25 deg C: 1.11 and 3.22 (Plummer & Busenberg 1982)', () => {
    expect(calciumBicarbonatePairing(298.15)).toBeCloseTo(1.11, 2);
    expect(calciumCarbonatePairing(298.15)).toBeCloseTo(3.22, 2);
  });

  it('boric acid: -9.24 at 25 deg C, stronger when warm (phreeqc.dat)', () => {
    expect(boricAcidDissociation(298.15)).toBeCloseTo(-9.24, 12);
    expect(boricAcidDissociation(308.15)).toBeCloseTo(-9.163, 3);
  });

  it('hydrochloric acid of 31.45 % weighs 1.16 g/mL', () => {
    expect(hydrochloricAcidDensity(31.45)).toBeCloseTo(1.16, 3);
  });
});
