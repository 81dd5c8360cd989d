/**
 * What dependency-cruiser cannot see: what a file does, rather than what it imports. Every message says what to do
 * instead; tests/boundaries plants a violation of each rule.
 *
 * A later block replaces a rule of an earlier one, options and all. So each zone below joins its lists by hand, and the
 * order of the zones matters.
 */
import { defineConfig, globalIgnores } from 'eslint/config';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';
import formatjs from 'eslint-plugin-formatjs';

const pure = [
  ...['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection', 'learning', 'planner'],
  ...['situations', 'season', 'verdict'],
].map((folder) => `lib/${folder}/**`);
const product = [
  'app/**',
  'components/**',
  'db/**',
  'lib/**',
  'proxy.ts',
  'instrumentation.ts',
  'instrumentation-client.ts',
];
const screens = ['app/**', 'components/**'];

const banned = (message, ...selectors) => selectors.map((selector) => ({ selector, message }));

const numbers = [
  ...banned(
    'Text becomes a number only in lib/units/parse (parseDecimal, parseQuantity).',
    'CallExpression[callee.name=/^(Number|parseFloat|parseInt)$/]',
    "MemberExpression[object.name='Number'][property.name=/^parse/]",
    "UnaryExpression[operator='+']",
  ),
  ...banned(
    'A number becomes text only in lib/units/format (formatNumber, formatQuantity).',
    'MemberExpression[property.name=/^(toFixed|toPrecision|toExponential)$/]',
  ),
];

const dates = banned(
  'Numbers become text in lib/units/format, dates in lib/calendar: call those.',
  "MemberExpression[object.name='Intl']",
  'MemberExpression[property.name=/^toLocale(String|DateString|TimeString)$/]',
);

const machineZone = banned(
  "A day or hour is the household's, not the machine's: use lib/calendar.",
  'MemberExpression[property.name=/^[gs]et(FullYear|Month|Date|Day|Hours|Minutes|TimezoneOffset)$/]',
  'MemberExpression[property.name=/^to(DateString|TimeString)$/]',
);

const dayOfInstant = banned(
  'This is the day in Greenwich: use lib/calendar for the day at the pool.',
  "CallExpression[callee.property.name=/^(slice|substring|split)$/][callee.object.callee.property.name='toISOString']",
);

const environment = banned(
  'process.env is read once, in lib/env.ts: import env from there.',
  "MemberExpression[object.name='process'][property.name='env']",
);

/** Next.js replaces this one name when it builds, and only when it is spelled out. */
const environmentButRuntime = banned(
  environment[0].message,
  "MemberExpression[object.object.name='process'][object.property.name='env'][property.name!='NEXT_RUNTIME']",
);

const clockAndChance = [
  ...banned(
    'Pure code has no clock: take the instant as an argument.',
    "MemberExpression[object.name='Date'][property.name='now']",
    "NewExpression[callee.name='Date'][arguments.length=0]",
    "CallExpression[callee.name='Date']",
    "MemberExpression[object.name='Temporal'][property.name='Now']",
  ),
  ...banned(
    'Pure code has no chance: take a seed, or the random numbers, as an argument.',
    "MemberExpression[object.name='Math'][property.name='random']",
  ),
];

const palette =
  '(slate|gray|zinc|neutral|stone|red|orange|amber|yellow|lime|green|emerald|teal|cyan|sky|blue|indigo|violet|purple|fuchsia|pink|rose|mauve|olive|mist|taupe)-(50|[1-9]00|950)';
const rawColours = [
  // #abc, #aabbcc and the forms with transparency; rgb(), hsl() and their kind.
  '(^|[^&\\w])#([0-9a-f]{3,4}|[0-9a-f]{6}|[0-9a-f]{8})([^\\w-]|$)',
  '(^|[^\\w-])(rgba?|hsla?|hwb|lab|lch|oklab|oklch|color)\\(',
  `(^|[^\\w])[a-z-]+-(${palette}|white|black)([^\\w-]|$)`,
].join('|');

const colours = banned(
  'Colours come from the tokens in tailwind.config.ts: use the class of the role, such as text-ink.',
  `Literal[value=/${rawColours}/i]`,
  `TemplateElement[value.raw=/${rawColours}/i]`,
  'JSXAttribute[name.name=/^(fill|stroke|stopColor)$/] > Literal[value!=/^(none|currentColor|transparent|inherit|var\\(.*|url\\(.*)$/]',
);

const syntax = (...lists) => ({ 'no-restricted-syntax': ['error', ...lists.flat()] });

