import type { ChlorineSpecies, Ledger, LedgerState } from '@/lib/chemistry';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import type { Parameters } from './parameters';

/** Loss of each form of chlorine under the reference sun [1/h]. Source: Nowell and Hoigne 1992, Water Research 26:593. */
export const HYPOCHLOROUS_ACID_PHOTOLYSIS = 0.72;
export const HYPOCHLORITE_PHOTOLYSIS = 4.32;
/** How quickly water takes the active light away [1/m]. */
export const LIGHT_ATTENUATION = 0.15;
export const SHARE_BECOMING_COMBINED = 0.2;
/** Loss of combined chlorine, open and under a cover [1/h]; practice. */
export const COMBINED_LOSS_OPEN = 0.3 / 24;
export const COMBINED_LOSS_COVERED = 0.1 / 24;
export const CARBON_DIOXIDE_UNDER_COVER = 0.3;

/** What acts on the water in one step, means over it; see Forcing. */
export type Acting = {
  sun: number;
  covered: number;
  evaporation: number;
  rain: number;
  swimmers: number;
  temperature: number;
};

/**
 * What slow tablets release in one step, for each hour: chlorine and solids [mg/L/h], cyanurate and calcium [mol/L/h],
 * alkalinity [eq/L/h].
 */
export type TabletRelease = {
  chlorine: number;
  cyanurate: number;
  alkalinity: number;
  calcium: number;
  solids: number;
};

/** What comes in when water is topped up. */
export type FillWater = Pick<Ledger, 'alkalinity' | 'inorganicCarbon' | 'calcium' | 'dissolvedSolids'>;

/** Where the chlorine went [mg/L]: the sums over all steps. Dosed + released = used + combined + carried out + what is there. */
export type ChlorineAccount = { dosed: number; released: number; usedUp: number; combined: number; carriedOut: number };

/** Rates of one step; all but the last two hold through it, those come from the water's state. */
export type StepRates = {
  /** The part of the reference sun's light that acts on the water, mean over its depth [1]. */
  light: number;
  darkDemand: number;
  /** Speed at which CO2 leaves, over the depth [1/h]. */
  carbonTransfer: number;
  swimmerDemand: number;
  combinedLoss: number;
  /** Pool water leaving and fill water entering, as shares of the volume [1/h]. */
  outflow: number;
  inflow: number;
  release: TabletRelease;
  /** First-order loss of free chlorine to sun and dark demand [1/h]. */
  chlorineLoss: number;
  /** Inorganic carbon leaving as CO2 [mol/L/h]. */
  carbonLoss: number;
};

/**
 * Mean of the light over the depth, as a share of that at the surface: D = (1 - exp(-K d)) / (K d).
 *
 * @param depth mean depth [m], above 0
 */
export function lightThroughDepth(depth: number): number {
  const optical = LIGHT_ATTENUATION * depth;
  return -Math.expm1(-optical) / optical;
}

export const noRelease: TabletRelease = { chlorine: 0, cyanurate: 0, alkalinity: 0, calcium: 0, solids: 0 };

/** Rates to be filled by {@link holdRates} and {@link rateState}. */
export function newStepRates(): StepRates {
  return {
    light: 0,
    darkDemand: 0,
    carbonTransfer: 0,
    swimmerDemand: 0,
    combinedLoss: 0,
    outflow: 0,
    inflow: 0,
    release: noRelease,
    chlorineLoss: 0,
    carbonLoss: 0,
  };
}

/**
 * Puts the rates that hold through a step into `rates`. Water: evaporation is topped up with fill water; rain takes the
 * place of top-up and, beyond evaporation, overflows; what swimmers carry out and leaks is replaced by fill water.
 */
export function holdRates(
  rates: StepRates,
  acting: Acting,
  release: TabletRelease,
  parameters: Parameters,
  pool: { depth: number; light: number },
): void {
  const replaced = (acting.swimmers * parameters.waterPerSwimmerHour) / 1000 + parameters.leak / 24;
  const topUp = acting.evaporation - acting.rain;
  const transfer = parameters.carbonDioxideTransfer * (1 - acting.covered * (1 - CARBON_DIOXIDE_UNDER_COVER));
  rates.light = acting.sun * parameters.sunStrength * pool.light;
  rates.darkDemand = parameters.darkDemand * 2 ** ((acting.temperature - 27) / 10);
  rates.carbonTransfer = transfer / pool.depth;
  rates.swimmerDemand = (acting.swimmers * parameters.chlorinePerSwimmerHour) / parameters.volume;
  rates.combinedLoss = COMBINED_LOSS_OPEN + acting.covered * (COMBINED_LOSS_COVERED - COMBINED_LOSS_OPEN);
  rates.outflow = replaced / parameters.volume + Math.max(0, -topUp) / pool.depth;
  rates.inflow = replaced / parameters.volume + Math.max(0, topUp) / pool.depth;
  rates.release = release;
}

