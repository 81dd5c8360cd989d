import { describe, expect, it } from 'vitest';
import { langelierIndex, saturationIndex, type WaterAnalysis } from '@/lib/chemistry';
import { ErrorReport, referenceRows, type ReferenceRow } from './reference-table';

// Source: tests/reference/calcite-si.csv, made with PHREEQC 3.8.8 (USGS), phreeqc.dat as shipped.
const report = new ErrorReport('calcite-si.csv');
const rows = referenceRows('calcite-si.csv');

function waterOf(row: ReferenceRow): WaterAnalysis {
  return {
    freeChlorine: 0,
    cyanuricAcid: row.number('cya'),
    pH: row.number('ph'),
    temperature: row.number('temp_c'),
    dissolvedSolids: row.number('tds'),
    totalAlkalinity: row.number('ta'),
    calciumHardness: row.number('ch'),
  };
}

describe('saturation index of calcite, against PHREEQC', () => {
  it('every row: worst 0.045, RMS 0.017', () => {
    for (const row of rows) {
      const error = report.note('si_calcite', saturationIndex(waterOf(row)) - row.number('si_calcite'));
      expect(Math.abs(error), row.text('id')).toBeLessThanOrEqual(0.045);
    }
    expect(rows.length).toBeGreaterThanOrEqual(120);
    expect(report.rms('si_calcite')).toBeLessThanOrEqual(0.017);
  });

  it("the handbook's formula, with total alkalinity as it stands: to the digits of the table", () => {
    for (const row of rows) {
      const error = report.note('lsi_carrier_ta', langelierIndex(waterOf(row)) - row.number('lsi_carrier_ta'));
      expect(Math.abs(error), row.text('id')).toBeLessThanOrEqual(0.0002);
    }
  });
});
