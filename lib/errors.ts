/**
 * The closed list of failures that a person can cause and can be told about. Anything else that is thrown is a bug:
 * it is logged with an id and shown as "something went wrong on our side".
 */
export type ErrorCode =
  | 'invalid-input'
  | 'signed-out'
  | 'wrong-sign-in'
  | 'not-allowed'
  | 'not-found'
  | 'conflict'
  | 'too-many-requests'
  | 'water-out-of-range'
  | 'target-unreachable'
  | 'plan-refused'
  | 'engine-busy';

export type FieldProblem = { path: string; message: string };

export class AppError extends Error {
  readonly code: ErrorCode;
  readonly problems: readonly FieldProblem[];
  /** When another try makes sense, where that is known. */
  readonly retryAfterSeconds: number | undefined;

  constructor(
    code: ErrorCode,
    message: string,
    options?: ErrorOptions & { problems?: readonly FieldProblem[]; retryAfterSeconds?: number },
  ) {
    super(message, options);
    this.name = new.target.name;
    this.code = code;
    this.problems = options?.problems ?? [];
    this.retryAfterSeconds = options?.retryAfterSeconds;
  }
}

/** A value outside what the water model permits. Names the field, the value and the permitted range. */
export class WaterRangeError extends AppError {
  readonly field: string;
  readonly value: number;
  readonly low: number;
  readonly high: number;

  constructor(field: string, value: number, low: number, high: number) {
    super('water-out-of-range', `${field} is ${value}; the water model permits ${low} to ${high}.`);
    this.field = field;
    this.value = value;
    this.low = low;
    this.high = high;
  }
}

/** No amount of this product brings the water to the wanted value. */
export class UnreachableTargetError extends AppError {
  constructor(quantity: string, target: number, substance: string) {
    super('target-unreachable', `No amount of ${substance} brings ${quantity} to ${target}.`);
  }
}
