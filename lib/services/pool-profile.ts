import 'server-only';
import type { PoolRow } from '@/db/queries/pools';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import {
  labelAnswersSchema,
  liningSchema,
  type PoolProfile,
  scopeAnswersSchema,
  sunAndPlaceSchema,
  waterAndEquipmentSchema,
} from '@/lib/schemas/pool-profile';
import { poolSizeSchema } from '@/lib/schemas/pool-size';

/** The stored row as the household answered it. A part that is not whole yet is null. */
export function profileOf(
  row: PoolRow,
  { handlesChemicals, timeZone }: Pick<HouseholdAccess, 'handlesChemicals' | 'timeZone'>,
  swimLimitSetBy: string | null,
): PoolProfile {
  return {
    scope: scopeAnswersSchema.safeParse(scopeAnswers(row, handlesChemicals)).data ?? null,
    size: row.volumeSource === null ? null : poolSizeSchema.parse(sizeAnswers(row)),
    volume: row.volume,
    meanDepth: row.meanDepth,
    volumeEstimated: row.volumeEstimated,
    lining: row.surface === null ? null : liningSchema.parse({ surface: row.surface }),
    sun: row.latitude === null ? null : sunAndPlaceSchema.parse(sunAnswers(row, timeZone)),
    water: row.pump === null ? null : waterAndEquipmentSchema.parse(waterAnswers(row)),
    label: row.swimLimit === null ? null : labelAnswersSchema.parse(labelAnswers(row)),
    swimLimitSetBy,
  };
}

function scopeAnswers(row: PoolRow, handlesChemicals: boolean) {
  const { system, kind, roofed, newSurface, openToPublic, planted, ultravioletOrOzone, wellWater, copperHeater } = row;
  return {
    ...{ system, kind, roofed, newSurface, openToPublic, planted, ultravioletOrOzone, wellWater, copperHeater },
    handlesChemicals,
  };
}

function sizeAnswers(row: PoolRow) {
  if (row.volumeSource === 'entered')
    return {
      how: 'entered',
      volume: row.enteredVolume,
      unit: row.enteredUnit,
      // It was asked back when it was saved: what stands in the table needs no second question.
      unitConfirmed: true,
      sure: row.volumeEstimated === false,
      meanDepth: row.meanDepth ?? undefined,
    };
  return { how: 'measured', outline: outlineOf(row), floor: floorOf(row) };
}

function outlineOf({ shape, length, width, secondWidth }: PoolRow) {
  if (shape === 'round') return { shape, diameter: length };
  if (shape === 'freeform') return { shape, length, widthA: width, widthB: secondWidth };
  return { shape, length, width };
}

function floorOf({ floor, shallowDepth, deepDepth }: PoolRow) {
  return floor === 'flat' ? { floor, depth: shallowDepth } : { floor, shallow: shallowDepth, deep: deepDepth };
}

function sunAnswers({ placeName, latitude, longitude, sunExposure, cover, waterFeatures }: PoolRow, timeZone: string) {
  return { placeName: placeName ?? undefined, latitude, longitude, timeZone, sunExposure, cover, waterFeatures };
}

function waterAnswers(row: PoolRow) {
  return {
    pump: row.pump,
    feeder: {
      kind: row.feederKind,
      ingredient: row.feederIngredient ?? undefined,
      capacity: row.feederCapacity,
      loaded: row.feederLoaded,
    },
    fillWater: {
      calciumHardness: row.fillCalciumHardness ?? undefined,
      totalAlkalinity: row.fillTotalAlkalinity ?? undefined,
      pH: row.fillPH ?? undefined,
      dissolvedSolids: row.fillDissolvedSolids ?? undefined,
    },
    testMethods: row.testMethods,
  };
}

function labelAnswers({ swimLimit, swimLimitFromLabel, swimFrom, swimTo }: PoolRow) {
  return { swimLimit: swimLimitFromLabel ? swimLimit : 'not-said', swimHours: { from: swimFrom, to: swimTo } };
}
