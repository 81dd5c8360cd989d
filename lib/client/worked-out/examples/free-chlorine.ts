import { constantsOfLedger, ledgerOf, newLedgerState, solveLedger } from '@/lib/chemistry';
import { parametersOf } from '@/lib/projection/parameters';
import { holdRates, lightThroughDepth, moveOn, newStepRates, noRelease, rateState } from '@/lib/projection/step';
import { limits, lowestLevel } from '@/lib/standards/limits';
import { solarElevation } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';
import { type Point, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

const STEPS_PER_HOUR = 12;
const DAWN = 6;
/** Midsummer noon on the zero meridian, so that hours of the clock are hours of the sun. */
const midsummer = (hour: number) => Date.UTC(2026, 5, 21) + hour * 3_600_000;
const LATITUDE = 38;
const VOLUME = 60;
const DEPTH = 1.5;
/** When the swimmers of the example are in. */
const swimTime = { from: 14, to: 17 };

type Taken = { water: number; sun: number; swimmers: number };

/** One day without a dose or a feeder, from six to six: what is there each hour, and what took the rest. */
export function dayApart(setting: { stabilizer: number; clearSky: number; swimmers: number; temperature: number }) {
  const ledger = ledgerOf({ ...ordinaryWater, cyanuricAcid: setting.stabilizer, temperature: setting.temperature });
  const parameters = parametersOf({ volume: VOLUME, waterFeatures: false });
  const constants = constantsOfLedger(ledger);
  const state = newLedgerState();
  const rates = newStepRates();
  const body = { depth: DEPTH, light: lightThroughDepth(DEPTH) };
  const fill = ledgerOf({ ...ordinaryWater, freeChlorine: 0, cyanuricAcid: 0 });
  const hours = 1 / STEPS_PER_HOUR;
  const course: Point[] = [[DAWN, ledger.freeChlorine]];
  const taken: { at: number; taken: Taken }[] = [];
  for (let hour = DAWN; hour < DAWN + 24; hour++) {
    const sums: Taken = { water: 0, sun: 0, swimmers: 0 };
    for (let step = 0; step < STEPS_PER_HOUR; step++) {
      const at = hour + (step + 0.5) / STEPS_PER_HOUR;
      const sun = ultravioletWeight(solarElevation(midsummer(at), LATITUDE, 0)) * setting.clearSky;
      const swimmers = at >= swimTime.from && at < swimTime.to ? setting.swimmers : 0;
      const acting = { sun, covered: 0, evaporation: 0, rain: 0, swimmers, temperature: setting.temperature };
      solveLedger(ledger, constants, state);
      holdRates(rates, acting, noRelease, parameters, body);
      rateState(rates, state, ledger.freeChlorine, parameters.boundPhotolysis);
      const before = ledger.freeChlorine;
      moveOn(ledger, rates, fill, hours);
      const gone = before - ledger.freeChlorine;
      const bySwimmers = Math.min(gone, rates.swimmerDemand * hours);
      const rest = (gone - bySwimmers) / (rates.chlorineLoss + rates.outflow);
      sums.water += rest * rates.darkDemand;
      sums.sun += rest * (rates.chlorineLoss - rates.darkDemand);
      sums.swimmers += bySwimmers + rest * rates.outflow;
    }
    course.push([hour + 1, ledger.freeChlorine]);
    taken.push({ at: hour, taken: sums });
  }
  const total = (part: keyof Taken) => taken.reduce((sum, hour) => sum + hour.taken[part], 0);
  return { course, taken, totals: { water: total('water'), sun: total('sun'), swimmers: total('swimmers') } };
}

export const freeChlorine: Example<'clearSky' | 'stabilizer' | 'swimmers' | 'temperature'> = {
  inputs: [
    { name: 'clearSky', low: 0, high: 100, step: 5, start: 85, unit: 'percent', decimals: 0 },
    { name: 'stabilizer', low: 0, high: 100, step: 2, start: 44, unit: 'mg/L', decimals: 0 },
    { name: 'swimmers', low: 0, high: 12, step: 1, start: 2, unit: 'heads', decimals: 0 },
    { name: 'temperature', low: 16, high: 34, step: 1, start: 27, unit: 'degC', decimals: 0 },
  ],
  work({ clearSky, stabilizer, swimmers, temperature }) {
    const { course, taken, totals } = dayApart({ clearSky: clearSky / 100, stabilizer, swimmers, temperature });
    const end = course.at(-1)?.[1] ?? 0;
    return {
      figures: [
        { name: 'takenByWater', value: totals.water, unit: 'mg/L', decimals: 1 },
        { name: 'takenBySun', value: totals.sun, unit: 'mg/L', decimals: 1 },
        { name: 'takenBySwimmers', value: totals.swimmers, unit: 'mg/L', decimals: 1 },
        { name: 'nextMorning', value: end, unit: 'mg/L', decimals: 1 },
      ],
      curve: {
        across: { low: DAWN, high: DAWN + 24, unit: 'hourOfDay', decimals: 0, ticks: ticksOf(DAWN, DAWN + 24, 6) },
        up: { low: 0, high: 5, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 4, 1) },
        lines: [{ name: 'freeChlorine', mark: 'chlorine', points: course }],
        levels: [
          { name: 'swimLimit', at: limits.swimLimitDefault.value, forbidden: 'above' },
          { name: 'lowestLevel', at: lowestLevel(stabilizer), forbidden: 'below' },
        ],
        taken: taken.map(({ at, taken: { water, sun, swimmers: bathers } }) => ({
          at,
          parts: [
            { name: 'takenByWater', value: water },
            { name: 'takenBySun', value: sun },
            { name: 'takenBySwimmers', value: bathers },
          ],
        })),
      },
    };
  },
};
