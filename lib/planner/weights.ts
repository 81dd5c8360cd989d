/**
 * What the planner weighs, in the currency of the prices. A week costs its products plus these. Chosen so that money
 * decides among plans that keep the water in range and never between range and no range; outcomes that must not hang on
 * them are tested at plus and minus 30 %.
 */
export const weights = {
  /** One evening on which something goes in. */
  visit: 1.5,
  /** Having to shop for more than the shelf holds. */
  errand: 3,
  /** One more full test. */
  fullTest: 5,
  /** One mg/L under the lowest level for one hour: expected over the ensemble, and again for its middle. */
  shortfall: 0.25,
  medianShortfall: 1.5,
  /** One mg/L over the swim limit for one hour in which somebody may swim: expected, and for the middle. */
  excess: 0.15,
  medianExcess: 1,
  /** How many times heavier each mg/L over 10 weighs, at any hour. */
  overMaximum: 10,
  /** One swim hour in which the middle is under the lowest level or over the swim limit: nobody may go in. */
  closedSwimHour: 0.4,
  /** Each 0.1 of pH outside 7.2 to 7.8 for one hour, median. */
  pHOutside: 0.2,
  /** Acid or base that moves one m3 by 0.1 of pH: 4 mL of 31.45 % acid. */
  pHPerCubicMetre: 0.016,
  /** Bicarbonate that brings 10 mg/L of alkalinity back to one m3: 17 g. */
  alkalinityPerCubicMetre: 0.04,
  /** How many times more each mg/L of alkalinity weighs that is taken from water 20 mg/L or more short of it. */
  weakWater: 3,
  /** One m3 of replacement water from the tap. */
  water: 1.5,
} as const;
