import { describe, expect, it } from 'vitest';
import {
  aerateToEquilibrium,
  carbonDioxideExcess,
  chlorineSpecies,
  ledgerOf,
  type WaterAnalysis,
} from '@/lib/chemistry';
import { wallClock } from '@/lib/calendar/wall-time';
import { type ProjectedDose, projectWeek, settingOf, type TabletLoad } from '@/lib/projection';
import { prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import { massLeft } from '@/lib/projection/tablets';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import type { WeekAhead } from '@/lib/schemas/week-ahead';
import { solarElevation } from '@/lib/sun/elevation';
import { aPool, aWeek, everyDay, someWater, still, takenAt } from './pools';

type Case = {
  pool?: Record<string, unknown>;
  water?: Partial<WaterAnalysis>;
  week?: Partial<WeekAhead>;
  doses?: ProjectedDose[];
  loads?: TabletLoad[];
  parameters?: ParameterOverrides;
  takenAt?: string;
};

function project({ pool, water, week, doses, loads, parameters, takenAt: at = takenAt }: Case) {
  const start = { takenAt: at, water: someWater(water), ...(loads ? { loads } : {}) };
  return projectWeek(aPool(pool), start, week, doses, parameters);
}

/** The same with nothing acting but what is named. */
function inStillWater({ pool, week, parameters, ...rest }: Case) {
  return project({
    pool: { ...still.pool, ...pool },
    week: { ...still.week, ...week },
    parameters: { ...still.parameters, ...parameters },
    ...rest,
  });
}

const tablet: TabletLoad = { tabletMass: 227, count: 1, strength: 90, erodedShare: 0 };
/** Chlorine of a tablet in the pool of the tests [mg/L]. */
const ofTablet = (227 * 0.9) / 75.7;

describe('dark demand', () => {
  it('is first order and doubles in 10 degrees', () => {
    const left = (temperature: number) =>
      inStillWater({ water: { temperature }, parameters: { darkDemand: 0.1 / 24 } }).water.at(-1)!.freeChlorine;
    expect(left(27)).toBeCloseTo(3 * Math.exp(-0.1 * 7), 6);
    expect(left(37)).toBeCloseTo(3 * Math.exp(-0.2 * 7), 6);
    expect(left(17)).toBeCloseTo(3 * Math.exp(-0.05 * 7), 6);
  });

  it('follows the water temperature of each day', () => {
    const waterTemperature = [27, 27, 27, 37, 37, 37, 37];
    const { water } = inStillWater({
      takenAt: '2026-07-05T00:00:00-04:00',
      week: { waterTemperature },
      parameters: { darkDemand: 0.1 / 24 },
    });
    expect(water.at(-1)!.freeChlorine).toBeCloseTo(3 * Math.exp(-(3 * 0.1 + 4 * 0.2)), 6);
    expect(water.at(-1)!.temperature).toBe(37);
  });
});

describe('swimmers', () => {
  it('use grams of chlorine, a fifth of which becomes combined, and carry water out', () => {
    const { water } = inStillWater({
      takenAt: '2026-07-05T00:00:00-04:00',
      water: { combinedChlorine: 0 },
      week: { swimmerHours: [20, 0, 0, 0, 0, 0, 0] },
      parameters: { chlorinePerSwimmerHour: 2.5, waterPerSwimmerHour: 8 },
    });
    const used = (20 * 2.5) / 75.7;
    const carried = Math.exp((-20 * 8) / 1000 / 75.7);
    const evening = water[24]!;
    expect(evening.freeChlorine).toBeCloseTo(3 * carried - used, 2);
    // Formed over 10 h of swimming and fading by 0.3 a day from then on, 9 h after the middle of it.
    expect(evening.combinedChlorine).toBeCloseTo(0.2 * used * Math.exp((-0.3 * 9) / 24), 3);
    expect(evening.cyanuricAcid).toBeCloseTo(50 * carried, 6);
  });

  it('are in the water in the swim hours alone', () => {
    const { hours, water } = inStillWater({ week: { swimmerHours: [...everyDay(10), 10] } });
    water.slice(1).forEach((each, hour) => {
      const { hourOfDay } = wallClock(hours[hour]!, 'America/New_York');
      const fell = water[hour]!.freeChlorine - each.freeChlorine;
      expect(fell > 1e-9).toBe(hourOfDay >= 10 && hourOfDay < 20);
    });
  });

  it('take what a published bather takes: 5.5 g is 0.145 mg/L in 10,000 US gallons', () => {
    // Bradford 2014, Int. J. Aquat. Res. Educ. 8:168 for the median of a bather.
    const { water } = inStillWater({
      pool: { volume: 37.854 },
      takenAt: '2026-07-05T09:00:00-04:00',
      week: { swimmerHours: [1, 0, 0, 0, 0, 0, 0] },
      parameters: { chlorinePerSwimmerHour: 5.5, waterPerSwimmerHour: 0 },
    });
    expect(3 - water.at(-1)!.freeChlorine).toBeCloseTo(0.145, 3);
  });
});

describe('backwash', () => {
  it('replaces its share of the water by fill water at noon', () => {
    const { hours, water } = inStillWater({ week: { backwash: [0, 0, 7.57, 0, 0, 0, 0] } });
    const after = water.findIndex((each) => each.cyanuricAcid < 49.9);
    expect(wallClock(hours[after]!, 'America/New_York')).toMatchObject({ day: '2026-07-07', hour: 12 });
    expect(water[after]!.cyanuricAcid).toBeCloseTo(45, 9);
    expect(water[after]!.freeChlorine).toBeCloseTo(2.7, 9);
    expect(water[after]!.calciumHardness).toBeCloseTo(220 * 0.9 + 60 * 0.1, 9);
  });

  it('cannot replace more water than there is', () => {
    const { water } = inStillWater({
      pool: { volume: 5 },
      week: { backwash: [0, 0, 5, 0, 0, 0, 0] },
      parameters: { volume: 4 },
    });
    expect(water.at(-1)!.cyanuricAcid).toBe(0);
    expect(water.at(-1)!.calciumHardness).toBeCloseTo(60, 9);
  });
});

describe('covers', () => {
  const lossOf = (cover: string, week: Partial<WeekAhead> = {}) =>
    3 - inStillWater({ pool: { cover, sunExposure: 1 }, week }).water.at(-1)!.freeChlorine;
  const swimAllDay = { from: '00:00', to: '00:00' };

  it('let 0.3 or nothing of the sun through outside the swim hours', () => {
    expect(lossOf('floating')).toBeLessThan(lossOf('none'));
    expect(lossOf('opaque')).toBeLessThan(lossOf('floating'));
    expect(lossOf('opaque')).toBeGreaterThan(0);
    const covered = (cover: string) =>
      inStillWater({ pool: { cover, sunExposure: 1, swimHours: { from: '22:00', to: '23:00' } } }).water.at(-1)!
        .freeChlorine;
    expect(covered('opaque')).toBeCloseTo(3, 9);
    // Little sun: the loss goes with it nearly in proportion.
    const share = Math.log(covered('floating') / 3) / Math.log(covered('none') / 3);
    expect(share).toBeGreaterThan(0.3);
    expect(share).toBeLessThan(0.4);
  });

  it('are off in the swim hours', () => {
    const off = (cover: string) =>
      inStillWater({ pool: { cover, sunExposure: 1, swimHours: swimAllDay } }).water.at(-1)!.freeChlorine;
    expect(off('opaque')).toBeCloseTo(off('none'), 12);
  });

  it.each([
    ['none', 1],
    ['floating', 0.1],
    ['opaque', 0.05],
  ])('%s leaves %d of the evaporation', (cover, share) => {
    const pool = { cover, swimHours: { from: '22:00', to: '23:00' } };
    const { water } = inStillWater({ pool, week: { evaporation: everyDay(6) } });
    const open = (1 + 23 * share) / 24;
    expect(water.at(-1)!.calciumHardness - 220).toBeCloseTo((60 * 6 * 7 * open) / 1000 / 1.5, 6);
  });

  it('keep combined chlorine and carbon dioxide in', () => {
    const pool = { cover: 'opaque', swimHours: { from: '22:00', to: '22:01' } };
    const kept = inStillWater({ pool, water: { combinedChlorine: 0.6 } }).water.at(-1)!.combinedChlorine!;
    expect(kept).toBeCloseTo(0.6 * Math.exp(-0.1 * 7), 3);
    const rise = (cover: string) =>
      inStillWater({ pool: { ...pool, cover }, parameters: { carbonDioxideTransfer: 0.009 } }).water[24]!.pH - 7.5;
    expect(rise('opaque') / rise('none')).toBeGreaterThan(0.28);
    expect(rise('opaque') / rise('none')).toBeLessThan(0.36);
  });
});

describe('carbon dioxide', () => {
  it('leaves until the water is in balance with air', () => {
    const water = someWater({ combinedChlorine: 0 });
    const after = inStillWater({ water, parameters: { carbonDioxideTransfer: 0.5 } }).water.at(-1)!;
    expect(after.pH).toBeCloseTo(aerateToEquilibrium(water).pH, 2);
    expect(after.totalAlkalinity).toBeCloseTo(80, 9);
  });

  it('comes in where the water has too little', () => {
    const water = { pH: 9, totalAlkalinity: 60, cyanuricAcid: 0, freeChlorine: 0 };
    const { pH } = inStillWater({ water, parameters: { carbonDioxideTransfer: 0.5 } }).water.at(-1)!;
    expect(pH).toBeCloseTo(aerateToEquilibrium(someWater({ ...water, combinedChlorine: 0 })).pH, 2);
    expect(pH).toBeLessThan(8.5);
  });

  it('leaves faster with water features, and from shallow water', () => {
    const rise = (pool: Record<string, unknown>) =>
      inStillWater({ pool, parameters: { carbonDioxideTransfer: undefined } }).water[24]!.pH - 7.5;
    // 0.025 against 0.009 m/h; the gas runs out a little meanwhile.
    expect(rise({ waterFeatures: true }) / rise({})).toBeGreaterThan(2.2);
    expect(rise({ waterFeatures: true }) / rise({})).toBeLessThan(2.8);
    expect(rise({ meanDepth: 0.75 }) / rise({ meanDepth: 1.5 })).toBeGreaterThan(1.7);
    expect(rise({ meanDepth: 0.75 }) / rise({ meanDepth: 1.5 })).toBeLessThan(2);
  });
});

describe('the speed of carbon dioxide', () => {
  it.each([
    ['still water', {}, 0.009],
    ['water features', { waterFeatures: true }, 0.025],
  ])('through the surface of %s is k_g / d times what is too much', (_, pool, transfer) => {
    const water = someWater({ combinedChlorine: 0, freeChlorine: 0 });
    const after = inStillWater({ water, pool, parameters: { carbonDioxideTransfer: undefined, darkDemand: 0 } })
      .water[1]!;
    const [before, later] = [ledgerOf(water), ledgerOf(after)];
    const excess = (carbonDioxideExcess(before, water.pH) + carbonDioxideExcess(later, after.pH)) / 2;
    expect(before.inorganicCarbon - later.inorganicCarbon).toBeGreaterThan(0);
    expect((before.inorganicCarbon - later.inorganicCarbon) / ((transfer / 1.5) * excess)).toBeCloseTo(1, 3);
  });
});

describe('parameters', () => {
  const dose: ProjectedDose = {
    at: '2026-07-06T20:00:00-04:00',
    substance: 'calcium-hypochlorite',
    amount: 200,
    strength: 65,
  };

  it('volume: what a dose adds is spread over the water there is', () => {
    const rise = (volume: number) =>
      inStillWater({ doses: [dose], parameters: { volume } }).water.at(-1)!.freeChlorine - 3;
    expect(rise(60)).toBeCloseTo((200 * 0.65) / 60, 9);
    expect(rise(60) / rise(90)).toBeCloseTo(1.5, 9);
  });

  const busy: Case = {
    week: { swimmerHours: everyDay(10) },
    loads: [tablet],
    doses: [dose],
    pool: { feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3 } },
  };
  it.each<[keyof ParameterOverrides, number]>([
    ['boundPhotolysis', 0.006],
    ['sunStrength', 1],
    ['darkDemand', 0.1 / 24],
    ['chlorinePerSwimmerHour', 2.5],
    ['tabletLife', 48],
    ['waterPerSwimmerHour', 8],
    ['leak', 0],
    ['carbonDioxideTransfer', 0.009],
    ['volume', 75.7],
  ])('%s: %d where nothing better is known, and it matters', (name, usual) => {
    const end = (parameters: ParameterOverrides) => project({ ...busy, parameters }).water.at(-1)!;
    expect(end({ [name]: usual })).toEqual(end({}));
    expect(end({ [name]: usual === 0 ? 0.5 : 1.3 * usual })).not.toEqual(end({}));
  });
});

