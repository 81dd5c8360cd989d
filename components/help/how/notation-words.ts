/** The words that stand between the symbols of an equation. */
export const notationWords = [
  ...(['or', 'loss', 'bound', 'under', 'over', 'withoutStabilizer', 'runningHours', 'life'] as const),
  ...(['rectangle', 'oval', 'round', 'kidney', 'slopingBottom', 'shallow', 'deep'] as const),
  ...(['siderealTime', 'mass', 'strength', 'dissolvedSolids', 'uncharged', 'hardness', 'alkalinity'] as const),
] as const;
export type NotationWord = (typeof notationWords)[number];

/** The word of a name; an equation that names another is a mistake in it. */
export function notationWord(name: string): NotationWord {
  const word = notationWords.find((each) => each === name);
  if (word === undefined) throw new Error(`no word ${name} for equations`);
  return word;
}
