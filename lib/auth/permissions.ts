import { AppError } from '@/lib/errors';
import type { Role } from '@/lib/schemas/week-sheet';

type Rule = { roles: readonly Role[]; handlesChemicals?: true; otherwise: string };

const everyone = ['owner', 'caretaker', 'viewer'] as const;
const carers = ['owner', 'caretaker'] as const;
const owners = ['owner'] as const;

const onlyOwners = 'Only an owner of this household can change that.';
const onlyCarers = 'You can look at this household, but not change it.';

/** What each role may do, in one table; what is refused is said in words. */
const rules = {
  look: { roles: everyone, otherwise: 'You cannot see this household.' },
  invite: { roles: owners, otherwise: 'Only an owner can invite, change or remove members.' },
  'hand-over': { roles: owners, otherwise: 'Only an owner can hand the pool over or take it back.' },
  'read-audit-trail': { roles: owners, otherwise: 'Only an owner can see who changed what.' },
  'change-household': { roles: owners, otherwise: onlyOwners },
  'close-household': { roles: owners, otherwise: 'Only an owner can close this household.' },
  'change-pool': { roles: owners, otherwise: onlyOwners },
  'reset-learning': { roles: owners, otherwise: 'Only an owner can let the pool be learnt anew.' },
  'change-preferences': { roles: owners, otherwise: onlyOwners },
  'change-shelf': { roles: owners, otherwise: 'Only an owner can add or remove products. You can count what is left.' },
  'count-stock': { roles: carers, otherwise: onlyCarers },
  'enter-tests': { roles: carers, otherwise: onlyCarers },
  'correct-any-test': { roles: owners, otherwise: 'Only an owner can correct the tests of others.' },
  'do-rounds': { roles: carers, otherwise: onlyCarers },
  'report-events': { roles: carers, otherwise: onlyCarers },
  'open-situations': { roles: carers, otherwise: onlyCarers },
  'add-photos': { roles: carers, otherwise: onlyCarers },
  'remove-any-photo': { roles: owners, otherwise: 'Only an owner can take away the photos of others.' },
  'keep-house-notes': { roles: carers, otherwise: onlyCarers },
  'change-week-ahead': { roles: carers, otherwise: onlyCarers },
  plan: { roles: carers, otherwise: onlyCarers },
  'read-safety-card': { roles: carers, otherwise: onlyCarers },
  'tick-doses': {
    roles: carers,
    handlesChemicals: true,
    otherwise: 'Only members who handle chemicals, and have read the safety card this season, can tick doses.',
  },
} as const satisfies Record<string, Rule>;

export type Permission = keyof typeof rules;
export type Asker = { role: Role; handlesChemicals: boolean };

export function may(asker: Asker, permission: Permission): boolean {
  const rule: Rule = rules[permission];
  return rule.roles.includes(asker.role) && (!rule.handlesChemicals || asker.handlesChemicals);
}

/** Error: `not-allowed`, with the reason in words. */
export function assertMay(asker: Asker, permission: Permission): void {
  if (!may(asker, permission)) throw new AppError('not-allowed', rules[permission].otherwise);
}
