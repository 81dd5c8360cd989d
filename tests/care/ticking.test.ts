import { beforeAll, describe } from 'vitest';
import { planWith } from '@/tests/support/engine';
import { testRows } from './row';
import { prepareHousehold, tickingRows } from './rows/ticking';

planWith();
beforeAll(prepareHousehold);

describe('what a household may tick, and what that says', { timeout: 60_000 }, () => testRows(tickingRows));
