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
import { inTurn, type Piece } from './piece';

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

/** What about an hour of sun does: 0.05 mg/L of chlorine used up, a few thousandths of pH. */
const hoursOfSun = Array.from({ length: 64 }, (_, hour) => {
  const ledger = { ...ledgers[0]! };
  ledger.alkalinity -= 7e-7 * hour;
  return ledger;
});
const constants = constantsOfLedger(ledgers[0]!);
const state = newLedgerState();

export const chemistryPieces: readonly Piece[] = [
  {
    name: 'chlorineSpecies, input checks included',
    target: 0.5e-3,
    run: inTurn(waters, (water) => chlorineSpecies(water).hypochlorousAcid),
  },
  {
    name: 'pH of a ledger, its constants included',
    target: 2e-3,
    run: inTurn(ledgers, (ledger) => pHOfLedger(ledger)),
  },
  {
    name: 'pH of a ledger inside a week',
    run: inTurn(hoursOfSun, (ledger) => {
      solveLedger(ledger, constants, state);
      return state.pH;
    }),
  },
  { name: 'saturationIndex', run: inTurn(waters, saturationIndex) },
  {
    name: 'amountToReach a pH with acid',
    run: inTurn(waters, (water) =>
      amountToReach(water, 75, { substance: 'hydrochloric-acid' }, { quantity: 'pH', value: 7.1 }),
    ),
  },
];
