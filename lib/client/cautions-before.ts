import type { SituationKind } from '@/lib/schemas/situation';
import { type Caution, severityOf } from '@/lib/situations/codes';

/**
 * What holds before any question is answered, in the order in which it protects. Once a procedure is open it brings its own.
 */
const codes: Record<SituationKind, readonly Caution[]> = {
  accident: ['everyone-out', 'no-time-for-loose-stool', 'gloves-and-net', 'nobody-ill-swims'],
  clearing: ['nobody-in-cloudy', 'never-mix', 'nothing-of-ours'],
  'combined-chlorine': ['never-mix'],
  'drain-cover': ['drain-holds'],
  'quick-raise': ['never-mix'],
  storm: ['thunder', 'shock', 'wet-pump-room'],
  cover: ['half-open-cover', 'no-floater-under-cover'],
  stain: ['metals', 'nothing-of-ours'],
  away: ['bottle-and-gate'],
  'stabilizer-high': ['shell-can-float', 'pump-before-skimmer', 'outlet'],
  'hardness-high': ['shell-can-float', 'pump-before-skimmer', 'outlet'],
  opening: ['nobody-in-cloudy', 'drain-holds', 'half-open-cover', 'never-mix'],
  closing: ['half-open-cover', 'never-mix', 'no-floater-under-cover'],
};

/** The cautions of a kind before it is begun, each with how much harm it keeps away. */
export function cautionsBefore(kind: SituationKind) {
  return codes[kind].map((code) => ({ code, severity: severityOf(code) }));
}
