import { firstWeek } from './journeys/first-week';
import type { Journey } from './support/journey';

/** Every journey of a run, the long ones first. */
export const journeys: readonly Journey[] = [firstWeek];