describe('slow tablets', () => {
  const pump = [{ from: '08:00', to: '16:00' }];

  it('erode while the pump runs, by the formula', () => {
    const { hours, water } = inStillWater({ pool: { pump }, loads: [tablet] });
    hours.forEach((hour, index) => {
      const day = Math.floor((hour - Date.parse('2026-07-05T00:00:00-04:00')) / 86_400_000);
      const { hourOfDay } = wallClock(hour, 'America/New_York');
      // None of the first day's eight hours is left at 19:00.
      const running = 8 * (day - 1) + Math.min(8, Math.max(0, hourOfDay - 8));
      const released = ofTablet * (1 - massLeft(Math.max(0, running) / 48));
      expect(water[index]!.freeChlorine).toBeCloseTo(3 + released, 9);
    });
  });

  it('bring 0.607 mg/L of stabilizer for each mg/L of chlorine, and no alkalinity', () => {
    // Wahman and Alexander 2019, Environ. Eng. Sci. 36:283: 0.59 as cyanurate.
    const { water } = inStillWater({ pool: { pump }, loads: [tablet] });
    const last = water.at(-1)!;
    expect((last.cyanuricAcid - 50) / (last.freeChlorine - 3)).toBeCloseTo(0.607, 3);
    expect(last.totalAlkalinity).toBeCloseTo(80, 9);
    expect(last.pH).toBeLessThan(7.5);
  });

  it('last as the cube root of their mass', () => {
    const gone = (tabletMass: number, tabletLife: number) => {
      const load = { ...tablet, tabletMass };
      const { water } = inStillWater({
        pool: { pump: [{ from: '00:00', to: '00:00' }] },
        loads: [load],
        parameters: { tabletLife },
      });
      const all = 3 + (tabletMass * 0.9) / 75.7;
      return water.findIndex((each) => each.freeChlorine > all - 1e-9);
    };
    expect(gone(227, 48)).toBe(48);
    expect(gone(227, 100)).toBe(100);
    expect(gone(25, 48)).toBe(Math.ceil(48 * Math.cbrt(25 / 200)));
  });

  it('in a floater erode by the clock', () => {
    const feeder = { kind: 'floating', ingredient: 'trichlor', capacity: 3 };
    const { water } = inStillWater({ pool: { feeder }, loads: [tablet] });
    expect(water[24]!.freeChlorine).toBeCloseTo(3 + ofTablet * (1 - massLeft(0.5)), 9);
    expect(water[47]!.freeChlorine).toBeLessThan(3 + ofTablet);
    expect(water[48]!.freeChlorine).toBeCloseTo(3 + ofTablet, 9);
  });

  it.each([
    ['4 h after a fast dose', 1000, 4],
    ['8 h after one over +5 mg/L', 3100, 8],
  ])('erode on, since the pump runs %s', (_, amount, hoursRunning) => {
    const at = '2026-07-06T19:20:00-04:00';
    const run = (dosed: boolean) =>
      inStillWater({
        loads: [tablet],
        doses: dosed ? [{ at, substance: 'sodium-hypochlorite', amount, strength: 12.5 }] : [],
      }).water.at(-1)!.freeChlorine;
    const dose = (amount * 0.125) / 75.7;
    expect(run(false)).toBeCloseTo(3, 9);
    expect(run(true)).toBeCloseTo(3 + dose + ofTablet * (1 - massLeft(hoursRunning / 48)), 9);
  });

  it('erode once where the timer and a dose run the pump together', () => {
    const doses: ProjectedDose[] = [
      { at: '2026-07-06T14:20:00-04:00', substance: 'sodium-hypochlorite', amount: 1, strength: 12.5 },
      { at: '2026-07-06T15:50:00-04:00', substance: 'sodium-hypochlorite', amount: 1, strength: 12.5 },
    ];
    const { water } = inStillWater({ pool: { pump }, loads: [tablet], doses });
    const tiny = (2 * 0.125) / 75.7;
    // 08:00 to 16:00 by the timer, then until 19:50.
    const running = 8 + 3 + 50 / 60;
    expect(water[25]!.freeChlorine).toBeCloseTo(3 + tiny + ofTablet * (1 - massLeft(running / 48)), 9);
  });

  it('go in at their hour', () => {
    const doses = [{ at: '2026-07-08T07:30:00-04:00', tablets: 2, tabletMass: 227, strength: 90 }];
    const { hours, water } = inStillWater({ pool: { pump }, doses });
    const first = water.findIndex((each) => each.freeChlorine > 3 + 1e-9);
    expect(wallClock(hours[first]!, 'America/New_York')).toMatchObject({ day: '2026-07-08', hour: 9 });
  });
});

