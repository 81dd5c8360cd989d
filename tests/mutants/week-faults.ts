import type { PlantedFault } from './planted-fault';

const processes = ['tests/projection/processes.test.ts', 'tests/projection/published-losses.test.ts'];
const conservation = ['tests/projection/conservation.test.ts', ...processes];
const step = 'lib/projection/step.ts';

/** Faults in the week: losses, tablets, the likely range, days. */
export const weekFaults: readonly PlantedFault[] = [
  {
    file: step,
    find: 'HYPOCHLORITE_PHOTOLYSIS = 4.32',
    plant: 'HYPOCHLORITE_PHOTOLYSIS = 3.42',
    noticedBy: processes,
    fault: 'two digits of the loss under the sun swapped',
  },
  {
    file: step,
    find: '2 ** ((acting.temperature - 27) / 10)',
    plant: '2 ** ((27 - acting.temperature) / 10)',
    noticedBy: processes,
    fault: 'warm water that uses less chlorine than cold',
  },
  {
    file: step,
    find: '(acting.swimmers * parameters.waterPerSwimmerHour) / 1000',
    plant: '(acting.swimmers * parameters.waterPerSwimmerHour) / 100',
    noticedBy: conservation,
    fault: 'litres carried out by swimmers counted tenfold',
  },
  {
    file: step,
    find: 'const usedUp = gone - combined - carriedOut;',
    plant: 'const usedUp = gone - carriedOut;',
    noticedBy: conservation,
    fault: 'chlorine that becomes combined counted twice',
  },
  {
    file: step,
    find: 'const topUp = acting.evaporation - acting.rain;',
    plant: 'const topUp = acting.evaporation + acting.rain;',
    noticedBy: conservation,
    fault: 'rain that is topped up as if it had evaporated',
  },
  {
    file: step,
    find: 'ledger.calcium = ledger.calcium * left + fill.calcium * share;',
    plant: 'ledger.calcium = ledger.calcium * left;',
    noticedBy: conservation,
    fault: 'fill water without its hardness after a backwash',
  },
  {
    file: 'lib/projection/tablets.ts',
    find: 'return (1 - erodedShare / 3) ** 2 * (1 - erodedShare);',
    plant: 'return (1 - erodedShare / 3) * (1 - erodedShare);',
    noticedBy: ['tests/projection/tablets.test.ts'],
    fault: 'a tablet that erodes as a bar and not as a disc',
  },
  {
    file: 'lib/projection/quantiles.ts',
    find: 'band.p10.push(quantile(sorted, 0.1));',
    plant: 'band.p10.push(quantile(sorted, 0.9));',
    noticedBy: ['tests/projection/band.test.ts'],
    fault: 'a percentile swapped',
  },
  {
    file: 'lib/projection/quantiles.ts',
    find: 'share * (sorted.length + 1)',
    plant: 'share * sorted.length',
    noticedBy: ['tests/projection/band.test.ts'],
    fault: 'quantiles at p n and not at p (n + 1)',
  },
  {
    file: 'lib/projection/events.ts',
    find: 'const hours = rise > limits.largeDose.value ?',
    plant: 'const hours = rise < limits.largeDose.value ?',
    noticedBy: ['tests/projection/pump-after-dose.test.ts'],
    fault: 'the pump stopped early after a large dose',
  },
  {
    file: 'lib/calendar/age.ts',
    find: 'return hours < 48 ?',
    plant: 'return hours < 24 ?',
    noticedBy: ['tests/calendar/words.test.ts'],
    fault: '"30 hours ago" told as a day',
  },
  {
    file: 'lib/calendar/part-of-day.ts',
    find: '.find(({ startsAt }) => startsAt >= instant)',
    plant: '.find(({ startsAt }) => startsAt > instant - 3_600_000)',
    noticedBy: ['tests/calendar/words.test.ts'],
    fault: 'a wait told an hour too short',
  },
  {
    file: 'lib/calendar/household-day.ts',
    find: '((epochDayOf(day) + 3) % 7)',
    plant: '((epochDayOf(day) + 4) % 7)',
    noticedBy: ['tests/calendar/household-day.test.ts'],
    fault: 'weekdays off by one',
  },
  {
    file: 'lib/units/volume.ts',
    find: 'return (Math.PI / 4) * outline.diameter ** 2;',
    plant: 'return Math.PI * outline.diameter ** 2;',
    noticedBy: ['tests/units/volume.test.ts'],
    fault: 'diameter taken for radius',
  },
  {
    file: 'lib/units/unit.ts',
    find: "degF: { dimension: 'temperature', factor: 5 / 9, zero: 32 },",
    plant: "degF: { dimension: 'temperature', factor: 9 / 5, zero: 32 },",
    noticedBy: ['tests/units/convert.test.ts'],
    fault: 'degrees converted the wrong way round',
  },
];
