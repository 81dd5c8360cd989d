/**
 * Every limit of the swim verdict and the planner, with its source. Marks: [code] public code or standard, [label] what
 * product labels say, [paper] journal, [practice] common practice without a published source.
 */
export type Source = { kind: 'code' | 'label' | 'paper' | 'practice' | 'calculated'; text: string };
export type Limit = { value: number; unit: 'mg/L' | 'pH' | 'hours' | 'mm' | 'days' | 'm3' | '1'; source: Source };

const montana: Source = { kind: 'code', text: 'Montana ARM 37.115.1308, Table 6' };
const california: Source = { kind: 'code', text: 'California Title 22, sections 65523 and 65529' };

export const limits = {
  /** Free chlorine that public codes ask at least, water without stabilizer. */
  codeMinimumUnstabilized: { value: 1, unit: 'mg/L', source: california },
  /** The same for water with stabilizer. */
  codeMinimumStabilized: { value: 2, unit: 'mg/L', source: california },
  /** Stabilizer from which water counts as stabilized (or any trichlor or dichlor used). */
  stabilizedFrom: {
    value: 10,
    unit: 'mg/L',
    source: {
      kind: 'practice',
      text: 'the lowest step most kits can read; below it the code minimum of plain chlorine holds',
    },
  },
  /** Lowest level of free chlorine as a share of stabilizer: one twentieth. */
  stabilizerPerLowestLevel: {
    value: 20,
    unit: '1',
    source: { kind: 'paper', text: 'Falk, Blatchley, Kuechler, Meyer, Pickens, Suppes 2019, Water 11(6):1314' },
  },
  /** Free chlorine above which nobody swims, by public codes. */
  freeChlorineMaximum: { value: 10, unit: 'mg/L', source: california },
  /** Free chlorine above which the label forbids swimming, when the label does not say otherwise. */
  swimLimitDefault: {
    value: 4,
    unit: 'mg/L',
    source: { kind: 'label', text: 'US EPA letter of 22 July 2010: re-entry prohibited above 4 mg/L; the label wins' },
  },
  swimLimitHighest: { value: 10, unit: 'mg/L', source: california },
  combinedChlorineAct: { value: 0.4, unit: 'mg/L', source: california },
  combinedChlorineAim: {
    value: 0.2,
    unit: 'mg/L',
    source: { kind: 'code', text: 'Anne Arundel County, Maryland, pool rules' },
  },
  pHLowest: { value: 7.0, unit: 'pH', source: { kind: 'code', text: 'CDC Model Aquatic Health Code 2023' } },
  pHHighest: { value: 8.0, unit: 'pH', source: { kind: 'code', text: 'Pima County, Arizona, section 8.32.080' } },
  pHRangeLow: { value: 7.2, unit: 'pH', source: montana },
  pHRangeHigh: { value: 7.8, unit: 'pH', source: montana },
  pHAimLow: { value: 7.4, unit: 'pH', source: montana },
  pHAimHigh: { value: 7.6, unit: 'pH', source: montana },
  /** Stabilizer that public codes allow at most. */
  stabilizerMaximum: { value: 100, unit: 'mg/L', source: { kind: 'code', text: 'Florida 64E-9.004' } },
  /** How near stabilizer / 20 may come to the swim limit before no chlorine level is both high and low enough. */
  swimLimitMargin: {
    value: 0.5,
    unit: 'mg/L',
    source: {
      kind: 'calculated',
      text: 'one day of chlorine loss at the lowest level in midsummer, from the projection',
    },
  },
  verdictReadingAge: {
    value: 48,
    unit: 'hours',
    source: { kind: 'practice', text: 'two days; health authorities advise a check on every day of swimming' },
  },
  dailyCheckAdvice: {
    value: 24,
    unit: 'hours',
    source: { kind: 'code', text: 'Western Australia Health and Health Canada: test daily while the pool is used' },
  },
  planReadingAge: { value: 14, unit: 'days', source: { kind: 'practice', text: 'two weekly tests missed' } },
  /** Stabilizer and hardness are tested again after so long. */
  monthlyTest: { value: 31, unit: 'days', source: { kind: 'practice', text: 'once a month, by tube or shop slip' } },
  rainEndsVerdict: {
    value: 10,
    unit: 'mm',
    source: { kind: 'practice', text: 'rain that dilutes and soils the water noticeably' },
  },
  /** Cubic metres of water for each swimmer-hour in a day above which the verdict ends. */
  waterPerSwimmerHour: {
    value: 4,
    unit: 'm3',
    source: { kind: 'practice', text: 'one swimmer-hour for 4 m3 in a day' },
  },
  falseZeroAfterDose: {
    value: 72,
    unit: 'hours',
    source: { kind: 'practice', text: 'time in which a strong dose can bleach the colour' },
  },
  falseZeroReading: { value: 0.5, unit: 'mg/L', source: { kind: 'practice', text: 'a reading that looks like none' } },
  acidToChlorineGap: {
    value: 4,
    unit: 'hours',
    source: { kind: 'practice', text: 'no public source found; the label comes first' },
  },
  tickBeforeDose: {
    value: 3,
    unit: 'hours',
    source: { kind: 'practice', text: 'a dose is ticked at its time, not in the morning' },
  },
  stopConfirmation: {
    value: 90,
    unit: 'days',
    source: { kind: 'practice', text: 'a Stop that is asked at every dose is pressed blind by the third week' },
  },
  swimAfterDose: {
    value: 4,
    unit: 'hours',
    source: { kind: 'practice', text: 'no public source found; the label comes first' },
  },
  pumpAfterDose: {
    value: 4,
    unit: 'hours',
    source: { kind: 'practice', text: 'most of one turnover (6 to 8 h is published)' },
  },
  pumpAfterLargeDose: {
    value: 8,
    unit: 'hours',
    source: { kind: 'practice', text: 'one turnover; for doses over 5 mg/L' },
  },
  largeDose: { value: 5, unit: 'mg/L', source: { kind: 'practice', text: 'from here the pump runs a whole turnover' } },
} as const satisfies Record<string, Limit>;

/**
 * Free chlorine that the code asks at least [mg/L]: 1, in stabilized water 2.
 *
 * @param cyanuricAcid stabilizer [mg/L]
 * @param stabilizedProductUsed whether trichlor or dichlor has been used in this water
 */
export function codeMinimum(cyanuricAcid: number, stabilizedProductUsed = false): number {
  return stabilizedProductUsed || cyanuricAcid >= limits.stabilizedFrom.value
    ? limits.codeMinimumStabilized.value
    : limits.codeMinimumUnstabilized.value;
}

/**
 * Lowest level of free chlorine [mg/L]: the larger of the code minimum and stabilizer / 20.
 *
 * @param cyanuricAcid stabilizer [mg/L]
 * Source: Falk et al. 2019, Water 11(6):1314, for the ratio; the codes for the minimum.
 */
export function lowestLevel(cyanuricAcid: number, stabilizedProductUsed = false): number {
  return Math.max(
    codeMinimum(cyanuricAcid, stabilizedProductUsed),
    cyanuricAcid / limits.stabilizerPerLowestLevel.value,
  );
}
