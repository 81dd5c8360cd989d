import { UnreachableTargetError } from '@/lib/errors';

import { addContents, contentsPerUnit, PERMITTED_VOLUME, requireProduct, type DosedProduct } from './dose';
import { analysisOf, ledgerOf } from './ledger';
import {
  ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
  CHLORINE_MILLIGRAMS_PER_MOLE,
  CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
  HARDNESS_MILLIGRAMS_PER_MOLE,
} from './molar-masses';
import { PERMITTED, requireInRange } from './ranges';
import { constantsOfLedger, pHOfLedger } from './solve-ledger';
import type { DoseContents } from './substances';
import type { Ledger, ModelChoice, WaterAnalysis } from './water';

export type Target = {
  quantity: 'freeChlorine' | 'pH' | 'totalAlkalinity' | 'calciumHardness' | 'cyanuricAcid';
  value: number;
};

/** Closer than this (relative, or absolute below 1) counts as being there already. */
const ALREADY_THERE = 1e-9;

/**
 * The amount (g, or mL of a liquid) of a product that brings a quantity to its target: inverse of addDose.
 * Chlorine, alkalinity, hardness and stabilizer are linear in the amount; pH is searched for the *smallest* amount,
 * because bicarbonate and dichlor first move pH one way and then level off.
 * @param volume m3.
 * @returns 0 when the water is already there.
 * @throws UnreachableTargetError when no amount gets there (for pH: none up to 10 g/L of product).
 * @throws WaterRangeError for water, volume, product or target outside what is permitted.
 */
export function amountToReach(
  water: WaterAnalysis,
  volume: number,
  product: DosedProduct,
  target: Target,
  choice?: ModelChoice,
): number {
  const ledger = ledgerOf(water, choice);
  requireProduct(product);
  requireInRange('volume', volume, PERMITTED_VOLUME);
  requireInRange(target.quantity, target.value, PERMITTED[target.quantity]);
  const now = target.quantity === 'pH' ? analysisOf(ledger, choice).pH : water[target.quantity];
  if (Math.abs(target.value - now) <= ALREADY_THERE * Math.max(1, Math.abs(target.value))) return 0;

  const contents = contentsPerUnit(product);
  const litres = volume * 1000;
  const amount =
    target.quantity === 'pH'
      ? litres * perLitreToReachPH(ledger, contents, target.value, choice)
      : (litres * (target.value - now)) / risePerUnit(contents, target.quantity);
  // What removes chlorine works no further than there is chlorine; the search for a pH has seen to that itself.
  const most =
    target.quantity !== 'pH' && contents.freeChlorine < 0
      ? (litres * chlorineMolesIn(ledger) * (1 + ALREADY_THERE)) / -contents.freeChlorine
      : Number.MAX_VALUE;
  if (!(amount > 0 && amount <= most)) {
    throw new UnreachableTargetError(target.quantity, target.value, product.substance);
  }
  return amount;
}

function chlorineMolesIn(ledger: Ledger): number {
  return ledger.freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE;
}

/** mg/L per unit of product in one litre; 0 where the product does not touch the quantity. */
function risePerUnit(contents: DoseContents, quantity: Exclude<Target['quantity'], 'pH'>): number {
  switch (quantity) {
    case 'freeChlorine':
      return contents.freeChlorine * CHLORINE_MILLIGRAMS_PER_MOLE;
    case 'totalAlkalinity':
      return contents.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT;
    case 'calciumHardness':
      return contents.calcium * HARDNESS_MILLIGRAMS_PER_MOLE;
    case 'cyanuricAcid':
      return contents.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE;
  }
}

const MOST_PER_LITRE = 10;
const LEAST_PER_LITRE = 1e-9;
const GROWTH = 1.25;

/** Units of product per litre for a pH, the smallest that does; NaN when none does. */
function perLitreToReachPH(ledger: Ledger, contents: DoseContents, target: number, choice?: ModelChoice): number {
  const distance = (perLitre: number): number => {
    const after = { ...ledger };
    addContents(after, 0.001, contents, perLitre);
    return pHOfLedger(after, undefined, constantsOfLedger(after, choice)) - target;
  };
  const start = distance(0);
  const side = Math.sign(start);
  let before = { at: 0, gap: Math.abs(start) };
  let here = before;
  for (let at = LEAST_PER_LITRE; at <= MOST_PER_LITRE; at *= GROWTH) {
    const gap = side * distance(at);
    if (gap <= 0) return crossing(distance, side, here.at, at);
    if (here.gap < before.gap && gap > here.gap) {
      // pH turned round between two steps: it may have touched the target in between.
      const nearest = closest((x) => side * distance(x), before.at, at);
      if (side * distance(nearest) <= 0) return crossing(distance, side, before.at, nearest);
    }
    before = here;
    here = { at, gap };
  }
  return NaN;
}

/** Bisects between an amount on the near side of the target and one at or past it. */
function crossing(distance: (at: number) => number, side: number, near: number, past: number): number {
  let low = near;
  let high = past;
  for (let step = 0; step < 100 && high - low > 1e-14 * high; step += 1) {
    const middle = (low + high) / 2;
    if (side * distance(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Golden-section search for the smallest gap. */
function closest(gap: (at: number) => number, from: number, to: number): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = from;
  let high = to;
  for (let step = 0; step < 60; step += 1) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    if (gap(left) < gap(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}
