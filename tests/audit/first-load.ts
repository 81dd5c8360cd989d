import { gzipSync } from 'node:zlib';

const KILOBYTE = 1000;

/**
 * What a browser has to fetch of scripts before a page is whole [kB, gzip]: those that its HTML names. What the page fetches
 * by itself later, after the first paint or at first use, is not among them.
 */
export async function firstLoadKilobytes(address: string, cookie: string): Promise<number> {
  const html = await textOf(address, cookie);
  const sizes = await Promise.all(
    scriptsNamedIn(html).map(async (path) => gzipSync(await textOf(new URL(path, address).href, cookie), { level: 9 })),
  );
  return sizes.reduce((sum, { length }) => sum + length, 0) / KILOBYTE;
}

/** Scripts that a page of HTML runs or asks to have ready; those for browsers without modules are never fetched. */
export function scriptsNamedIn(html: string): string[] {
  const tags = html.match(/<(?:script|link)\b[^>]*>/g) ?? [];
  const paths = tags.flatMap((tag) => {
    if (/\bnomodule\b/i.test(tag)) return [];
    const script = /^<script\b.*?\bsrc="([^"]+)"/.exec(tag)?.[1];
    const ready = /\bas="script"/.test(tag) ? /\bhref="([^"]+)"/.exec(tag)?.[1] : undefined;
    return [script ?? ready].filter((path) => path !== undefined);
  });
  return [...new Set(paths.map((path) => path.replaceAll('&amp;', '&')))];
}

async function textOf(address: string, cookie: string): Promise<string> {
  const response = await fetch(address, { headers: cookie === '' ? {} : { cookie }, redirect: 'manual' });
  if (response.status !== 200) throw new Error(`${address} answered ${response.status}`);
  return response.text();
}
