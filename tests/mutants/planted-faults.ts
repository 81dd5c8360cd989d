import { chemistryFaults } from './chemistry-faults';
import { learningFaults } from './learning-faults';
import type { PlantedFault } from './planted-fault';
import { ruleFaults } from './rule-faults';
import { weekFaults } from './week-faults';

/** Every planted fault; the list grows with the product. */
export const plantedFaults: readonly PlantedFault[] = [
  ...chemistryFaults,
  ...weekFaults,
  ...ruleFaults,
  ...learningFaults,
];
