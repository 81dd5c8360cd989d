import type { Curve } from './curve';
import type { ExampleUnit, FigureName } from './names';

/** What a slider moves. */
export type InputName =
  | 'freeChlorine'
  | 'combinedChlorine'
  | 'pH'
  | 'stabilizer'
  | 'alkalinity'
  | 'hardness'
  | 'temperature'
  | 'clearSky'
  | 'swimmers'
  | 'swimHours'
  | 'volume'
  | 'swimLimit'
  | 'latitude'
  | 'month'
  | 'depth'
  | 'tabletMass'
  | 'pumpHours'
  | 'chlorineUsed'
  | 'strength'
  | 'days'
  | 'length'
  | 'width'
  | 'shallow'
  | 'deep'
  | 'airTemperature'
  | 'humidity'
  | 'wind'
  | 'poolSun';

export type Input<Name extends InputName = InputName> = {
  name: Name;
  low: number;
  high: number;
  step: number;
  start: number;
  unit: ExampleUnit;
  decimals: number;
};

export type Figure = { name: FigureName; value: number; unit: ExampleUnit; decimals: number };

/** Figures of one kind side by side, each column with a name of its own: the two published sets, the forms of chlorine. */
export type Comparison = {
  columns: readonly FigureName[];
  rows: readonly { name: FigureName; values: readonly number[] }[];
  decimals: number;
  unit: ExampleUnit;
};

export type Worked = {
  figures: readonly Figure[];
  comparison?: Comparison;
  curve?: Curve;
};

/** A small sum that a reader can play with, done by the functions that do it for a pool. */
export type Example<Name extends InputName = InputName> = {
  inputs: readonly Input<Name>[];
  work: (values: Readonly<Record<Name, number>>) => Worked;
};
