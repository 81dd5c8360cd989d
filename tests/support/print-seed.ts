import { propertySeed } from './property-seed';

/** Once per run: a failure of a property can be replayed with this seed. */
export default function printSeed() {
  console.log(`seed: PROPERTY_SEED=${propertySeed}`);
}
