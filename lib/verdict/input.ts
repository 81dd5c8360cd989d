/** A value and when it was read; instants are milliseconds since 1970-01-01T00:00Z throughout. */
export type MeasuredValue = { value: number; takenAt: number };

/** The hourly outlook that starts at the newest reading; all arrays as long as `hours`. mg/L and pH. */
export type SwimProjection = {
  hours: readonly number[];
  freeChlorine: Record<'p10' | 'p50' | 'p90' | 'lowestLevel' | 'swimLimit', readonly number[]>;
  pH: { p50: readonly number[] };
};

/** An amount spread evenly over a stretch of time. */
export type SpreadAmount = { from: number; until: number; amount: number };

export type SwimVerdictInput = {
  now: number;
  /** Volume of the pool [m3]. */
  volume: number;
  /** Whether somebody is expected to swim today. */
  swimDay: boolean;
  /** As they stand now [mg/L]: by the latest stabilizer, the label and the household. */
  limits: { codeMinimum: number; lowestLevel: number; swimLimit: number };
  /** The newest value of each quantity; left out when it was never measured. Combined chlorine may be older. */
  readings: { freeChlorine?: MeasuredValue; pH?: MeasuredValue; combinedChlorine?: MeasuredValue };
  /** Left out when there is none or when it does not know the newest reading, dose or change. */
  projection?: SwimProjection;
  /** Doses given and planned with the time nobody may swim; `from` is the instant of the dose. */
  waits: readonly { from: number; until: number }[];
  /** What happened since the older of the two newest readings of chlorine and pH. */
  sinceReading: {
    rainMillimetres: number;
    storm: boolean;
    /** Heads times hours on the busiest day. */
    swimmerHoursInADay: number;
    pumpFailure: boolean;
    /** A dose is due and neither ticked nor skipped. */
    dueDoseOpen: boolean;
    doubtfulTick: boolean;
    /** The cover came off after a week or more. */
    coverOffAfterAWeek: boolean;
    /** A situation was ended before its rule was met. */
    situationEndedEarly: boolean;
  };
  /** What is wrong until somebody says that it is over. */
  open: {
    cloudy: boolean;
    green: boolean;
    accident: boolean;
    drainCoverBroken: boolean;
    /** Another situation is open that keeps everybody out: thunder, a cover or a pool that is being opened. */
    situationOpen: boolean;
    /** Somebody felt a tingle at the water, or the pump room is wet. */
    electricitySuspected: boolean;
    suspectedDoubleDose: boolean;
    falseZero: boolean;
  };
  /** What is expected: rain [mm], of which the part after now counts; swimmer-hours, one entry a day, none of it from before the reading. */
  ahead?: { rain?: readonly SpreadAmount[]; swimmerHours?: readonly SpreadAmount[] };
};
