import { sql } from 'drizzle-orm';
import { check, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { covers, feederIngredients, feederKinds } from '@/lib/schemas/pool';
import { poolKinds, setupSteps, surfaceAnswers, waterSystems } from '@/lib/schemas/pool-profile';
import { poolFloors, poolShapes, volumeUnits } from '@/lib/schemas/pool-size';
import type { ReadingMethod } from '@/lib/schemas/reading-kinds';
import type { WallInterval } from '@/lib/schemas/time';
import { between, isWallTime, oneOf } from './checks';
import { households } from './households';
import { people } from './people';

const yesOrNo = (name: string) => integer(name, { mode: 'boolean' });

/**
 * The profile of a household's pool. A column is null until its part of the first run was answered; `completed_at` is
 * set only when every part was.
 */
export const pools = sqliteTable(
  'pools',
  {
    householdId: text('household_id')
      .primaryKey()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** The next part of the first run; null when all are answered. */
    nextStep: text('next_step', { enum: setupSteps }).default('scope'),
    completedAt: integer('completed_at', { mode: 'timestamp_ms' }),
    /** Readings, outlook and cautions are kept, but no chlorine is planned. */
    recordOnly: yesOrNo('record_only').notNull().default(false),

    /** The pool is learnt from readings since then; null from the first on. */
    learningFrom: integer('learning_from', { mode: 'timestamp_ms' }),

    system: text('system', { enum: waterSystems }),
    kind: text('kind', { enum: poolKinds }),
    roofed: yesOrNo('roofed'),
    newSurface: yesOrNo('new_surface'),
    openToPublic: yesOrNo('open_to_public'),
    planted: yesOrNo('planted'),
    ultravioletOrOzone: yesOrNo('ultraviolet_or_ozone'),
    wellWater: yesOrNo('well_water'),
    copperHeater: yesOrNo('copper_heater'),

    volumeSource: text('volume_source', { enum: ['entered', 'measured'] }),
    /** [m3], worked out from the size as it was said. */
    volume: real('volume'),
    volumeEstimated: yesOrNo('volume_estimated'),
    /** As typed, with its unit. */
    enteredVolume: real('entered_volume'),
    enteredUnit: text('entered_unit', { enum: volumeUnits }),
    enteredUnitConfirmed: yesOrNo('entered_unit_confirmed'),
    shape: text('shape', { enum: poolShapes }),
    /** Length; of a round pool its diameter. */
    length: real('length_metres'),
    width: real('width_metres'),
    /** The second width of a freeform pool. */
    secondWidth: real('second_width_metres'),
    floor: text('floor', { enum: poolFloors }),
    /** Depth of the shallow end; of a flat floor the depth. */
    shallowDepth: real('shallow_depth_metres'),
    deepDepth: real('deep_depth_metres'),
    /** Null when nobody said: the usual depth is taken. */
    meanDepth: real('mean_depth_metres'),

    surface: text('surface', { enum: surfaceAnswers }),

    placeName: text('place_name'),
    /** Stored to a tenth of a degree: a neighbourhood, never an address. */
    latitude: real('latitude'),
    longitude: real('longitude'),
    sunExposure: real('sun_exposure'),
    cover: text('cover', { enum: covers }),
    waterFeatures: yesOrNo('water_features'),

    pump: text('pump', { mode: 'json' }).$type<WallInterval[]>(),
    feederKind: text('feeder_kind', { enum: feederKinds }),
    feederIngredient: text('feeder_ingredient', { enum: feederIngredients }),
    feederCapacity: integer('feeder_capacity_tablets'),
    feederLoaded: real('feeder_loaded_grams'),
    /** Fill water; null where it is not known. */
    fillCalciumHardness: real('fill_calcium_hardness'),
    fillTotalAlkalinity: real('fill_total_alkalinity'),
    fillPH: real('fill_ph'),
    fillDissolvedSolids: real('fill_dissolved_solids'),
    testMethods: text('test_methods', { mode: 'json' }).$type<ReadingMethod[]>(),

    /** Free chlorine above which nobody swims [mg/L]. */
    swimLimit: real('swim_limit'),
    /** False when the label does not say and the usual limit is taken. */
    swimLimitFromLabel: yesOrNo('swim_limit_from_label'),
    swimLimitSetBy: text('swim_limit_set_by').references(() => people.id, { onDelete: 'set null' }),
    swimFrom: text('swim_from'),
    swimTo: text('swim_to'),
  },
  (table) => [
    check('pools_next_step_known', oneOf(table.nextStep, setupSteps)),
    check('pools_system_known', oneOf(table.system, waterSystems)),
    check('pools_kind_known', oneOf(table.kind, poolKinds)),
    check('pools_volume_in_range', between(table.volume, 0.2, 1000)),
    check('pools_volume_source_known', oneOf(table.volumeSource, ['entered', 'measured'])),
    check(
      'pools_entered_volume_has_unit',
      sql`${table.volumeSource} is not 'entered' or (${table.enteredVolume} is not null and ${table.enteredUnit} is not null)`,
    ),
    check('pools_entered_unit_known', oneOf(table.enteredUnit, volumeUnits)),
    check('pools_shape_known', oneOf(table.shape, poolShapes)),
    check('pools_floor_known', oneOf(table.floor, poolFloors)),
    check(
      'pools_measured_volume_has_measures',
      sql`${table.volumeSource} is not 'measured' or (${table.shape} is not null and ${table.length} > 0 and ${table.floor} is not null and ${table.shallowDepth} > 0)`,
    ),
    check('pools_deep_end_not_shallower', sql`${table.shallowDepth} <= ${table.deepDepth}`),
    check('pools_mean_depth_in_range', between(table.meanDepth, 0.2, 6)),
    check('pools_surface_known', oneOf(table.surface, surfaceAnswers)),
    check('pools_latitude_in_range', between(table.latitude, -90, 90)),
    check('pools_longitude_in_range', between(table.longitude, -180, 180)),
    check('pools_latitude_is_coarse', sql`abs(${table.latitude} * 10 - round(${table.latitude} * 10)) < 1e-6`),
    check('pools_longitude_is_coarse', sql`abs(${table.longitude} * 10 - round(${table.longitude} * 10)) < 1e-6`),
    check('pools_sun_exposure_is_a_share', between(table.sunExposure, 0, 1)),
    check('pools_cover_known', oneOf(table.cover, covers)),
    check('pools_feeder_kind_known', oneOf(table.feederKind, feederKinds)),
    check('pools_feeder_ingredient_known', oneOf(table.feederIngredient, feederIngredients)),
    check(
      'pools_feeder_has_ingredient',
      sql`${table.feederKind} is null or ${table.feederKind} = 'none' or ${table.feederIngredient} is not null`,
    ),
    check('pools_feeder_capacity_in_range', between(table.feederCapacity, 0, 60)),
    check('pools_feeder_loaded_in_range', between(table.feederLoaded, 0, 20000)),
    check('pools_fill_hardness_in_range', between(table.fillCalciumHardness, 0, 2000)),
    check('pools_fill_alkalinity_in_range', between(table.fillTotalAlkalinity, 0, 1000)),
    check('pools_fill_ph_in_range', between(table.fillPH, 5, 10.5)),
    check('pools_fill_dissolved_solids_in_range', between(table.fillDissolvedSolids, 0, 30000)),
    check('pools_swim_limit_in_range', between(table.swimLimit, 2, 10)),
    check('pools_swim_hours_are_times', sql`(${isWallTime(table.swimFrom)}) and (${isWallTime(table.swimTo)})`),
    check('pools_swim_hours_in_order', sql`${table.swimFrom} < ${table.swimTo}`),
    check(
      'pools_completed_means_answered',
      sql`${table.completedAt} is null or (${sql.join(
        [
          table.system,
          table.kind,
          table.volume,
          table.surface,
          table.latitude,
          table.longitude,
          table.pump,
          table.feederKind,
          table.swimLimit,
          table.swimFrom,
          table.swimTo,
        ].map((column) => sql`${column} is not null`),
        sql.raw(' and '),
      )})`,
    ),
  ],
);
