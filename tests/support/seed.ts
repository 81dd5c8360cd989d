import fc from 'fast-check';
import { propertySeed } from './property-seed';

fc.configureGlobal({ seed: propertySeed, verbose: fc.VerbosityLevel.Verbose });
