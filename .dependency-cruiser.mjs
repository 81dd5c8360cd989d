/**
 * Who may import what. Each rule's comment says what to do instead; tests/boundaries plants a violation of each.
 * Run with tsx, because the list of packages for the pure folders is TypeScript.
 */
import { purePackages } from './tests/support/pure-packages.ts';

// Each tier may import those before it, and its own folder.
const pureTiers = [
  ['units', 'calendar', 'standards'],
  ['schemas'],
  ['chemistry', 'sun', 'storage'],
  ['projection'],
  ['learning', 'planner', 'verdict', 'situations'],
  ['season'],
];
// The one step sideways: how fast liquid chlorine weakens is a law of chemistry, what that does to a bottle is storage.
const sideways = { storage: ['chemistry'] };
const pure = pureTiers.flat();
const plainPure = ['units', 'calendar', 'standards', 'schemas'];
const formulas = pure.filter((folder) => !plainPure.includes(folder) && folder !== 'storage');

const oneOf = (names) => `(${names.join('|')})`;
const libFolders = (...names) => `^lib/${oneOf(names)}/`;
const libFiles = (...names) => `^lib/${oneOf(names)}\\.ts$`;
const ours = '^(app|components|db|drizzle|lib|public|tests)/|^[^/]+\\.(ts|tsx|mjs|json)$';
// A package that is not installed keeps its bare name.
const packages = (...names) => `(^|node_modules/)${oneOf(names)}(/|$)`;

const rule = (name, comment, from, to) => ({ name, comment, severity: 'error', from, to });

/** Whatever lives at `from` may import these places of ours and no others. */
const onlyInto = (name, from, allowed, comment) =>
  rule(name, comment, { path: from }, { path: ours, pathNot: allowed });

/** These packages stay at home; tests may use them to look inside. */
const onlyIn = (name, home, names, comment) =>
  rule(name, comment, { pathNot: [home, '^tests/', 'node_modules/'].flat() }, { path: packages(...names) });

const pureRules = pureTiers.flatMap((tier, level) =>
  tier.flatMap((folder) => {
    const below = [...pureTiers.slice(0, level).flat(), ...(sideways[folder] ?? [])];
    const known = purePackages.filter(({ folders }) => folders.includes(folder)).map(({ name }) => name);
    return [
      onlyInto(
        `pure-${folder}-downward`,
        libFolders(folder),
        [libFolders(folder, ...below), libFiles('errors')],
        `lib/${folder} is pure and imports only ${below.length ? below.join(', ') : 'its own files'} and lib/errors: pass in what else it needs.`,
      ),
      rule(
        `pure-${folder}-packages`,
        'The packages of the pure folders stand in tests/support/pure-packages.ts, each with its reason.',
        { path: libFolders(folder) },
        { path: 'node_modules/', pathNot: known.length ? [packages(...known)] : [] },
      ),
    ];
  }),
);

const zones = [
  onlyInto(
    'app-wires',
    '^app/',
    [
      '^(app|components)/',
      libFolders('api', 'auth', 'client', 'messages', 'services', ...plainPure),
      libFiles('errors', 'env', 'log'),
    ],
    'A route wires and decides nothing: move the query or the formula into a use case in lib/services.',
  ),
  onlyInto(
    'components-show',
    '^components/',
    ['^components/', libFolders('client', 'messages', ...pure), libFiles('errors')],
    'A component gets its data from lib/client or as props, never from a service or the database.',
  ),
  rule(
    'components-no-formulas',
    'Components may name the types of a formula folder (import type); values come through lib/client or props.',
    { path: '^components/' },
    { path: libFolders(...formulas), dependencyTypesNot: ['type-only'] },
  ),
  onlyInto(
    'ui-knows-no-pool',
    '^components/ui/',
    ['^components/ui/'],
    'components/ui could ship in another product: pass words and data in as props.',
  ),
  rule(
    'ui-packages',
    'components/ui is built on @base-ui/react, react and lucide-react alone.',
    { path: '^components/ui/' },
    {
      path: 'node_modules/',
      pathNot: [packages('@base-ui/react', 'react', 'react-dom', 'lucide-react', '@types/react')],
    },
  ),
  onlyInto(
    'client-calls-routes',
    libFolders('client'),
    [libFolders('client', ...pure), libFiles('errors')],
    'lib/client runs in the browser: it reaches services through the route handlers.',
  ),
  onlyInto(
    'services-use-db-and-adapters',
    libFolders('services'),
    [
      '^db/',
      libFolders('services', 'auth', 'mail', 'photos', 'push', 'weather', 'engine-worker', 'messages', ...pure),
      libFiles('errors', 'env', 'log'),
    ],
    'A service is called by routes and commands and knows neither: hand it what it needs.',
  ),
  onlyInto(
    'engine-worker-is-pure-inside',
    libFolders('engine-worker'),
    [libFolders('engine-worker', ...pure), libFiles('errors', 'env', 'log')],
    'The engine worker gets a plain snapshot and gives a plan; loading and storing are services.',
  ),
  onlyInto(
    'auth-stands-alone',
    libFolders('auth'),
    ['^db/', libFolders('auth', ...plainPure), libFiles('errors', 'env', 'log')],
    'lib/auth knows sessions, passwords and the gate, and of the rest only db, errors and env.',
  ),
  onlyInto(
    'api-wraps-routes',
    libFolders('api'),
    [libFolders('api', 'auth', 'messages', ...plainPure), libFiles('errors', 'env', 'log')],
    'lib/api is the wrapper of every route: the route hands it the service to call.',
  ),
  onlyInto(
    'adapters-stand-alone',
    libFolders('mail', 'photos', 'push', 'weather'),
    [libFolders('mail', 'photos', 'push', 'weather', 'messages', ...plainPure), libFiles('errors', 'env', 'log')],
    'An adapter speaks to the outside and is called by services: hand it what it should send.',
  ),
  onlyInto(
    'messages-stand-alone',
    libFolders('messages'),
    [libFolders('messages', ...plainPure), libFiles('errors', 'env', 'log')],
    'lib/messages holds the words; what they are about is passed in.',
  ),
  onlyInto(
    'cli-uses-services',
    libFolders('cli'),
    [
      '^db/',
      libFolders('cli', 'services', 'auth', 'mail', 'push', 'weather', 'engine-worker', 'messages', ...pure),
      libFiles('errors', 'env', 'log'),
    ],
    'A command calls services, db or the pure folders.',
  ),
  onlyInto(
    'db-below-services',
    '^db/',
    ['^db/', libFolders('schemas'), libFiles('errors', 'env', 'log')],
    'db imports lib/schemas, lib/errors and lib/env: what decides belongs to lib/services.',
  ),
  rule(
    'db-users',
    'Only services, auth, commands and instrumentation.ts use the database: write a use case in lib/services.',
    {
      pathNot: [
        '^(db|tests)/',
        libFolders('services', 'auth', 'cli'),
        '^instrumentation\\.ts$',
        '^drizzle\\.config\\.ts$',
      ],
    },
    { path: '^db/' },
  ),
  onlyInto(
    'errors-env-and-log-at-the-bottom',
    libFiles('errors', 'env', 'log'),
    [libFiles('errors', 'env'), libFolders('schemas')],
    'Everything imports lib/errors, lib/env and lib/log, so they import next to nothing.',
  ),
  onlyInto(
    'proxy-is-small',
    '^proxy\\.ts$',
    [libFolders('api', 'auth', 'messages', ...plainPure), libFiles('errors', 'env', 'log')],
    'proxy.ts runs before every page: headers and cookies, no data.',
  ),
  onlyInto(
    'browser-start-is-small',
    '^instrumentation-client\\.ts$',
    [libFolders('client', ...plainPure)],
    'instrumentation-client.ts runs in the browser before every page: it imports lib/client or nothing of ours.',
  ),
  rule('nothing-imports-app', 'Move what is shared out of app.', { pathNot: '^(app|tests)/' }, { path: '^app/' }),
  rule(
    'nothing-imports-tests',
    'Move what is shared out of tests.',
    { pathNot: ['^tests/', '^\\.dependency-cruiser\\.mjs$'] },
    { path: '^tests/' },
  ),
];