/**
 * Free chlorine that the reference sun destroys in water of these species [mg/L/h].
 *
 * @param boundPhotolysis k_B [1/h]
 */
export function lossUnderSun(species: ChlorineSpecies, boundPhotolysis: number): number {
  return (
    HYPOCHLOROUS_ACID_PHOTOLYSIS * species.hypochlorousAcid +
    HYPOCHLORITE_PHOTOLYSIS * species.hypochlorite +
    boundPhotolysis * species.cyanurateBound
  );
}

/** Puts the rates that follow from the water's state into `rates`. */
export function rateState(rates: StepRates, state: LedgerState, freeChlorine: number, boundPhotolysis: number): void {
  const underSun = lossUnderSun(state, boundPhotolysis);
  rates.chlorineLoss = rates.darkDemand + (freeChlorine > 1e-12 ? (rates.light * underSun) / freeChlorine : 0);
  rates.carbonLoss = rates.carbonTransfer * state.carbonDioxideExcess;
}

/**
 * Moves a ledger on by `hours` at constant rates. Free chlorine follows
 *
 *     dC/dt = release - demand - (k + outflow) C
 *
 * exactly; it never falls below 0 (swimmers then find none). What is used up takes alkalinity with it, 1 mol for 1 mol;
 * the share that becomes combined does not. Conserved quantities follow their dilution exactly.
 */
export function moveOn(
  ledger: Ledger,
  rates: StepRates,
  fill: FillWater,
  hours: number,
  account?: ChlorineAccount,
): void {
  const before = ledger.freeChlorine;
  const released = rates.release.chlorine * hours;
  const loss = rates.chlorineLoss + rates.outflow;
  const faded = Math.expm1(-loss * hours);
  const filled = loss > 0 ? -faded / loss : hours;
  const after = Math.max(0, before + before * faded + (rates.release.chlorine - rates.swimmerDemand) * filled);
  const gone = before + released - after;
  // Where nothing goes, rounding may leave a little less than nothing.
  const bySwimmers = Math.max(0, Math.min(rates.swimmerDemand * hours, gone));
  const firstOrder = gone - bySwimmers;
  const carriedOut = loss > 0 ? (firstOrder * rates.outflow) / loss : 0;
  const combined = SHARE_BECOMING_COMBINED * bySwimmers;
  const usedUp = gone - combined - carriedOut;
  ledger.freeChlorine = after;
  if (account) {
    account.released += released;
    account.usedUp += usedUp;
    account.combined += combined;
    account.carriedOut += carriedOut;
  }

  const combinedLoss = rates.combinedLoss + rates.outflow;
  const combinedFaded = Math.expm1(-combinedLoss * hours);
  ledger.combinedChlorine +=
    ledger.combinedChlorine * combinedFaded - ((combined / hours) * combinedFaded) / combinedLoss;

  const out = rates.outflow > 0 ? Math.expm1(-rates.outflow * hours) : 0;
  const left = 1 + out;
  const entered = rates.inflow * (rates.outflow > 0 ? -out / rates.outflow : hours);
  ledger.alkalinity =
    ledger.alkalinity * left +
    fill.alkalinity * entered +
    rates.release.alkalinity * hours -
    usedUp / CHLORINE_MILLIGRAMS_PER_MOLE;
  ledger.inorganicCarbon = Math.max(
    0,
    ledger.inorganicCarbon * left + fill.inorganicCarbon * entered - rates.carbonLoss * hours,
  );
  ledger.calcium = ledger.calcium * left + fill.calcium * entered + rates.release.calcium * hours;
  ledger.dissolvedSolids =
    ledger.dissolvedSolids * left + fill.dissolvedSolids * entered + rates.release.solids * hours;
  ledger.cyanurate = ledger.cyanurate * left + rates.release.cyanurate * hours;
  ledger.borate *= left;
}

/** Replaces a share of the water by fill water at once (backwash). */
export function replaceWater(ledger: Ledger, share: number, fill: FillWater, account?: ChlorineAccount): void {
  const left = 1 - share;
  if (account) account.carriedOut += ledger.freeChlorine * share;
  ledger.freeChlorine *= left;
  ledger.combinedChlorine *= left;
  ledger.cyanurate *= left;
  ledger.borate *= left;
  ledger.alkalinity = ledger.alkalinity * left + fill.alkalinity * share;
  ledger.inorganicCarbon = ledger.inorganicCarbon * left + fill.inorganicCarbon * share;
  ledger.calcium = ledger.calcium * left + fill.calcium * share;
  ledger.dissolvedSolids = ledger.dissolvedSolids * left + fill.dissolvedSolids * share;
}