describe('doses', () => {
  it('enter at their hour, with what they bring', () => {
    const at = '2026-07-06T20:00:00-04:00';
    const { water } = inStillWater({ doses: [{ at, substance: 'calcium-hypochlorite', amount: 200, strength: 65 }] });
    expect(water[24]!.freeChlorine).toBeCloseTo(3, 9);
    expect(water[25]!.freeChlorine).toBeCloseTo(3 + (200 * 0.65) / 75.7, 9);
    // 0.706 mg/L of hardness for each mg/L of chlorine from pure calcium hypochlorite: sources.md, section 5.
    expect((water[25]!.calciumHardness - 220) / ((200 * 0.65) / 75.7)).toBeCloseTo(0.706, 3);
  });

  it('before the start or after the end are left out', () => {
    const doses: ProjectedDose[] = ['2026-07-05T18:59:59-04:00', '2026-07-12T19:00:01-04:00'].map((at) => ({
      at,
      substance: 'sodium-hypochlorite',
      amount: 2000,
    }));
    expect(inStillWater({ doses }).water.at(-1)!.freeChlorine).toBeCloseTo(3, 9);
  });
});

describe('sun', () => {
  const elevationSine = (instant: number) => Math.sin((solarElevation(instant, 28, -81.5) * Math.PI) / 180);

  it.each([
    ['none', 1],
    ['floating', 0.3],
    ['opaque', 0],
  ])('under a cover (%s) is sky, exposure, cover and (sin e / sin 66.4 deg)^2.42', (cover, share) => {
    const sky = [0.9, 0.2, 1, 0.5, 0.7, 0, 1];
    const pool = aPool({ cover, sunExposure: 0.6, swimHours: { from: '12:00', to: '14:00' } });
    const startsAt = Date.parse('2026-07-05T00:00:00-04:00');
    const { sun } = prepareForcing(pool, startsAt, aWeek({ sky }), 27);
    sun.forEach((found, hour) => {
      const quarters = [7.5, 22.5, 37.5, 52.5].map((minute) =>
        elevationSine(startsAt + hour * 3_600_000 + minute * 60_000),
      );
      const clear = quarters.map((sine) => (Math.max(0, sine) / Math.sin((66.4 * Math.PI) / 180)) ** 2.42);
      const mean = clear.reduce((sum, each) => sum + each, 0) / 4;
      const through = hour % 24 === 12 || hour % 24 === 13 ? 1 : share;
      expect(Math.abs(found - 0.6 * sky[Math.floor(hour / 24)]! * through * mean)).toBeLessThan(0.001);
    });
  });

  it('at its reference takes first-order shares of HOCl, OCl- and bound chlorine', () => {
    const pool = aPool({ ...still.pool, meanDepth: 2 });
    const light = (1 - Math.exp(-0.15 * 2)) / (0.15 * 2);
    const HOURS = 1 / 50;
    for (const cyanuricAcid of [0, 30, 90]) {
      const water = someWater({ combinedChlorine: 0, cyanuricAcid });
      const forcing = prepareForcing(pool, Date.parse(takenAt), aWeek(still.week), water.temperature, {
        hours: HOURS,
        stepsPerHour: 1 / HOURS,
      });
      forcing.sun.fill(1);
      forcing.sunParts.fill(1);
      const setting = settingOf(pool, water.temperature, {
        ...still.parameters,
        sunStrength: 0.25,
        boundPhotolysis: 0.02,
      });
      const { end, endPH } = integrateWeek(forcing, { ledger: ledgerOf(water), loads: [] }, [], setting);
      const perHour = ({ freeChlorine, pH }: { freeChlorine: number; pH: number }) => {
        const { hypochlorousAcid, hypochlorite, cyanurateBound } = chlorineSpecies({ ...water, freeChlorine, pH });
        return (0.25 * light * (0.72 * hypochlorousAcid + 4.32 * hypochlorite + 0.02 * cyanurateBound)) / freeChlorine;
      };
      const mean = (perHour(water) + perHour({ freeChlorine: end.freeChlorine, pH: endPH })) / 2;
      expect(Math.log(water.freeChlorine / end.freeChlorine) / (mean * HOURS)).toBeCloseTo(1, 5);
    }
  });

  it('acts on each form by its own rate, through the depth', () => {
    const water = someWater({ combinedChlorine: 0 });
    const at = '2026-07-05T13:00:00-04:00';
    const first = inStillWater({ water, takenAt: at, pool: { sunExposure: 1 }, week: { sky: everyDay(1) } }).water;
    const { hypochlorousAcid, hypochlorite, cyanurateBound } = chlorineSpecies(water);
    const light = (1 - Math.exp(-0.15 * 1.5)) / (0.15 * 1.5);
    const perHour = light * (0.72 * hypochlorousAcid + 4.32 * hypochlorite + 0.006 * cyanurateBound);
    const loss = water.freeChlorine - first[1]!.freeChlorine;
    // Sun 83 to 84 degrees high: (sin e / sin 66.4 deg)^2.42 is 1.22.
    expect(loss / perHour).toBeGreaterThan(1.15);
    expect(loss / perHour).toBeLessThan(1.24);
  });

  const effects: [string, Case, Case][] = [
    ['more sky', { week: { sky: everyDay(1) } }, { week: { sky: everyDay(0.3) } }],
    ['less shade', { pool: { sunExposure: 1 } }, { pool: { sunExposure: 0.4 } }],
    ['a stronger sun', { parameters: { sunStrength: 1.4 } }, { parameters: { sunStrength: 0.7 } }],
    ['less protected chlorine', { parameters: { boundPhotolysis: 0.02 } }, { parameters: { boundPhotolysis: 0.002 } }],
    ['less stabilizer', { water: { cyanuricAcid: 25 } }, { water: { cyanuricAcid: 75 } }],
    ['shallower water', { pool: { meanDepth: 0.8 } }, { pool: { meanDepth: 2.5 } }],
    ['higher pH', { water: { pH: 7.9 } }, { water: { pH: 7.2 } }],
    ['more dark demand', { parameters: { darkDemand: 0.01 } }, { parameters: { darkDemand: 0.002 } }],
    ['warmer water', { water: { temperature: 33 } }, { water: { temperature: 22 } }],
    ['more swimmers', { week: { swimmerHours: everyDay(20) } }, { week: { swimmerHours: everyDay(2) } }],
    [
      'thirstier swimmers',
      { week: { swimmerHours: everyDay(10) }, parameters: { chlorinePerSwimmerHour: 5 } },
      { week: { swimmerHours: everyDay(10) }, parameters: { chlorinePerSwimmerHour: 1 } },
    ],
    ['rain', { week: { rain: everyDay(20) } }, {}],
    ['backwash', { week: { backwash: everyDay(2) } }, {}],
    ['a leak', { parameters: { leak: 3 } }, {}],
    ['no cover', {}, { pool: { cover: 'opaque' } }],
    [
      'farther south in winter',
      { takenAt: '2026-12-20T12:00:00-05:00' },
      { takenAt: '2026-12-20T12:00:00-05:00', pool: { latitude: 47 } },
    ],
    [
      'a smaller pool with swimmers',
      { pool: { volume: 30 }, week: { swimmerHours: everyDay(3) } },
      { week: { swimmerHours: everyDay(3) } },
    ],
  ];

  it.each(effects)('and the rest: %s leaves less chlorine', (_, more, less) => {
    expect(project(more).water[100]!.freeChlorine).toBeLessThan(project(less).water[100]!.freeChlorine - 0.01);
  });
});
