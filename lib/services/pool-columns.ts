import 'server-only';
import type { PoolChanges } from '@/db/queries/pools';
import { limits } from '@/lib/standards/limits';
import type { SetupAnswer } from '@/lib/schemas/pool-profile';
import { isVolumeEstimated, type PoolSizeAnswer, waterOf } from '@/lib/schemas/pool-size';

type AnswersOf<Step extends SetupAnswer['step']> = Extract<SetupAnswer, { step: Step; answers: unknown }>['answers'];

/** How each part of the profile is stored; the shelf has a table of its own. */
export function columnsOf(answer: SetupAnswer, personId: string): PoolChanges {
  switch (answer.step) {
    case 'scope': {
      const { handlesChemicals: _aboutTheMember, ...scope } = answer.answers;
      return scope;
    }
    case 'size':
      return sizeColumns(answer.answers);
    case 'lining':
      return { surface: answer.answers.surface };
    case 'sun':
      return sunColumns(answer.answers);
    case 'water':
      return waterColumns(answer.answers);
    case 'shelf':
      return {};
    case 'label':
      return labelColumns(answer.answers, personId);
  }
}

const noSize = {
  enteredVolume: null,
  enteredUnit: null,
  enteredUnitConfirmed: null,
  shape: null,
  length: null,
  width: null,
  secondWidth: null,
  floor: null,
  shallowDepth: null,
  deepDepth: null,
} as const;

function sizeColumns(size: PoolSizeAnswer): PoolChanges {
  const { volume, meanDepth } = waterOf(size);
  const water = {
    ...noSize,
    volumeSource: size.how,
    volume,
    meanDepth: meanDepth ?? null,
    volumeEstimated: isVolumeEstimated(size),
  };
  if (size.how === 'entered')
    return {
      ...water,
      enteredVolume: size.volume,
      enteredUnit: size.unit,
      enteredUnitConfirmed: size.unitConfirmed,
    };
  const { outline, floor } = size;
  return {
    ...water,
    shape: outline.shape,
    length: outline.shape === 'round' ? outline.diameter : outline.length,
    width: outline.shape === 'round' ? null : outline.shape === 'freeform' ? outline.widthA : outline.width,
    secondWidth: outline.shape === 'freeform' ? outline.widthB : null,
    floor: floor.floor,
    shallowDepth: floor.floor === 'flat' ? floor.depth : floor.shallow,
    deepDepth: floor.floor === 'flat' ? null : floor.deep,
  };
}

function sunColumns({
  timeZone: _ofTheHousehold,
  placeName,
  latitude,
  longitude,
  ...sun
}: AnswersOf<'sun'>): PoolChanges {
  return { ...sun, placeName: placeName ?? null, latitude: toTenth(latitude), longitude: toTenth(longitude) };
}

/** A tenth of a degree is about 11 km: enough for the sun, too coarse for an address. */
function toTenth(degrees: number): number {
  return Math.round(degrees * 10) / 10;
}

function waterColumns({ pump, feeder, fillWater, testMethods }: AnswersOf<'water'>): PoolChanges {
  const has = feeder.kind !== 'none';
  return {
    pump,
    feederKind: feeder.kind,
    feederIngredient: has ? (feeder.ingredient ?? null) : null,
    feederCapacity: has ? feeder.capacity : 0,
    feederLoaded: has ? feeder.loaded : 0,
    fillCalciumHardness: fillWater.calciumHardness ?? null,
    fillTotalAlkalinity: fillWater.totalAlkalinity ?? null,
    fillPH: fillWater.pH ?? null,
    fillDissolvedSolids: fillWater.dissolvedSolids ?? null,
    testMethods,
  };
}

function labelColumns({ swimLimit, swimHours }: AnswersOf<'label'>, personId: string): PoolChanges {
  const said = swimLimit !== 'not-said';
  return {
    swimLimit: said ? swimLimit : limits.swimLimitDefault.value,
    swimLimitFromLabel: said,
    swimLimitSetBy: personId,
    swimFrom: swimHours.from,
    swimTo: swimHours.to,
  };
}
