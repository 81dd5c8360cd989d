import { type Situation, type SituationKind, situationSchema } from '@/lib/schemas/situation';

/** What was chosen or typed so far, by the name of its question; absent where nothing was. */
export type Draft = Readonly<Record<string, string>>;

const yesOrNo = ['no', 'yes'] as const;
const ground = { name: 'ground', as: 'segments', answers: ['no', 'yes', 'unsure'] } as const;
const startsOn = { name: 'startsOn', as: 'day' } as const;

/** The questions of each kind, in their order. Some are asked only after another's answer. */
const questions = {
  accident: [
    { name: 'what', as: 'rows', answers: ['formed-stool', 'loose-stool', 'vomit', 'blood', 'dead-animal'] },
    { name: 'moreThanSwallowedWater', as: 'segments', answers: yesOrNo, after: { what: 'vomit' } },
    { name: 'animal', as: 'segments', answers: ['raccoon-calf-lamb', 'other'], after: { what: 'dead-animal' } },
  ],
  clearing: [
    { name: 'drain', as: 'segments', answers: ['plainly', 'hazy', 'not-at-all'] },
    { name: 'look', as: 'segments', answers: ['milky', 'green', 'spots-or-stain'] },
    { name: 'addedInLastDay', as: 'segments', answers: yesOrNo },
  ],
  'combined-chlorine': [],
  'drain-cover': [],
  'quick-raise': [],
  storm: [
    { name: 'pumpRoom', as: 'segments', answers: ['dry', 'wet'] },
    { name: 'shock', as: 'segments', answers: yesOrNo },
  ],
  cover: [
    { name: 'covered', as: 'segments', answers: ['days', 'week-or-more'] },
    { name: 'floaterUnder', as: 'segments', answers: yesOrNo },
  ],
  stain: [],
  away: [
    { name: 'leavesOn', as: 'day' },
    { name: 'backOn', as: 'day' },
    { name: 'care', as: 'rows', answers: ['nobody', 'adult', 'closed'] },
    { name: 'name', as: 'text', after: { care: 'adult' } },
  ],
  'stabilizer-high': [ground],
  'hardness-high': [ground],
  opening: [startsOn],
  closing: [startsOn],
} as const satisfies Record<SituationKind, readonly Shape[]>;

type Shape = {
  name: string;
  as: 'segments' | 'rows' | 'day' | 'text';
  answers?: readonly string[];
  after?: Draft;
};
type Known = (typeof questions)[SituationKind][number];
export type QuestionName = Known['name'];
export type Answer = Extract<Known, { answers: readonly string[] }>['answers'][number];
export type Question = Omit<Shape, 'name' | 'answers'> & { name: QuestionName; answers?: readonly Answer[] };

export function questionsOf(kind: SituationKind): readonly Question[] {
  return questions[kind];
}

/** Those that the answers so far ask for. */
export function askedNow(kind: SituationKind, draft: Draft): Question[] {
  return questionsOf(kind).filter(({ after = {} }) =>
    Object.entries(after).every(([name, answer]) => draft[name] === answer),
  );
}

/** What is missing or does not fit, by the name of its question; `undefined` words: nothing was answered. */
export type Problems = Readonly<Partial<Record<QuestionName, string | undefined>>>;

/** The answers as the procedure takes them, or what is wrong with them. */
export function readAnswers(kind: SituationKind, draft: Draft): { situation: Situation } | { problems: Problems } {
  const asked = askedNow(kind, draft);
  const missing = asked.filter(({ name }) => !draft[name]?.trim());
  const answers = Object.fromEntries(asked.map(({ name }) => [name, draft[name]]));
  const read = situationSchema.safeParse({ kind, answers });
  if (missing.length === 0 && read.success) return { situation: read.data };
  const wrong = (read.error?.issues ?? []).map(({ path, message }) => [path[1], message]);
  return {
    problems: { ...Object.fromEntries(wrong), ...Object.fromEntries(missing.map(({ name }) => [name, undefined])) },
  };
}

/** Answers that were given, as a draft again. */
export function draftOf({ answers }: Situation): Draft {
  return Object.fromEntries(
    Object.entries(answers).flatMap(([name, answer]) => (typeof answer === 'string' ? [[name, answer]] : [])),
  );
}
