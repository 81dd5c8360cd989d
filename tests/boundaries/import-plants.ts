/** For each rule about places: an import that breaks it, and one that looks like it and is right. */
export const importPlants: { rule: string; wrong: Plant; right: Plant }[] = [
  {
    rule: 'app-wires',
    wrong: plant('app/(household)/week/page.tsx', '@/lib/chemistry/target'),
    right: plant('app/(household)/week/layout.tsx', '@/lib/services/target'),
  },
  {
    rule: 'db-users',
    wrong: plant('app/api/readings/route.ts', '@/db/target'),
    right: plant('lib/services/record-reading.ts', '@/db/target'),
  },
  {
    rule: 'components-show',
    wrong: plant('components/readings/form.tsx', '@/lib/services/target'),
    right: plant('components/readings/field.tsx', '@/lib/client/target'),
  },
  {
    rule: 'components-show',
    wrong: plant('components/readings/list.tsx', '@/db/target'),
    right: plant('components/readings/row.tsx', '@/lib/storage/target'),
  },
  {
    rule: 'components-no-formulas',
    wrong: plant('components/week-sheet/curve.tsx', '@/lib/projection/target'),
    right: { file: 'components/week-sheet/sheet.tsx', code: "import type { Target } from '@/lib/projection/target';" },
  },
  {
    rule: 'ui-knows-no-pool',
    wrong: plant('components/ui/button.tsx', '@/components/readings/target'),
    right: plant('components/ui/dialog.tsx', '@/components/ui/target'),
  },
  {
    rule: 'ui-packages',
    wrong: plant('components/ui/link.tsx', 'next/link'),
    right: plant('components/ui/icon.tsx', 'lucide-react'),
  },
  {
    rule: 'client-calls-routes',
    wrong: plant('lib/client/readings.ts', '@/lib/services/target'),
    right: plant('lib/client/try-it.ts', '@/lib/projection/target'),
  },
  {
    rule: 'services-use-db-and-adapters',
    wrong: plant('lib/services/plan-week.ts', '@/lib/api/target'),
    right: plant('lib/services/send-due-reminders.ts', '@/lib/mail/target'),
  },
  {
    rule: 'engine-worker-is-pure-inside',
    wrong: plant('lib/engine-worker/worker.ts', '@/lib/services/target'),
    right: plant('lib/engine-worker/queue.ts', '@/lib/planner/target'),
  },
  {
    rule: 'auth-stands-alone',
    wrong: plant('lib/auth/gate.ts', '@/lib/services/target'),
    right: plant('lib/auth/session.ts', '@/db/target'),
  },
  {
    rule: 'api-wraps-routes',
    wrong: plant('lib/api/route.ts', '@/lib/services/target'),
    right: plant('lib/api/reply.ts', '@/lib/auth/target'),
  },
  {
    rule: 'adapters-stand-alone',
    wrong: plant('lib/mail/send.ts', '@/lib/services/target'),
    right: plant('lib/mail/text.ts', '@/lib/messages/target'),
  },
  {
    rule: 'messages-stand-alone',
    wrong: plant('lib/messages/request.ts', '@/lib/services/target'),
    right: plant('lib/messages/catalogue.ts', '@/lib/calendar/target'),
  },
  {
    rule: 'cli-uses-services',
    wrong: plant('lib/cli/plan.ts', '@/components/readings/target'),
    right: plant('lib/cli/backup.ts', '@/db/target'),
  },
  {
    rule: 'db-below-services',
    wrong: plant('db/queries/readings.ts', '@/lib/services/target'),
    right: plant('db/queries/plans.ts', '@/lib/schemas/target'),
  },
  {
    rule: 'errors-env-and-log-at-the-bottom',
    wrong: plant('lib/env.ts', '@/lib/services/target'),
    right: plant('lib/errors.ts', '@/lib/schemas/target'),
  },
  {
    rule: 'proxy-is-small',
    wrong: plant('proxy.ts', '@/lib/services/target'),
    right: plant('instrumentation.ts', '@/db/target'),
  },
  {
    rule: 'browser-start-is-small',
    wrong: plant('instrumentation-client.ts', '@/lib/env'),
    right: plant('lib/client/start.ts', '@/lib/client/target'),
  },
  {
    rule: 'nothing-imports-app',
    wrong: plant('components/shelf/shelf.tsx', '@/app/target'),
    right: plant('app/(start)/page.tsx', '@/app/target'),
  },
  {
    rule: 'nothing-imports-tests',
    wrong: plant('lib/services/seed-demo.ts', '@/tests/target'),
    right: plant('tests/services/seed-demo.ts', '@/tests/target'),
  },
  {
    rule: 'drizzle-at-home',
    wrong: plant('lib/services/list-readings.ts', 'drizzle-orm'),
    right: plant('db/schema/readings.ts', 'drizzle-orm'),
  },
  {
    rule: 'drizzle-at-home',
    wrong: plant('lib/cli/restore.ts', '@libsql/client'),
    right: plant('db/client.ts', '@libsql/client'),
  },
  {
    rule: 'sharp-at-home',
    wrong: plant('lib/services/picture.ts', 'sharp'),
    right: plant('lib/photos/picture.ts', 'sharp'),
  },
  {
    rule: 'recharts-at-home',
    wrong: plant('components/week-sheet/chart.tsx', 'recharts'),
    right: plant('components/charts/chart.tsx', 'recharts'),
  },
  // Not installed yet, so that a right use of them is still a missing package: only the wrong place is asked.
  {
    rule: 'web-push-at-home',
    wrong: plant('lib/services/send-push.ts', 'web-push'),
    right: plant('lib/push/target.ts', '@/lib/env'),
  },
  {
    rule: 'mail-at-home',
    wrong: plant('lib/services/send-mail.ts', 'nodemailer'),
    right: plant('lib/weather/forecast.ts', '@/lib/env'),
  },
  {
    rule: 'sessions-at-home',
    wrong: plant('lib/services/sign-in.ts', 'lucia'),
    right: plant('lib/auth/lucia.ts', 'lucia'),
  },
  {
    rule: 'sessions-at-home',
    wrong: plant('lib/services/sign-up.ts', '@node-rs/argon2'),
    right: plant('lib/auth/password.ts', '@node-rs/argon2'),
  },
  {
    rule: 'sessions-at-home',
    wrong: plant('lib/services/add-passkey.ts', '@simplewebauthn/server'),
    right: plant('lib/auth/passkeys.ts', '@simplewebauthn/server'),
  },
  {
    rule: 'passkeys-in-the-browser-at-home',
    wrong: plant('components/start/passkey.tsx', '@simplewebauthn/browser'),
    right: plant('lib/client/passkeys.ts', '@simplewebauthn/browser'),
  },
  {
    rule: 'log-at-home',
    wrong: plant('lib/services/keep-log.ts', 'pino'),
    right: plant('lib/log.ts', 'pino'),
  },
  {
    rule: 'next-at-home',
    wrong: plant('lib/services/look-round.ts', 'next/headers'),
    right: plant('lib/auth/cookie.ts', 'next/headers'),
  },
  {
    rule: 'messages-at-home',
    wrong: plant('lib/services/word-reminder.ts', 'next-intl'),
    right: plant('components/log/entry.tsx', 'next-intl'),
  },
  {
    rule: 'no-development-packages-in-the-product',
    wrong: plant('lib/services/guess.ts', 'fast-check'),
    right: plant('tests/services/guess.ts', 'fast-check'),
  },
  {
    rule: 'no-cycles',
    wrong: plant('lib/services/egg.ts', './hen'),
    right: plant('lib/services/nest.ts', './hen'),
  },
  {
    rule: 'no-missing-files',
    wrong: plant('lib/services/lost.ts', './nowhere'),
    right: plant('lib/services/found.ts', './target'),
  },
  {
    rule: 'pure-without-node',
    wrong: plant('lib/sun/ephemeris.ts', 'node:fs'),
    right: plant('lib/cli/read-scenario.ts', 'node:fs'),
  },
  {
    rule: 'bootstrap-needs-nothing',
    wrong: plant('lib/cli/bootstrap/colours.mjs', 'zod'),
    right: plant('lib/cli/bootstrap/port.mjs', 'node:net'),
  },
];

type Plant = { file: string; code: string };

function plant(file: string, imported: string): Plant {
  return { file, code: `import '${imported}';` };
}
