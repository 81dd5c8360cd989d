import { describe, expect, it } from 'vitest';
import {
  aerateToEquilibrium,
  carbonDioxideExcess,
  constantsOfLedger,
  ledgerOf,
  newLedgerState,
  solveLedger,
} from '@/lib/chemistry';
import { ErrorReport, referenceRows } from './reference-table';

// Source: tests/reference/outgassing.csv, made with PHREEQC 3.8.8 (USGS): hardness 200, no chlorine, log pCO2 -3.38.
const report = new ErrorReport('outgassing.csv');

describe('carbon dioxide, against PHREEQC', () => {
  it('every row: pH at balance with the air within 0.02, CO2(aq) within 2.5 %', () => {
    const rows = referenceRows('outgassing.csv');
    for (const row of rows) {
      const id = row.text('id');
      const water = {
        freeChlorine: 0,
        cyanuricAcid: row.number('cya'),
        pH: row.number('ph'),
        temperature: row.number('temp_c'),
        dissolvedSolids: row.number('tds'),
        totalAlkalinity: row.number('ta'),
        calciumHardness: 200,
      };
      const aired = aerateToEquilibrium(water);
      const pH = report.note('ph_at_air_equilibrium', aired.pH - row.number('ph_at_air_equilibrium'));
      expect(Math.abs(pH), id).toBeLessThanOrEqual(0.02);
      expect(aired.totalAlkalinity, id).toBeCloseTo(water.totalAlkalinity, 9);

      const ledger = ledgerOf(water);
      const state = newLedgerState();
      solveLedger(ledger, constantsOfLedger(ledger), state);
      const dioxide = report.note('co2aq_mmol', (state.carbonDioxide * 1000) / row.number('co2aq_mmol') - 1);
      expect(Math.abs(dioxide), id).toBeLessThanOrEqual(0.025);
      const excess = carbonDioxideExcess(ledger, water.pH) * 1000;
      const tolerance = 0.025 * row.number('co2aq_mmol');
      expect(Math.abs(report.note('co2_excess_mmol', excess - row.number('co2_excess_mmol'))), id).toBeLessThanOrEqual(
        tolerance,
      );
    }
    expect(rows.length).toBeGreaterThanOrEqual(100);
  });
});
