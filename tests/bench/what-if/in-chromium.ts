import { join } from 'node:path';
import { build } from 'esbuild';
import { chromium } from 'playwright-core';
import type { Took } from './in-browser';

/** The engine in Chromium: the median's week on the page, the likely range in a worker beside it. */
export async function timeInChromium(): Promise<{ median: Took; band: Took; kilobytes: number }> {
  const root = join(import.meta.dirname, '../../..');
  const bundled = await build({
    entryPoints: [join(import.meta.dirname, 'in-browser.ts')],
    bundle: true,
    minify: true,
    format: 'iife',
    alias: { '@': root },
    write: false,
  });
  const script = bundled.outputFiles[0]!.text;
  const browser = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH || '/usr/bin/chromium',
    args: ['--no-sandbox'],
  });
  try {
    const page = await browser.newPage();
    await page.addScriptTag({ content: script });
    const median = await page.evaluate(() => timeMedian());
    const band = await page.evaluate(
      (code) =>
        new Promise<Took>((resolve, reject) => {
          const source = new Blob([`${code};postMessage(timeBand())`], { type: 'text/javascript' });
          const worker = new Worker(URL.createObjectURL(source));
          worker.onmessage = ({ data }: MessageEvent<Took>) => resolve(data);
          worker.onerror = ({ message }) => reject(new Error(message));
        }),
      script,
    );
    return { median, band, kilobytes: script.length / 1000 };
  } finally {
    await browser.close();
  }
}
