import { describe } from 'vitest';
import { testRows } from './row';
import { sentenceRows } from './rows/sentences';

describe('what the care paper wants said', () => testRows(sentenceRows));
