import {
  amountToReach,
  chlorineSpecies,
  constantsOfLedger,
  ledgerOf,
  newLedgerState,
  pHOfLedger,
  saturationIndex,
  solveLedger,
  type WaterAnalysis,
} from '@/lib/chemistry';

/** `run(n)` does the work n times and returns something that depends on it, so that no compiler leaves it out. */
export type Bench = { name: string; run: (n: number) => number };

const waters: readonly WaterAnalysis[] = Array.from({ length: 64 }, (_, index) => ({
  freeChlorine: 1 + (index % 8),
  combinedChlorine: 0.2,
  pH: 7.2 + (index % 7) / 10,
  totalAlkalinity: 70 + index,
  calciumHardness: 150 + 3 * index,
  cyanuricAcid: 30 + index,
  temperature: 20 + (index % 12),
  dissolvedSolids: 800 + 10 * index,
}));
const ledgers = waters.map((water) => ledgerOf(water));

function repeat(n: number, work: (index: number) => number): number {
  let sum = 0;
  for (let index = 0; index < n; index += 1) sum += work(index & 63);
  return sum;
}

/** Targets (design/engine.md, section 4): chlorineSpecies 0.5 microseconds, pH of a ledger 2. */
export const benches: readonly Bench[] = [
  {
    name: 'chlorineSpecies, input checks included',
    run: (n) => repeat(n, (index) => chlorineSpecies(waters[index]!).hypochlorousAcid),
  },
  { name: 'pH of a ledger, constants and all', run: (n) => repeat(n, (index) => pHOfLedger(ledgers[index]!)) },
  {
    name: 'pH of a ledger in an integrator (constants held, last state as guess)',
    run: (n) => {
      const ledger = { ...ledgers[0]! };
      const constants = constantsOfLedger(ledger);
      const state = newLedgerState();
      const { alkalinity } = ledger;
      return repeat(n, (index) => {
        // About what an hour of sun does: 0.05 mg/L of chlorine used up, a few thousandths of pH.
        ledger.alkalinity = alkalinity - 7e-7 * index;
        solveLedger(ledger, constants, state);
        return state.pH;
      });
    },
  },
  { name: 'saturationIndex', run: (n) => repeat(n, (index) => saturationIndex(waters[index]!)) },
  {
    name: 'amountToReach a pH with acid',
    run: (n) =>
      repeat(n, (index) =>
        amountToReach(waters[index]!, 75, { substance: 'hydrochloric-acid' }, { quantity: 'pH', value: 7.1 }),
      ),
  },
];
