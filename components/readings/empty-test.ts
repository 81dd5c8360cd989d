import type { UnitSystem } from '@/lib/units/unit';
import type { TestDraft } from './test-draft-schema';

/** A test of which nothing is written down yet. */
export function emptyTest(
  id: string,
  kind: TestDraft['kind'],
  method: TestDraft['method'],
  system: UnitSystem,
): TestDraft {
  return {
    id,
    kind,
    method,
    time: null,
    look: 'clear',
    strip: {},
    typed: {},
    system,
    confirmed: [],
    zeroAnswer: null,
    zeroFor: '',
    correcting: false,
  };
}
