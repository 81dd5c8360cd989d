import type { DoseContents } from '@/lib/chemistry';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { noRelease, type TabletRelease } from './step';

const GRAMS_PER_MOLE = CHLORINE_MILLIGRAMS_PER_MOLE / 1000;

/** Tablets that went into a feeder together and erode alike. */
export type TabletLoad = {
  /** Mass of one tablet when it was whole [g], and how many. */
  tabletMass: number;
  count: number;
  /** Available chlorine [%]. */
  strength: number;
  /** Running hours already behind them [h], as a share of their life. */
  erodedShare: number;
  /** What 1 g brings, where they are not trichlor. */
  contents?: DoseContents;
};

/**
 * What is left of a tablet: a disc whose half-thickness is a third of its radius and that loses the same depth everywhere.
 *
 *     m / m0 = (1 - s / 3)^2 (1 - s)
 *
 * @param erodedShare s, running hours over the tablet's life, 0 (new) to 1 (gone); beyond is held at the ends
 * @returns share of the mass left, 1 to 0
 */
export function massLeft(erodedShare: number): number {
  if (erodedShare <= 0) return 1;
  if (erodedShare >= 1) return 0;
  return (1 - erodedShare / 3) ** 2 * (1 - erodedShare);
}

/** Inverse of {@link massLeft}: the eroded share at which this share of the mass is left, by bisection to 1e-12. */
export function erodedShareAt(shareLeft: number): number {
  let low = 0;
  let high = 1;
  while (high - low > 1e-12) {
    const middle = (low + high) / 2;
    if (massLeft(middle) > shareLeft) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Running hours that a tablet lasts [h]: `life` for 200 to 230 g, others in proportion to the cube root of their mass.
 *
 * @param tabletMass mass of the whole tablet [g]
 * @param life running hours that a tablet of 200 to 230 g lasts [h]
 */
export function lifeOf(tabletMass: number, life: number): number {
  if (tabletMass < 200) return life * Math.cbrt(tabletMass / 200);
  if (tabletMass > 230) return life * Math.cbrt(tabletMass / 230);
  return life;
}

/**
 * Tablets for a mass found in a feeder: as few whole ones as can make it up, all eroded alike.
 *
 * @param mass tablet mass in the feeder [g]
 */
export function loadOfMass(
  mass: number,
  { tabletMass, strength, contents }: Omit<TabletLoad, 'count' | 'erodedShare'>,
): TabletLoad | undefined {
  if (mass <= 0) return undefined;
  const count = Math.ceil(mass / tabletMass - 1e-9);
  const erodedShare = erodedShareAt(mass / (count * tabletMass));
  return { tabletMass, count, strength, erodedShare, ...(contents ? { contents } : {}) };
}

/**
 * Erodes all loads by `running` hours and tells what they released over a step of `hours`, as rates.
 *
 * @param running hours in which water passed the tablets [h]
 */
export function erode(
  loads: TabletLoad[],
  running: number,
  hours: number,
  { tabletLife, volume }: { tabletLife: number; volume: number },
): TabletRelease {
  if (loads.length === 0) return noRelease;
  let trichlorine = 0;
  let otherChlorine = 0;
  let mass = 0;
  let cyanurate = 0;
  let alkalinity = 0;
  let calcium = 0;
  for (const load of loads) {
    const before = massLeft(load.erodedShare);
    load.erodedShare = Math.min(1, load.erodedShare + running / lifeOf(load.tabletMass, tabletLife));
    const dissolved = load.count * load.tabletMass * (before - massLeft(load.erodedShare));
    mass += dissolved;
    const { contents } = load;
    if (contents === undefined) {
      trichlorine += (dissolved * load.strength) / 100;
      continue;
    }
    otherChlorine += dissolved * contents.freeChlorine * GRAMS_PER_MOLE;
    cyanurate += dissolved * contents.cyanurate;
    alkalinity += dissolved * contents.alkalinity;
    calcium += dissolved * contents.calcium;
  }
  const perLitreHour = 1 / (volume * 1000 * hours);
  const ofTrichlor = trichlorine / volume / hours;
  return {
    chlorine: ofTrichlor + otherChlorine / volume / hours,
    cyanurate: ofTrichlor / (3 * CHLORINE_MILLIGRAMS_PER_MOLE) + cyanurate * perLitreHour,
    alkalinity: alkalinity * perLitreHour,
    calcium: calcium * perLitreHour,
    solids: mass / volume / hours,
  };
}
