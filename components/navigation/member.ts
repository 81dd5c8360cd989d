import type { Role } from '@/lib/schemas/week-sheet';

export type FramePerson = { name: string; role: Role };

/** What the bars show of a household; the layout of the signed-in pages hands it in. */
export type HouseholdFrame = {
  householdName: string;
  you: FramePerson;
  /** Whose faces are shown, you among them. */
  people: readonly FramePerson[];
};
