import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import config from '@/tailwind.config';

const css = readFileSync(join(import.meta.dirname, '../../../app/globals.css'), 'utf8');

/** The colour variables of the first block whose selector is exactly this. */
function blockOf(selector: string): Map<string, string> {
  const start = css.indexOf(`${selector} {`);
  const body = css.slice(start, css.indexOf('}', start));
  return new Map(
    [...body.matchAll(/--([\w-]+): (#[0-9a-f]{6}|rgba\([^)]*\));/g)].map(([, name, value]) => [
      name ?? '',
      value ?? '',
    ]),
  );
}

const light = blockOf(':root');
const dark = blockOf(":root[data-theme='dark']");
const darkByDevice = blockOf(":root:not([data-theme='light'])");

it('has a value in both themes for every colour that a class can name', () => {
  const tokens = Object.values(config.theme.colors).flatMap((value) => /^var\(--(.*)\)$/.exec(value)?.[1] ?? []);
  expect(tokens.length).toBeGreaterThan(20);
  expect([...light.keys()].sort()).toEqual([...tokens].sort());
  expect([...dark.keys()].sort()).toEqual([...tokens].sort());
});

it('is as dark by the wish of the device as by the attribute', () => {
  expect([...darkByDevice]).toEqual([...dark]);
});

// Spot values of the visual language.
it.each([
  [light, 'paper', '#f7f4ec'],
  [light, 'ink', '#12303a'],
  [light, 'teal', '#0e7c86'],
  [light, 'terra-ink', '#a33b24'],
  [dark, 'paper', '#0f232b'],
  [dark, 'ink', '#f1ede0'],
  [dark, 'teal', '#5ec4c6'],
  [dark, 'terra-ink', '#f7a58c'],
] as const)('keeps the printed values', (theme, token, value) => {
  expect(theme.get(token)).toBe(value);
});

/** Relative luminance and contrast as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((from) => {
    const share = Number.parseInt(hex.slice(from, from + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(one: string, other: string): number {
  const [a, b] = [luminance(one), luminance(other)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

const words = ['ink', 'ink-2', 'ink-3', 'teal-ink', 'plum-ink', 'ochre-ink', 'terra-ink'];
const grounds = ['paper', 'paper-past', 'paper-lift', 'care-wash', 'water-2'];
const marks = ['teal', 'plum', 'ochre', 'terra'];

it.each([
  ['light', light],
  ['dark', dark],
])('reads well in the %s theme', (_name, theme) => {
  const at = (token: string) => theme.get(token) ?? '';
  for (const ground of grounds) {
    for (const word of words)
      expect(contrast(at(word), at(ground)), `${word} on ${ground}`).toBeGreaterThanOrEqual(4.5);
  }
  for (const mark of marks) expect(contrast(at(mark), at('paper')), `${mark} on paper`).toBeGreaterThanOrEqual(3);
  expect(contrast(at('on-ink'), at('ink'))).toBeGreaterThanOrEqual(4.5);
  expect(contrast(at('on-terra'), at('terra-button'))).toBeGreaterThanOrEqual(4.5);
});
