import { describe } from 'vitest';
import { testRows } from './row';
import { weekPlanRows } from './rows/week-plan';

describe('what a week’s plan keeps of the care paper', () => testRows(weekPlanRows));
