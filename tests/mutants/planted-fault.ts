/** One fault that somebody could make, and the tests that have to notice it. */
export type PlantedFault = {
  /** Where, from the root. */
  file: string;
  /** The sound text; it stands in the file exactly once. */
  find: string;
  /** What is put in its place. */
  plant: string;
  /** The test files of which at least one has to turn red. */
  noticedBy: readonly string[];
  /** What is wrong with it, in words. */
  fault: string;
};
