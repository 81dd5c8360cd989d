import { parametersOf } from '@/lib/projection/parameters';
import { holdRates, newStepRates, noRelease, SHARE_BECOMING_COMBINED } from '@/lib/projection/step';
import { pointsOf, roundHeight, ticksOf } from './curve';
import type { Example } from './example';

const DEPTH = 1.5;

/** What heads in the water do in an hour: free chlorine used [mg/L], and the share of the water they carry out. */
function anHourOf(swimmers: number, volume: number) {
  const rates = newStepRates();
  const acting = { sun: 0, covered: 0, evaporation: 0, rain: 0, swimmers, temperature: 27 };
  holdRates(rates, acting, noRelease, parametersOf({ volume, waterFeatures: false }), { depth: DEPTH, light: 0 });
  return { used: rates.swimmerDemand, carriedOut: rates.outflow };
}

export const swimmersExample: Example<'swimmers' | 'swimHours' | 'volume'> = {
  inputs: [
    { name: 'swimmers', low: 1, high: 20, step: 1, start: 6, unit: 'heads', decimals: 0 },
    { name: 'swimHours', low: 1, high: 8, step: 1, start: 3, unit: 'hours', decimals: 0 },
    { name: 'volume', low: 10, high: 120, step: 5, start: 60, unit: 'm3', decimals: 0 },
  ],
  work({ swimmers, swimHours, volume }) {
    const { used, carriedOut } = anHourOf(swimmers, volume);
    const fallIn = (water: number) => anHourOf(swimmers, water).used * swimHours;
    const highest = roundHeight(fallIn(10), [1, 2, 5, 10, 20, 50]);
    return {
      figures: [
        { name: 'fallOfChlorine', value: used * swimHours, unit: 'mg/L', decimals: 2 },
        { name: 'becomesCombined', value: used * swimHours * SHARE_BECOMING_COMBINED, unit: 'mg/L', decimals: 2 },
        { name: 'carriedOut', value: carriedOut * swimHours * volume * 1000, unit: 'L', decimals: 0 },
      ],
      curve: {
        across: { low: 10, high: 120, unit: 'm3', decimals: 0, ticks: ticksOf(20, 120, 20) },
        up: { low: 0, high: highest, unit: 'mg/L', decimals: 1, ticks: ticksOf(0, highest, highest / 2) },
        lines: [{ name: 'fallOfChlorine', mark: 'chlorine', points: pointsOf(10, 120, 55, fallIn) }],
      },
    };
  },
};
