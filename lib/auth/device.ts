import type { Device } from '@/lib/schemas/device';

/** Whoever writes a name into their own first comes before those whose name they write as well. */
const browserMarks: readonly (readonly [RegExp, NonNullable<Device['browser']>])[] = [
  [/Edg(e|A|iOS)?\//, 'edge'],
  [/OPR\/|OPT\/|Opera/, 'opera'],
  [/SamsungBrowser\//, 'samsung-internet'],
  [/Firefox\/|FxiOS\//, 'firefox'],
  [/Chrome\/|CriOS\/|Chromium\//, 'chrome'],
  [/Safari\//, 'safari'],
];
const systemMarks: readonly (readonly [RegExp, NonNullable<Device['system']>])[] = [
  [/iPhone|iPod/, 'iphone'],
  [/iPad/, 'ipad'],
  [/Android/, 'android'],
  [/CrOS/, 'chrome-os'],
  [/Windows/, 'windows'],
  [/Macintosh/, 'mac'],
  [/Linux|X11/, 'linux'],
];

/** Characters; no browser says as much of itself. */
const LONGEST = 1_000;

/** What a browser says of itself, in two words of a closed list; null when it says neither. */
export function deviceOf(userAgent: string | null): Device | null {
  const said = (userAgent ?? '').slice(0, LONGEST);
  const browser = browserMarks.find(([mark]) => mark.test(said))?.[1] ?? null;
  const system = systemMarks.find(([mark]) => mark.test(said))?.[1] ?? null;
  return browser === null && system === null ? null : { browser, system };
}
