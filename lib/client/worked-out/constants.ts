import { companionConstants } from './companion-constants';
import { learningConstants } from './learning-constants';
import { plannerConstants } from './planner-constants';
import { productConstants } from './product-constants';
import { ruleConstants } from './rule-constants';
import { situationConstants } from './situation-constants';
import { waterConstants } from './water-constants';
import { weekConstants } from './week-constants';

/** Every constant in use, in groups; the help page prints them all, each with its source. */
export const constantGroups = [
  ...waterConstants,
  ...productConstants,
  ...weekConstants,
  ...ruleConstants,
  ...companionConstants,
  ...situationConstants,
  ...learningConstants,
  ...plannerConstants,
] as const;

export type ListedGroup = (typeof constantGroups)[number];
export type ListedConstant = ListedGroup['constants'][number];
