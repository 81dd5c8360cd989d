/**
 * For each rule of ours about what code does: code that breaks it, and what to write instead, in the same folder.
 * `says` is a part of the message, which is to tell the reader where to turn.
 */
type LintPlant = { rule: string; says: string; folder: string; wrong: string; right: string };

const syntax = 'no-restricted-syntax';
const clock = { rule: syntax, says: 'take the instant as an argument' };
const toNumber = { rule: syntax, says: 'lib/units/parse' };
const toText = { rule: syntax, says: 'lib/units/format' };
const dates = { rule: syntax, says: 'lib/calendar' };
const colour = { rule: syntax, says: 'tokens' };
const outside = { rule: 'no-restricted-globals', says: 'as an argument' };
const aTsx = (jsx: string) => `export const Shown = () => ${jsx};`;

export const lintPlants: LintPlant[] = [
  // Clock, chance and the world outside, in the pure folders.
  {
    ...clock,
    folder: 'lib/chemistry',
    wrong: 'export const at = () => Date.now();',
    right: 'export const at = (now: number) => now;',
  },
  {
    ...clock,
    folder: 'lib/units',
    wrong: 'export const at = () => new Date();',
    right: 'export const at = (now: number) => new Date(now);',
  },
  {
    ...clock,
    folder: 'lib/calendar',
    wrong: 'export const at = () => Date();',
    right: 'export const at = (text: string) => Date.parse(text);',
  },
  {
    rule: 'no-restricted-imports',
    says: 'take the instant as an argument',
    folder: 'lib/calendar',
    wrong: "export * as Now from 'temporal-polyfill/fns/Now';",
    right: "export * as PlainDate from 'temporal-polyfill/fns/PlainDate';",
  },
  {
    rule: syntax,
    says: 'take a seed',
    folder: 'lib/projection',
    wrong: 'export const draw = () => Math.random();',
    right: 'export const draw = (random: () => number) => Math.max(0, random());',
  },
  {
    ...outside,
    folder: 'lib/sun',
    wrong: "export const sky = () => fetch('/sky');",
    right: 'export const sky = (fetched: string) => fetched;',
  },
  {
    ...outside,
    folder: 'lib/planner',
    wrong: 'export const node = process.version;',
    right: 'export const node = (version: string) => version;',
  },
  {
    ...outside,
    folder: 'lib/verdict',
    wrong: 'export const seen = () => performance.now();',
    right: 'export const seen = (at: number) => at;',
  },
  {
    rule: 'no-restricted-imports',
    says: 'no input or output',
    folder: 'lib/storage',
    wrong: "export { readFileSync } from 'node:fs';",
    right: "export type { CalendarDay } from '@/lib/calendar/household-day';",
  },
  // Numbers and dates have one way in and one way out.
  {
    ...toNumber,
    folder: 'components/readings',
    wrong: 'export const read = (text: string) => parseFloat(text);',
    right: "export { parseDecimal } from '@/lib/units/parse';",
  },
  {
    ...toNumber,
    folder: 'lib/services',
    wrong: 'export const read = (text: string) => Number(text);',
    right: 'export const read = (value: number) => Number.isFinite(value);',
  },
  {
    ...toNumber,
    folder: 'app/week',
    wrong: 'export const read = (text: string) => +text;',
    right: 'export const read = (value: number) => -value;',
  },
  {
    ...toNumber,
    folder: 'lib/season',
    wrong: 'export const read = (text: string) => Number.parseInt(text, 10);',
    right: 'export const read = (value: number) => Math.trunc(value);',
  },
  {
    ...toText,
    folder: 'components/week-sheet',
    wrong: 'export const write = (value: number) => value.toFixed(1);',
    right: "export { formatNumber } from '@/lib/units/format';",
  },
  {
    ...toText,
    folder: 'lib/planner',
    wrong: "export const write = (value: number) => value.toLocaleString('en');",
    right: 'export const write = (value: number) => ({ value });',
  },
  {
    ...toText,
    folder: 'lib/messages',
    wrong: "export const write = (value: number) => new Intl.NumberFormat('en').format(value);",
    right: "export { formatNumber } from '@/lib/units/format';",
  },
  {
    ...dates,
    folder: 'app/log',
    wrong: "export const write = (at: Date) => new Intl.DateTimeFormat('en').format(at);",
    right: "export { dayOf } from '@/lib/calendar/household-day';",
  },
  {
    ...dates,
    folder: 'components/log',
    wrong: 'export const hour = (at: Date) => at.getHours();',
    right: 'export const time = (at: Date) => at.getTime();',
  },
  {
    ...dates,
    folder: 'lib/calendar',
    wrong: 'export const hour = (at: Date) => at.getHours();',
    right: 'export const hour = (at: Date) => at.getUTCHours();',
  },
  {
    ...dates,
    folder: 'db/queries',
    wrong: 'export const day = (at: Date) => at.toISOString().slice(0, 10);',
    right: 'export const instant = (at: Date) => at.toISOString();',
  },
  // The environment and the console.
  {
    rule: syntax,
    says: 'lib/env.ts',
    folder: 'lib/mail',
    wrong: 'export const url = process.env.SMTP_URL;',
    right: 'export const url = (env: { SMTP_URL: string }) => env.SMTP_URL;',
  },
  {
    rule: 'no-restricted-imports',
    says: 'lib/env.ts',
    folder: 'db',
    wrong: "export { env } from 'node:process';",
    right: "export { join } from 'node:path';",
  },
  {
    rule: 'no-console',
    says: 'console',
    folder: 'lib/services',
    wrong: "export const told = () => console.log('told');",
    right: "export const told = (log: (line: string) => void) => log('told');",
  },
  // Screens: words from the catalogue, colours from the tokens, and everybody can use them.
  {
    rule: 'formatjs/no-literal-string-in-jsx',
    says: 'untranslated',
    folder: 'components/pool',
    wrong: aTsx('<p>Hello</p>'),
    right: aTsx("<p>{'hello'.length}</p>"),
  },
  {
    rule: 'formatjs/no-literal-string-in-jsx',
    says: 'untranslated',
    folder: 'app/pool',
    wrong: aTsx('<p aria-label="Your pool" />'),
    right: aTsx('<p className="text-ink" />'),
  },
  {
    ...colour,
    folder: 'components/ui',
    wrong: aTsx('<p className="text-[#1a2b3c]" />'),
    right: aTsx('<p className="text-[1.5rem]" />'),
  },
  {
    ...colour,
    folder: 'components/charts',
    wrong: "export const line = '#0af';",
    right: "export const line = 'var(--color-line)';",
  },
  {
    ...colour,
    folder: 'components/charts',
    wrong: 'export const area = (alpha: number) => `rgb(0 80 120 / ${alpha})`;',
    right: "export const anchor = '#week';",
  },
  {
    ...colour,
    folder: 'components/charts',
    wrong: aTsx('<circle fill="tomato" />'),
    right: aTsx('<circle fill="currentColor" stroke="var(--color-line)" />'),
  },
  {
    ...colour,
    folder: 'app/week',
    wrong: aTsx('<p className="dark:text-red-500" />'),
    right: aTsx('<p className="dark:text-terra-ink" />'),
  },
  {
    ...colour,
    folder: 'app/week',
    wrong: aTsx('<p className="bg-white" />'),
    right: aTsx('<p className="whitespace-nowrap bg-paper" />'),
  },
  {
    rule: 'jsx-a11y/click-events-have-key-events',
    says: 'keyboard',
    folder: 'components/shelf',
    wrong: aTsx('<div onClick={() => undefined} />'),
    right: aTsx('<button type="button" onClick={() => undefined} />'),
  },
  // Types and promises.
  {
    rule: '@typescript-eslint/no-explicit-any',
    says: 'any',
    folder: 'lib/services',
    wrong: 'export type Thing = any;',
    right: 'export type Thing = unknown;',
  },
  {
    rule: '@typescript-eslint/ban-ts-comment',
    says: 'ts-ignore',
    folder: 'lib/services',
    wrong: "// @ts-ignore the types are wrong\nexport const count: number = 'one';",
    right: "// @ts-expect-error a test of what happens with text here\nexport const count: number = 'one';",
  },
  {
    rule: '@typescript-eslint/no-floating-promises',
    says: 'Promises',
    folder: 'lib/services',
    wrong: 'export const save = (write: () => Promise<void>) => {\n  write();\n};',
    right: 'export const save = async (write: () => Promise<void>) => {\n  await write();\n};',
  },
  {
    rule: 'no-restricted-imports',
    says: 'fontsource',
    folder: 'app',
    wrong: "export { Inter } from 'next/font/google';",
    right: "export { default as font } from 'next/font/local';",
  },
];

/** The few places where a rule gives way, and must go on giving way. */
export const exemptions: { file: string; code: string }[] = [
  { file: 'lib/units/parse.ts', code: 'export const read = (text: string) => Number(text);' },
  { file: 'lib/units/format.ts', code: "export const write = new Intl.NumberFormat('en');" },
  { file: 'lib/calendar/format.ts', code: "export const write = new Intl.DateTimeFormat('en', { timeZone: 'UTC' });" },
  { file: 'lib/env.ts', code: 'export const port = Number(process.env.PORT);' },
  { file: 'lib/cli/plan.ts', code: 'export const tell = () => console.log(process.env.HOME);' },
  { file: 'instrumentation.ts', code: "export const onNode = process.env.NEXT_RUNTIME === 'nodejs';" },
  { file: 'tests/units/parse.test.ts', code: 'export const at = () => [Date.now(), Math.random(), process.env.TZ];' },
];