const impureGlobals = [
  ...['fetch', 'XMLHttpRequest', 'WebSocket', 'process', 'global', 'globalThis', 'window', 'document', 'navigator'],
  ...['localStorage', 'sessionStorage', 'indexedDB', 'performance', 'crypto', 'setTimeout', 'setInterval'],
  ...['setImmediate', 'queueMicrotask', 'require', 'Buffer'],
].map((name) => ({ name, message: 'Pure code touches nothing outside: take what you need as an argument.' }));

const never = [
  { group: ['next/font/google'], message: 'Fonts are shipped with the product: import the fontsource package.' },
  { group: ['lucide-react/dynamic'], message: 'It loads every icon (232 kB): import the icon by name.' },
];
const noEnvironmentModule = {
  group: ['process', 'node:process'],
  message: 'process.env is read once, in lib/env.ts: import env from there.',
};
const noNode = {
  regex: '^node:',
  message: 'Pure folders run in the browser and have no input or output: pass in what you need.',
};
const noClockModule = {
  // Only single functions of the package, and not those that ask the clock.
  regex: '^temporal-polyfill(?!/fns/(?!Now$)\\w+$)',
  message:
    'Pure code has no clock: take the instant as an argument, and import temporal-polyfill/fns/ZonedDateTime etc.',
};
const imports = (...patterns) => ({ 'no-restricted-imports': ['error', { patterns }] });

const accessibility = nextVitals.find(({ plugins }) => plugins?.['jsx-a11y']).plugins['jsx-a11y'].flatConfigs
  .recommended;

export default defineConfig([
  globalIgnores(['.next/**', '.next-*/**', '.tmp/**', 'coverage/**', 'data/**', 'drizzle/**', 'next-env.d.ts']),
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  nextVitals,
  nextTypescript,
  {
    name: 'accessibility',
    files: ['**/*.tsx'],
    // eslint-config-next has registered the plugin already, with a handful of its rules.
    rules: {
      ...accessibility.rules,
      'jsx-a11y/label-has-associated-control': ['error', { assert: 'either', depth: 3 }],
      // What scrolls must be reachable by keyboard: a region may take the focus.
      'jsx-a11y/no-noninteractive-tabindex': ['error', { tags: [], roles: ['tabpanel', 'region'] }],
    },
  },
  {
    name: 'everywhere',
    rules: {
      eqeqeq: ['error', 'always'],
      // Configuration files are read by tools, which need no name.
      'import/no-anonymous-default-export': 'off',
      ...imports(...never),
    },
  },
  {
    name: 'typescript',
    files: ['**/*.ts', '**/*.tsx'],
    rules: {
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/no-unused-expressions': 'error',
      '@typescript-eslint/ban-ts-comment': [
        'error',
        {
          'ts-ignore': true,
          'ts-nocheck': true,
          'ts-expect-error': 'allow-with-description',
          minimumDescriptionLength: 10,
        },
      ],
    },
  },
  {
    name: 'promises',
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
    },
  },
  {
    name: 'product',
    files: product,
    rules: {
      'no-console': 'error',
      ...imports(...never, noEnvironmentModule),
      ...syntax(numbers, dates, machineZone, dayOfInstant, environment),
    },
  },
  {
    name: 'screens',
    files: screens,
    plugins: { formatjs },
    rules: {
      'formatjs/no-literal-string-in-jsx': 'error',
      ...syntax(numbers, dates, machineZone, dayOfInstant, environment, colours),
    },
  },
  {
    name: 'pure',
    files: pure,
    rules: {
      'no-restricted-globals': ['error', ...impureGlobals],
      ...imports(...never, noEnvironmentModule, noNode, noClockModule),
      ...syntax(numbers, dates, machineZone, dayOfInstant, clockAndChance),
    },
  },
  {
    name: 'the one parser and formatter of numbers',
    files: ['lib/units/**'],
    rules: syntax(machineZone, dayOfInstant, clockAndChance),
  },
  {
    name: 'the one reader and writer of dates',
    files: ['lib/calendar/**'],
    rules: syntax(machineZone, clockAndChance),
  },
  {
    name: 'the one reader of the environment',
    files: ['lib/env.ts'],
    rules: { ...imports(...never), ...syntax(dates, machineZone, dayOfInstant) },
  },
  {
    name: 'instrumentation',
    files: ['instrumentation.ts'],
    rules: syntax(numbers, dates, machineZone, dayOfInstant, environmentButRuntime),
  },
  {
    name: 'command line',
    files: ['lib/cli/**'],
    rules: { 'no-console': 'off', 'no-restricted-syntax': 'off', ...imports(...never) },
  },
]);
