import type { Bottle } from './bottle';
import { asked, type Entered, middleOf } from './entered';
import { isPermitted, isUsual, likelyTypo } from './likely-typo';
import { type EntryQuantity, permitted } from './quantities';
import { confirmationOf } from './test-draft';
import type { TestDraft } from './test-draft-schema';
import { typedValue } from './typed-value';

/** Why a field cannot be taken as it stands. `likely`: what was probably meant. mg/L, pH, degrees C. */
export type Doubt =
  | { kind: 'unreadable'; quantity: EntryQuantity }
  | { kind: 'outside'; quantity: EntryQuantity; range: readonly [number, number]; likely: number | undefined }
  | { kind: 'unlikely'; quantity: EntryQuantity; value: number; likely: number | undefined }
  | { kind: 'total-below-free'; quantity: 'totalChlorine' };

/** Everything in a test that has to be answered before it is saved; the field in which somebody is typing may wait. */
export function doubtsOf(draft: TestDraft, entered: Entered, bottle: Bottle, typing: EntryQuantity | null): Doubt[] {
  const quantities = asked(draft, bottle);
  return [
    ...quantities.flatMap((quantity) => (quantity === typing ? [] : typedDoubt(draft, quantity))),
    ...(typing === 'totalChlorine' || typing === 'freeChlorine' ? [] : totalDoubt(entered)),
  ];
}

function typedDoubt(draft: TestDraft, quantity: EntryQuantity): Doubt[] {
  const text = draft.typed[quantity] ?? '';
  // A strip has printed steps and nothing to mistype.
  if (text.trim() === '' || (draft.method === 'strip' && quantity !== 'temperature')) return [];
  const value = typedValue(text, quantity, draft.system);
  if (value === undefined) return [{ kind: 'unreadable', quantity }];
  const likely = likelyTypo(quantity, value, draft.system);
  if (!isPermitted(quantity, value)) return [{ kind: 'outside', quantity, range: permitted(quantity), likely }];
  if (isUsual(quantity, value) || draft.confirmed.includes(confirmationOf(quantity, text))) return [];
  return [{ kind: 'unlikely', quantity, value, likely }];
}

/** Total chlorine holds the free chlorine. Read the other way round, one of the two is wrong. */
function totalDoubt({ totalChlorine, freeChlorine }: Entered): Doubt[] {
  if (totalChlorine === undefined || freeChlorine === undefined) return [];
  return middleOf(totalChlorine) < middleOf(freeChlorine)
    ? [{ kind: 'total-below-free', quantity: 'totalChlorine' }]
    : [];
}
