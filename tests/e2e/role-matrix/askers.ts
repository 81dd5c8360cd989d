/** Who asks. One household is asked about; the stranger owns another one, the expired member's time in it is over. */
export const askers = [
  'nobody',
  'viewer',
  'caretaker',
  'dosing caretaker',
  'owner',
  'stranger',
  'expired member',
] as const;
export type Asker = (typeof askers)[number];
export type Member = Exclude<Asker, 'nobody'>;

/** May be told nothing of the household. */
export const outsiders: readonly Asker[] = ['nobody', 'stranger', 'expired member'];

/**
 * `done`: 200. `own`: 200 as well, but in the asker's own household, and nothing of the first one is touched or told. A number
 * refuses with it. `to ...` sends to another page.
 */
export type Answer = 'done' | 'own' | 401 | 403 | 404 | 409 | `to ${string}`;
export type Answers = Record<Asker, Answer>;

/** Those of the household to whom something is allowed, as product.md's 'People and roles' has it. */
const membersIn = {
  'everyone in the household': ['viewer', 'caretaker', 'dosing caretaker', 'owner'],
  carers: ['caretaker', 'dosing caretaker', 'owner'],
  'chemical handlers': ['dosing caretaker', 'owner'],
  owners: ['owner'],
} as const satisfies Record<string, readonly Asker[]>;

export type Group = keyof typeof membersIn | 'anybody signed in' | 'anybody';

/**
 * What a route answers each asker. Whoever belongs to the household and may not is refused with 403, as is whoever belongs to
 * none; a thing of another household is not there (404), whatever its owner may do at home.
 */
export function answersOfRoute(group: Group, aboutThing: boolean): Answers {
  const everybody = (answer: Answer) => Object.fromEntries(askers.map((asker) => [asker, answer])) as Answers;
  if (group === 'anybody') return everybody('done');
  if (group === 'anybody signed in') return { ...everybody('done'), nobody: 401 };
  const allowed = Object.fromEntries(membersIn[group].map((asker) => [asker, 'done' as const]));
  return { ...everybody(403), ...allowed, nobody: 401, stranger: aboutThing ? 404 : 'own' };
}

/** What a page answers each asker: who may not see it is sent to sign in, a stranger sees their own household. */
export function answersOfPage(group: 'anybody' | 'everyone in the household'): Answers {
  const all = Object.fromEntries(askers.map((asker) => [asker, 'done'])) as Answers;
  if (group === 'anybody') return { ...all, stranger: 'own' };
  return { ...all, nobody: 'to /sign-in', 'expired member': 'to /sign-in', stranger: 'own' };
}
