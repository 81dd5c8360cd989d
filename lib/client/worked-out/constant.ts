import type { Source } from '@/lib/standards/limits';
import type { HowPage } from './how-page';

/** Where a constant comes from: the words of a publication stand in the messages under this name. */
export type SourceName =
  | 'morris1966'
  | 'plummer1982'
  | 'phreeqc'
  | 'obrien1974'
  | 'wahman2018'
  | 'wahman2019'
  | 'davies1962'
  | 'malmberg1956'
  | 'stumm'
  | 'ionic'
  | 'air'
  | 'weights'
  | 'epa2017'
  | 'stoichiometry'
  | 'acidDensity'
  | 'awwa'
  | 'adam1999'
  | 'gas'
  | 'lye'
  | 'tradePercent'
  | 'handbook'
  | 'nowell1992'
  | 'madronich2007'
  | 'michalsky1988'
  | 'smith1998'
  | 'alduchov1996'
  | 'fao56'
  | 'kfla2011'
  | 'hampel1974'
  | 'bathers'
  | 'practice'
  | 'fitted'
  | 'spread'
  | 'kits'
  | 'tabletShape'
  | 'labels'
  | 'ours';

export type ConstantUnit =
  | 'none'
  | 'logK'
  | 'pK'
  | 'perHour'
  | 'perMetre'
  | 'mg/L'
  | 'pH'
  | 'hours'
  | 'minutes'
  | 'days'
  | 'g'
  | 'litres'
  | 'gPerHour'
  | 'litresPerHour'
  | 'metresPerHour'
  | 'm3'
  | 'mm'
  | 'percent'
  | 'gPerMole'
  | 'gPerMillilitre'
  | 'molesPerLitre'
  | 'joulesPerMoleKelvin'
  | 'degrees'
  | 'degC'
  | 'sigmaOfLog'
  | 'sigma'
  | 'gPerM3'
  | 'pools'
  | 'metres'
  | 'kilopascals'
  | 'kilojoulesPerKilogram'
  | 'tablets'
  | 'money'
  | 'bar';

/**
 * One constant as the help page lists it. `of` names where it lives, `folder/file#export.key`, so that a test can hold the
 * list to the code; a formula is called with `at`.
 */
export type Constant<Name extends string = string> = {
  name: Name;
  value: number;
  unit: ConstantUnit;
  of: string;
  at?: readonly number[];
  /** The published equation, where there is one: T in kelvin, t in degrees C. */
  formula?: string;
  source?: SourceName | Source;
};

export type ConstantGroup<Id extends string = string, Name extends string = string> = {
  id: Id;
  pages: readonly HowPage[];
  source: SourceName;
  constants: readonly Constant<Name>[];
};

export function group<Id extends string, Name extends string>(
  id: Id,
  pages: readonly HowPage[],
  source: SourceName,
  constants: readonly Constant<Name>[],
): ConstantGroup<Id, Name> {
  return { id, pages, source, constants };
}

/** Every entry of a table of numbers. */
export function entries<Name extends string>(
  of: string,
  table: Readonly<Record<Name, number>>,
  unit: ConstantUnit,
  more: Pick<Constant, 'source'> = {},
): Constant<Name>[] {
  return (Object.keys(table) as Name[]).map((name) => ({
    name,
    value: table[name],
    unit,
    of: `${of}.${name}`,
    ...more,
  }));
}
