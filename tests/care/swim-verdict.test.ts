import { describe } from 'vitest';
import { testRows } from './row';
import { swimVerdictRows } from './rows/swim-verdict';

describe('the swim verdict, row by row', () => testRows(swimVerdictRows));
