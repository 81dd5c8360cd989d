/** `npm run licences` writes docs/licences.md anew, and ends with 1 when a licence is not allowed. */
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { licenceList, licenceProblem, productionPackages } from './licences';

const root = join(import.meta.dirname, '../..');
const packages = productionPackages(root);
const problems = packages.map(licenceProblem).filter((problem) => problem !== undefined);
for (const problem of problems) console.error(problem);
writeFileSync(join(root, 'docs/licences.md'), licenceList(packages));
console.log(`${packages.length} packages, ${problems.length} not allowed`);
process.exitCode = problems.length === 0 ? 0 : 1;
