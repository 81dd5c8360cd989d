import 'server-only';
import type { PoolChanges } from '@/db/queries/pools';
import type { ShelfProductValues } from '@/db/queries/shelf-products';
import { addDays, type CalendarDay } from '@/lib/calendar/household-day';
import type { Preferences } from '@/lib/schemas/preferences';

/**
 * The household that visitors look round in. It lives where people swim all year and clocks never change, so that the demo
 * looks alike in every season.
 */
export const demoHousehold = {
  name: 'Filao Road',
  timeZone: 'Indian/Mauritius',
  unitSystem: 'metric',
  locale: 'en-GB',
} as const;

export const demoPeople = { owner: 'Anjali', caretaker: 'Dev', visitor: 'Guest' } as const;

export const demoPreferences: Preferences = { visits: 5, money: 1, evenings: 1, steadiness: 1, avoid: [] };

export const demoPool: PoolChanges = {
  nextStep: null,
  recordOnly: false,
  system: 'chlorine',
  kind: 'pool',
  roofed: false,
  newSurface: false,
  openToPublic: false,
  planted: false,
  ultravioletOrOzone: false,
  wellWater: false,
  copperHeater: false,
  volumeSource: 'measured',
  volume: 45.5,
  volumeEstimated: false,
  shape: 'rectangle',
  length: 8,
  width: 4,
  floor: 'slope',
  shallowDepth: 1.1,
  deepDepth: 1.75,
  meanDepth: 1.42,
  surface: 'tile',
  placeName: 'Flic en Flac',
  latitude: -20.3,
  longitude: 57.4,
  sunExposure: 0.6,
  cover: 'none',
  waterFeatures: false,
  pump: [{ from: '08:00', to: '17:00' }],
  feederKind: 'inline',
  feederIngredient: 'trichlor',
  feederCapacity: 5,
  feederLoaded: 0,
  fillCalciumHardness: 110,
  fillTotalAlkalinity: 95,
  fillPH: 7.7,
  fillDissolvedSolids: 250,
  testMethods: ['drop-kit', 'strip'],
  swimLimit: 4,
  swimLimitFromLabel: true,
  swimFrom: '09:30',
  swimTo: '17:00',
};

/** What stands on the shelf on a day. */
export function demoShelf(today: CalendarDay): ShelfProductValues[] {
  return [
    product({
      ...{ id: 'tablets', name: 'Blue tub, slow tablets', form: 'tablet', substance: 'trichlor', strength: 90 },
      ...{ tabletMass: 200, labelWay: 'feeder-only', pricePerKg: 9.5, stock: 3400 },
    }),
    product({
      ...{ id: 'granules', name: 'White pail, granules', form: 'granular', substance: 'calcium-hypochlorite' },
      ...{ strength: 65, labelWay: 'dissolve', measure: 25, pricePerKg: 7.2, stock: 2850 },
    }),
    product({
      ...{ id: 'liquid', name: 'Liquid chlorine, 20 L can', form: 'liquid', substance: 'sodium-hypochlorite' },
      ...{
        strength: 12.5,
        measure: 250,
        pricePerLitre: 1.4,
        stock: 11000,
        boughtOn: addDays(today, -24),
        storedAt: 27,
      },
    }),
    product({
      ...{ id: 'acid', name: 'Acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45 },
      ...{ measure: 100, pricePerLitre: 1.9, stock: 4000 },
    }),
    product({
      ...{ id: 'bicarbonate', name: 'Bicarbonate', form: 'granular', substance: 'sodium-bicarbonate', strength: 100 },
      ...{ labelWay: 'dissolve', measure: 100, pricePerKg: 2.1, stock: 5000 },
    }),
  ];
}

type Said = Pick<ShelfProductValues, 'id' | 'name' | 'form' | 'substance' | 'stock'> & Partial<ShelfProductValues>;

function product(said: Said): ShelfProductValues {
  return { alkali: 0, labelWay: 'unknown', storedAt: 24, ...said };
}
