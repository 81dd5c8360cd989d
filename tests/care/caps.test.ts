import { describe } from 'vitest';
import { testRows } from './row';
import { capRows } from './rows/caps';

describe('caps per evening, row by row', () => testRows(capRows));