const homes = [
  onlyIn('drizzle-at-home', '^db/', ['drizzle-orm', '@libsql'], 'SQL lives in db/queries: add a query there.'),
  onlyIn(
    'recharts-at-home',
    '^components/charts/',
    ['recharts'],
    'Only components/charts knows Recharts: add a chart there.',
  ),
  onlyIn('web-push-at-home', '^lib/push/', ['web-push'], 'Send through lib/push.'),
  onlyIn('sharp-at-home', '^lib/photos/', ['sharp'], 'Read and write pictures through lib/photos.'),
  onlyIn('mail-at-home', '^lib/mail/', ['nodemailer'], 'Send through lib/mail.'),
  onlyIn(
    'sessions-at-home',
    '^lib/auth/',
    ['lucia', '@lucia-auth', 'oslo', '@node-rs/argon2', '@zxcvbn-ts', '@simplewebauthn/server'],
    'Sessions and passwords live behind lib/auth.',
  ),
  onlyIn(
    'passkeys-in-the-browser-at-home',
    libFolders('client'),
    ['@simplewebauthn/browser'],
    'The browser is asked for passkeys through lib/client, which fetches the package when somebody presses.',
  ),
  onlyIn('log-at-home', '^lib/log\\.ts$', ['pino'], 'Log through lib/log, which leaves out what could name somebody.'),
  onlyIn(
    'next-at-home',
    ['^(app|components)/', libFolders('auth', 'api', 'messages'), '^[^/]+$'],
    ['next'],
    'Next.js ends at app, components, lib/auth, lib/api and lib/messages: pass in what you need of it.',
  ),
  onlyIn(
    'messages-at-home',
    ['^(app|components)/', libFolders('messages'), '^[^/]+$'],
    ['next-intl', 'use-intl'],
    'Words are looked up in app, components and lib/messages: pass a code from elsewhere.',
  ),
  rule(
    'no-development-packages-in-the-product',
    'Move the package to dependencies, or the code to tests.',
    { path: '^(app|components|db|lib)/', pathNot: libFolders('cli') },
    { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
  ),
];

const general = [
  rule('no-cycles', 'Move what both need into a third file below them.', {}, { circular: true }),
  rule('no-missing-files', 'The file or package does not exist.', {}, { couldNotResolve: true }),
  rule(
    'bootstrap-needs-nothing',
    'lib/cli/bootstrap runs before anything is installed: it imports only node: modules and its own files.',
    { path: '^lib/cli/bootstrap' },
    { pathNot: '^lib/cli/bootstrap', dependencyTypesNot: ['core'] },
  ),
  rule(
    'pure-without-node',
    'Pure folders run in the browser and have no input or output: pass in what you need.',
    { path: libFolders(...pure) },
    { dependencyTypes: ['core'] },
  ),
];

/** @type {import('dependency-cruiser').IConfiguration} */
export default {
  forbidden: [...pureRules, ...zones, ...homes, ...general],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'require', 'node', 'default'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json', '.css'],
    },
  },
};
