import lighthouse from 'lighthouse';
import { median } from './median';

/** Scores out of 100, and how far things moved while the page came. */
export type Scores = { performance: number; accessibility: number; bestPractices: number; layoutShift: number };

const categories = ['performance', 'accessibility', 'best-practices'];

/**
 * What Lighthouse says of a page on its phone: slow network, a quarter of this machine's speed. Medians of so many runs.
 *
 * @param port where a browser listens for its developer tools
 */
export async function scoresOf(
  address: string,
  { cookie, port, runs }: { cookie: string; port: number; runs: number },
): Promise<Scores & { faults: string[] }> {
  const all: (Scores & { faults: string[] })[] = [];
  for (let run = 0; run < runs; run++) all.push(await oneRun(address, cookie, port));
  const each = (name: keyof Scores) => median(all.map((scores) => scores[name]));
  return {
    performance: each('performance'),
    accessibility: each('accessibility'),
    bestPractices: each('bestPractices'),
    layoutShift: each('layoutShift'),
    faults: [...new Set(all.flatMap(({ faults }) => faults))],
  };
}

async function oneRun(address: string, cookie: string, port: number): Promise<Scores & { faults: string[] }> {
  const result = await lighthouse(address, {
    port,
    onlyCategories: categories,
    logLevel: 'silent',
    output: 'json',
    ...(cookie === '' ? {} : { extraHeaders: { Cookie: cookie } }),
  });
  if (!result) throw new Error(`Lighthouse gave no result for ${address}`);
  const { lhr } = result;
  if (lhr.runtimeError) throw new Error(`Lighthouse at ${address}: ${lhr.runtimeError.message}`);
  const score = (name: string) => Math.round((lhr.categories[name]?.score ?? 0) * 100);
  // What costs points in the two categories that have to be whole.
  const judged = [lhr.categories.accessibility, lhr.categories['best-practices']].flatMap(
    (category) => category?.auditRefs.filter(({ weight }) => weight > 0).map(({ id }) => id) ?? [],
  );
  const faults = judged.filter((id) => {
    const { score: points } = lhr.audits[id] ?? {};
    return typeof points === 'number' && points < 1;
  });
  return {
    performance: score('performance'),
    accessibility: score('accessibility'),
    bestPractices: score('best-practices'),
    layoutShift: lhr.audits['cumulative-layout-shift']?.numericValue ?? NaN,
    faults,
  };
}
