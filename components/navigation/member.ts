/** What the bars show of a household; the layout of the signed-in pages hands it in. */
export type FrameRole = 'owner' | 'caretaker' | 'viewer';

export type FramePerson = { name: string; role: FrameRole };

export type HouseholdFrame = {
  householdName: string;
  you: FramePerson;
  /** Everyone in the household, you among them. */
  people: readonly FramePerson[];
  isDemo: boolean;
};
