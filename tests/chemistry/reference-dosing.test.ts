import { describe, expect, it } from 'vitest';
import {
  addDose,
  aerateToEquilibrium,
  type Dose,
  useUpChlorine as afterUseOf,
  type WaterAnalysis,
} from '@/lib/chemistry';
import { ErrorReport, referenceRows, type ReferenceRow } from './reference-table';

// Sources: tests/reference/dosing-ph.csv and chlorine-use.csv, made with PHREEQC 3.8.8 (USGS): one dose into closed,
// mixed water; then the same chlorine used up.
const dosing = new ErrorReport('dosing-ph.csv');
const use = new ErrorReport('chlorine-use.csv');

function waterOf(row: ReferenceRow): WaterAnalysis {
  return {
    freeChlorine: row.number('fc0'),
    cyanuricAcid: row.number('cya0'),
    pH: row.number('ph0'),
    temperature: row.number('temp_c'),
    dissolvedSolids: row.number('tds0'),
    totalAlkalinity: row.number('ta0'),
    calciumHardness: row.number('ch0'),
  };
}

/** What the table calls `product`, for 1 m3: the dose is mg/L of chlorine for chlorine products, else g or mL per m3. */
function doseOf(product: string, dose: number): Dose {
  const doses: Record<string, Dose> = {
    'hcl_31.45': { substance: 'hydrochloric-acid', amount: dose, strength: 31.45 },
    nahco3: { substance: 'sodium-bicarbonate', amount: dose },
    na2co3: { substance: 'sodium-carbonate', amount: dose },
    cya: { substance: 'cyanuric-acid', amount: dose },
    cacl2_77: { substance: 'calcium-chloride', amount: dose, strength: 77 },
    'naocl_12.5_pure': { substance: 'sodium-hypochlorite', amount: dose / 0.125, strength: 12.5 },
    'naocl_12.5_0.3naoh': { substance: 'sodium-hypochlorite', amount: dose / 0.125, strength: 12.5, alkali: 0.3 },
    cahypo_65_inert: { substance: 'calcium-hypochlorite', amount: dose / 0.65, strength: 65 },
    cahypo_65_4caoh2: { substance: 'calcium-hypochlorite', amount: dose / 0.65, strength: 65, alkali: 4 },
    trichlor: { substance: 'trichlor', amount: dose / 0.9153 },
    dichlor: { substance: 'dichlor', amount: dose / 0.554 },
  };
  const found = doses[product];
  if (found === undefined) throw new Error(`The table has a product this test does not know: ${product}`);
  return found;
}

describe('water after a dose, against PHREEQC', () => {
  it('every row of dosing-ph.csv: pH worst 0.015, RMS 0.005; the rest within 0.3 mg/L', () => {
    const rows = referenceRows('dosing-ph.csv');
    for (const row of rows) {
      const product = row.text('product');
      const after =
        product === 'aeration'
          ? aerateToEquilibrium(waterOf(row))
          : addDose(waterOf(row), 1, doseOf(product, row.number('dose')));
      const id = `${row.text('id')} ${product}`;
      expect(Math.abs(dosing.note('ph1', after.pH - row.number('ph1'))), id).toBeLessThanOrEqual(0.015);
      for (const [column, value] of [
        ['ta1', after.totalAlkalinity],
        ['ch1', after.calciumHardness],
        ['cya1', after.cyanuricAcid],
        ['fc1', after.freeChlorine],
      ] as const) {
        expect(Math.abs(dosing.note(column, value - row.number(column))), `${id} ${column}`).toBeLessThanOrEqual(0.3);
      }
    }
    expect(rows.length).toBeGreaterThanOrEqual(96);
    expect(dosing.rms('ph1')).toBeLessThanOrEqual(0.005);
  });

  it('every row of chlorine-use.csv: dosed, then used up', () => {
    const rows = referenceRows('chlorine-use.csv');
    for (const row of rows) {
      const product = row.text('product');
      const amount = row.number('fc_dosed');
      const before = waterOf(row);
      const dosed = product === 'none' ? before : addDose(before, 1, doseOf(product, amount));
      const used = afterUseOf(dosed, amount);
      const id = `${row.text('id')} ${product}`;
      expect(Math.abs(use.note('ph_dosed', dosed.pH - row.number('ph_dosed'))), id).toBeLessThanOrEqual(0.015);
      expect(Math.abs(use.note('ph_used', used.pH - row.number('ph_used'))), id).toBeLessThanOrEqual(0.015);
      for (const [column, value] of [
        ['ta_dosed', dosed.totalAlkalinity],
        ['ta_used', used.totalAlkalinity],
        ['cya_used', used.cyanuricAcid],
        ['ch_used', used.calciumHardness],
        ['fc_used_total', used.freeChlorine],
      ] as const) {
        expect(Math.abs(use.note(column, value - row.number(column))), `${id} ${column}`).toBeLessThanOrEqual(0.3);
      }
      const net = (used.totalAlkalinity - before.totalAlkalinity) / amount;
      expect(Math.abs(use.note('dta_net_per_ppm', net - row.number('dta_net_per_ppm'))), id).toBeLessThanOrEqual(0.001);
    }
    expect(rows.length).toBeGreaterThanOrEqual(57);
    expect(use.rms('ph_dosed')).toBeLessThanOrEqual(0.005);
    expect(use.rms('ph_used')).toBeLessThanOrEqual(0.005);
  });
});
