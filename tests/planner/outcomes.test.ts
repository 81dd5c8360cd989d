import { describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import { type Changes, codesIn, products, scenarioOf, tabletsIn } from './scenarios';

const plan = (changes: Changes = {}) => planWeek(scenarioOf(changes));
const formsIn = ({ doses }: Pick<WeekPlan, 'doses'>) => [...new Set(doses.map(({ form }) => form))];
const riseOf = ({ doses }: WeekPlan) => doses.reduce((sum, { rise }) => sum + rise, 0);

/** What somebody of the trade would expect of each of these pools; why stands beside it. */
describe('a week comes out as the trade expects', () => {
  it('in a small pool: one tablet at most, and no evening over its cap', () => {
    // One 200 g tablet for 18 to 25 m3 a week: 20 m3 takes a single one.
    const small = plan({ pool: { volume: 20 } });
    expect(small.doses.length).toBeGreaterThan(0);
    expect(tabletsIn(small)).toBeLessThanOrEqual(1);
  });

  it('in a large pool: as many tablets for each m3 as in a usual one, give or take one', () => {
    const usual = tabletsIn(plan()) / 75.7;
    const large = plan({ pool: { volume: 200, feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 20 } } });
    expect(Math.abs(tabletsIn(large) - 200 * usual)).toBeLessThanOrEqual(2.5);
  });

  it('without a feeder: no tablets at all, the fast product on every evening there is', () => {
    // Nothing ever goes into the skimmer.
    const without = plan({ pool: { feeder: { kind: 'none' } } });
    expect(tabletsIn(without)).toBe(0);
    expect(without.doses).toHaveLength(3);
    expect(codesIn(without.reasons)).toContain('no-tablets-feeder');
  });

  it('with a feeder of another ingredient: no tablets, and a warning', () => {
    // Two chlorines in one feeder can explode.
    const other = plan({ pool: { feeder: { kind: 'inline', ingredient: 'calcium-hypochlorite', capacity: 8 } } });
    expect(tabletsIn(other)).toBe(0);
    expect(codesIn(other.cautions)).toContain('feeder-ingredient-other');
  });

  it('on vinyl with granules that may only be poured straight in: liquid takes their place', () => {
    // Undissolved grains bleach a vinyl liner.
    const gran = { ...products.gran, labelWay: 'broadcast' };
    const vinyl = plan({
      pool: { surface: 'vinyl' },
      shelf: [products.tabs, gran, products.liq],
      reading: { freeChlorine: 1 },
    });
    expect(formsIn(vinyl)).not.toContain('granular');
    expect(formsIn(vinyl)).toContain('liquid');
    expect(codesIn(vinyl.cautions)).toContain('granules-not-for-surface');
  });

  it('with hard fill water: no granules, whose calcium nothing would dilute', () => {
    const fillWater = { calciumHardness: 350, totalAlkalinity: 120, pH: 7.8 };
    expect(formsIn(plan({ pool: { fillWater }, reading: { calciumHardness: 420 } }))).not.toContain('granular');
  });

  it('at a stabilizer of 20: tablets carry the week and bring stabilizer with them', () => {
    const low = plan({ reading: { cyanuricAcid: 20 } });
    expect(codesIn(low.reasons)).toContain('tablets-carry');
    expect(low.endOfWeek!.cyanuricAcid).toBeGreaterThan(22);
  });

  it('at 50: tablets carry the week, and the water stays open', () => {
    const usual = plan();
    expect(codesIn(usual.reasons)).toContain('tablets-carry');
    expect(usual.openSwimShare!).toBeGreaterThan(0.9);
  });

  it.each([85, 120])('at %i: no tablets, and replacing water is the first word', (cyanuricAcid) => {
    // At a twentieth of the stabilizer the lowest level leaves no room under a swim limit of 4.
    const high = plan({ reading: { cyanuricAcid } });
    expect(tabletsIn(high)).toBe(0);
    expect(high.reasons[0]!.code).toBe('replace-water-first');
    expect(codesIn(high.reasons)).toContain('no-tablets-stabilizer-high');
    expect(high.projection!.freeChlorine.swimLimit.every((limit) => limit === 4)).toBe(true);
  });

  it("with last season's liquid: more of it for the same rise, or none once it is past half its strength", () => {
    const shelf = (boughtOn: string) => [{ ...products.liq, boughtOn }];
    const perRise = (week: WeekPlan) => week.doses.reduce((sum, { amount }) => sum + amount, 0) / riseOf(week);
    const [fresh, old] = [plan({ shelf: shelf('2026-07-01') }), plan({ shelf: shelf('2026-05-01') })];
    expect(perRise(old)).toBeGreaterThan(1.2 * perRise(fresh));
    const last = plan({ shelf: shelf('2025-08-01') });
    expect(codesIn(last.cautions)).toContain('liquid-past-half-strength');
    expect(last.doses.some(({ product }) => product === 'liq')).toBe(false);
  });

  it('in a cool covered pool: a third of the chlorine of an open warm one, or less', () => {
    // No sun, and dark demand that halves with every 10 degrees.
    const cool = plan({
      pool: { cover: 'opaque', swimHours: { from: '14:00', to: '16:00' } },
      reading: { temperature: 17 },
    });
    expect(riseOf(cool)).toBeLessThan(riseOf(plan()) / 3);
  });

  it('with a party on Saturday: more chlorine, the last of it on the eve of the party or later', () => {
    const swimmerHours = [0, 0, 0, 0, 0, 0, 60];
    const party = plan({ week: { swimmerHours } });
    const quiet = plan({ week: { swimmerHours: [0, 0, 0, 0, 0, 0, 0] } });
    expect(riseOf(party)).toBeGreaterThan(riseOf(quiet));
    expect(Math.max(...party.doses.map(({ at }) => Date.parse(at)))).toBeGreaterThan(
      Date.parse('2026-07-09T12:00:00-04:00'),
    );
    expect(party.checks.some(({ at, kind }) => kind === 'quick' && at.startsWith('2026-07-11'))).toBe(true);
  });

  it('in a rainy week: less chlorine, since clouds keep the sun away', () => {
    const rainy = plan({ week: { rain: [15, 15, 15, 15, 15, 15, 15], sky: [0.3, 0.3, 0.3, 0.3, 0.3, 0.3, 0.3] } });
    expect(riseOf(rainy)).toBeLessThan(0.8 * riseOf(plan()));
    expect(rainy.doses.length).toBeGreaterThan(0);
  });

  it('with an empty shelf: a plan that is a shopping list', () => {
    const empty = plan({ shelf: [] });
    expect(empty.doses.length).toBeGreaterThan(0);
    expect(empty.doses.every(({ toBuy, product, amount }) => toBuy && product === null && amount > 0)).toBe(true);
  });

  it('with a reading 15 days old: no plan, and what has to be measured', () => {
    const old = plan({ now: '2026-07-20T19:30:00-04:00' });
    expect(old.doses).toEqual([]);
    expect(old.projection).toBeNull();
    expect(old.needs.map(({ code, quantity }) => `${code} ${quantity}`)).toEqual([
      'reading-too-old freeChlorine',
      'reading-too-old pH',
    ]);
  });

  it('with a floater: tablets loaded twice, since it feeds by the clock and is empty in two days', () => {
    // A feeder feeds with the pump, 8 h a day: its tablets last six days.
    const feeder = { kind: 'floating', ingredient: 'trichlor', capacity: 4 };
    const floater = plan({ pool: { feeder }, shelf: [products.tabs] });
    expect(floater.doses.filter(({ form }) => form === 'tablet')).toHaveLength(2);
    expect(tabletsIn(floater)).toBeLessThanOrEqual(4);
  });
});
