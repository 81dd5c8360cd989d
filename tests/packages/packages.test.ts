import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { licenceList, licenceProblem, productionPackages } from './licences';
import { readAudit } from './npm-audit';
import { markers, reachedBrowser } from './reached-browser';

const root = join(import.meta.dirname, '../..');

describe('licences', () => {
  const packages = productionPackages(root);

  it('of everything that production installs are allowed', () => {
    expect(packages.length).toBeGreaterThan(100);
    expect(packages.map(licenceProblem).filter(Boolean)).toEqual([]);
  });

  it('stand in docs/licences.md (npm run licences writes it anew)', () => {
    expect(readFileSync(join(root, 'docs/licences.md'), 'utf8')).toBe(licenceList(packages));
  });

  it.each([
    ['GPL-3.0-only', 'x', false],
    ['none', 'x', false],
    ['SEE LICENSE IN LICENSE', 'x', false],
    ['MIT AND GPL-3.0-only', 'x', false],
    ['MIT OR GPL-3.0-only', 'x', true],
    ['(MIT OR CC0-1.0)', 'x', true],
    ['MPL-2.0', 'lightningcss-linux-x64-gnu', true],
    ['MPL-2.0', 'x', false],
    ['LGPL-3.0-or-later', '@img/sharp-libvips-linux-x64', true],
    ['LGPL-3.0-or-later', 'x', false],
  ])('%s of %s: %s', (licence, name, fine) => {
    expect(licenceProblem({ name, version: '1.0.0', licence }) === undefined).toBe(fine);
  });
});

describe('what reached the browser', () => {
  const secret = 'the secret of this test, long enough to be one';
  const sought = markers(root, [secret]);

  it.each([
    [
      'a service',
      'throw new A("wrong-sign-in","You do not belong to a household, or your time there is over. Ask its owner.")',
    ],
    ['a query', 'e.sql`INSERT INTO "people"`'],
    ['a table', 'let t=r("rate_limits",{key:n("key")})'],
    ['the database package', 'static [Symbol.for("drizzle:entityKind")]="SQLiteTable"'],
    [
      'the mark of server code',
      'throw Error("This module cannot be imported from a Client Component module. It should")',
    ],
    ['a setting', 'process.env.WADEWELL_SECRET'],
    ['a part of Node.js', 'require("node:crypto").createHmac'],
    ['a secret', `fetch("/x",{headers:{key:"${secret}"}})`],
    ['password hashing', 'hash(p,{memoryCost:19456})'],
    ['mail', 'this.name="nodemailer"'],
  ])('finds %s in a planted chunk', (_, text) => {
    const found = reachedBrowser([{ name: 'chunks/planted.js', text: `(()=>{${text}})()` }], sought);
    expect(found.join('\n')).toContain('chunks/planted.js holds');
    expect(found.join('\n')).not.toContain(secret);
  });

  it('finds nothing in what belongs there', () => {
    const text =
      'fetch("/api/readings"),t("readings.saved.title"),"Server Component",localStorage.getItem("wadewell.test")';
    expect(reachedBrowser([{ name: 'chunks/page.js', text }], sought)).toEqual([]);
  });

  it('seeks enough: sentences of services, and every table with a name of its own', () => {
    const of = (what: string) => sought.filter((marker) => marker.what === what).length;
    expect(of('a sentence of a service')).toBeGreaterThan(60);
    expect(of('a table')).toBeGreaterThan(15);
  });
});

describe('npm audit', () => {
  const report = (vulnerabilities: object, prod = 300) =>
    JSON.stringify({ auditReportVersion: 2, vulnerabilities, metadata: { dependencies: { prod } } });

  it('has passed when it looked and found nothing', () => {
    expect(readAudit(report({}))).toEqual({ verdict: 'passed', lines: [] });
  });

  it('has failed when it found something', () => {
    const found = { left: { name: 'left', severity: 'high', range: '<2.0.0' } };
    expect(readAudit(report(found))).toEqual({ verdict: 'failed', lines: ['high: left <2.0.0'] });
  });

  it.each([
    ['', 'the registry did not answer'],
    ['no json', 'the registry did not answer'],
    [JSON.stringify({ message: '405 Method Not Allowed', statusCode: 405 }), '405 Method Not Allowed'],
    [report({}, 0), 'the registry did not answer'],
  ])('was not run when %j came back', (output, why) => {
    expect(readAudit(output)).toEqual({ verdict: 'not run', lines: [why] });
  });
});
