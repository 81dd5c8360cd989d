import type { Journey, Stage } from '../support/journey';
import { type Answer as Sent, Person } from '../support/person';
import { filled } from '../support/routes';
import type { Server } from '../support/server';
import { type Answer, answersOfPage, answersOfRoute, type Asker, askers, outsiders } from '../role-matrix/askers';
import { type Manifest, readManifest, unmatched } from '../role-matrix/manifest';
import { type ChangedRow, Rows } from '../role-matrix/rows';
import { actionRows, type PageRow, pageRows, type RouteRow, routeRows, takenIds } from '../role-matrix/table';
import {
  type Cookies,
  idsOf,
  makeWorld,
  secret,
  sentAsPicture,
  strangersWord,
  when,
  type World,
  worldOfNothing,
} from '../role-matrix/world';

const verbs = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];

/** Every page, route and action of the build, asked by everybody: the answer, and that a refusal wrote nothing. */
export const roleMatrix: Journey = {
  name: 'role matrix',
  seconds: 300,
  async run(stage) {
    const server = await stage.server({ name: 'role-matrix', clock: when });
    const manifest = readManifest();
    await stage.part('the table and the build', () => hasRows(stage, server, manifest));
    const { world, cookies } = await makeWorld(server);
    const rows = await Rows.keep(server);
    const scene = { stage, server, world, nothing: worldOfNothing(world), cookies, rows };
    try {
      for (const row of pageRows) await stage.part(`page ${row.page}`, () => askPage(scene, row));
      for (const row of routeRows) await stage.part(nameOf(row), () => askRoute(scene, row));
      for (const row of takenIds)
        await stage.part(`${row.call} with an id of others`, () => askWithTakenId(scene, row));
    } finally {
      rows.close();
    }
  },
};

type Scene = { stage: Stage; server: Server; world: World; nothing: World; cookies: Cookies; rows: Rows };

const nameOf = ({ call, note }: RouteRow) => (note === undefined ? call : `${call} (${note})`);
const callsOf = (rows: readonly RouteRow[]) => rows.map(({ call }) => call);

/** What the build has, and the table; a method that is not refused with 405 is one that a route answers. */
async function hasRows(stage: Stage, server: Server, { pages, routes, actions, staticPages }: Manifest): Promise<void> {
  const answered: string[] = [];
  for (const route of routes)
    for (const verb of verbs) {
      // From nowhere, so that every write is refused before it is looked at.
      const asked = await new Person(server).send(verb, filled(route, 'none'), undefined, { headers: { origin: '' } });
      if (asked.status !== 405) answered.push(`${verb} ${route}`);
    }
  const compare = (what: string, found: readonly string[], inTable: readonly string[]) => {
    const { withoutRow, notInBuild } = unmatched(found, inTable);
    stage.none(`every ${what} of the build has a row`, withoutRow);
    stage.none(`every row of a ${what} is in the build`, notInBuild);
  };
  stage.check('the build has pages and routes', pages.length > 20 && routes.length > 30, { pages, routes });
  compare(
    'page',
    pages,
    pageRows.map(({ page }) => page),
  );
  compare('method of a route', answered, callsOf(routeRows));
  compare('server action', actions, actionRows);
  compare('page of the older router', staticPages, ['/500']);
  stage.equal(
    'one that is planted is named',
    unmatched(['GET /api/health', 'GET /api/planted'], ['GET /api/health', 'GET /api/gone']),
    { withoutRow: ['GET /api/planted'], notInBuild: ['GET /api/gone'] },
  );
}

async function askPage({ stage, server, world, cookies, rows }: Scene, row: PageRow): Promise<void> {
  const { page, at = () => page, status = 200, tells = false } = row;
  const answers = { ...answersOfPage(row.for), ...row.except };
  const faults: string[] = [];
  for (const asker of askers) {
    const fault = (words: string) => faults.push(`${asker}: ${words}`);
    const person = visitor(server, cookies[asker]);
    const sent = await person.send('GET', at(world, asker));
    faultsOfStatus(sent, answers[asker], status).forEach(fault);
    if (outsiders.includes(asker) && !tells) {
      told(sent.text, world).forEach(fault);
      // As a page of ours asks for the next one.
      const part = await visitor(server, cookies[asker]).send('GET', at(world, asker), undefined, {
        headers: { rsc: '1' },
      });
      told(part.text, world).forEach((words) => fault(`asked for a part, ${words}`));
    }
    // Where the household is to be seen it is: so the word would be noticed where it must not be.
    if (row.for === 'everyone in the household' && answers[asker] === 'done' && !sent.text.includes(secret))
      fault('does not show the household');
    if (row.for === 'everyone in the household' && answers[asker] === 'own' && !sent.text.includes(strangersWord))
      fault('does not show their own household');
    (await rows.changed()).forEach(({ table }) => fault(`looking changed ${table}`));
    await rows.restore();
  }
  stage.none(`page ${page}`, faults);
}

async function askRoute(scene: Scene, row: RouteRow): Promise<void> {
  const { stage, world, nothing, rows } = scene;
  const answers = { ...answersOfRoute(row.for, row.id !== undefined || row.inBody === true), ...row.except };
  const faults: string[] = [];
  for (const asker of askers) {
    const fault = (words: string) => faults.push(`${asker}: ${words}`);
    const answer = answers[asker];
    if (row.before !== undefined) await rows.write(row.before);
    const before = row.before === undefined ? [] : await rows.changed();
    const question = questionOf(row, asker, world);
    const sent = await ask(scene, asker, question);
    const changed = await rows.changedSince(before);
    faultsOfStatus(sent, answer, row.status ?? 200).forEach(fault);
    faultsOfRows(changed, row, asker, answer, world).forEach(fault);
    const isLetIn = row.for === 'anybody signed in' && answer === 'done';
    if (outsiders.includes(asker) && !row.tells && !isLetIn) told(sent.text, world).forEach(fault);
    await rows.restore();
    // What belongs to others, and what nothing has: one answer, to the letter.
    if (asker === 'stranger' && typeof answer === 'number' && told(JSON.stringify(question), world).length > 0) {
      const ofNothing = await ask(scene, asker, questionOf(row, asker, nothing));
      if (ofNothing.status !== sent.status || ofNothing.text !== sent.text)
        fault(`what is not there is answered ${ofNothing.status} ${ofNothing.text}, what is another's ${sent.text}`);
      if ((await rows.changed()).length > 0) fault('what is not there changed rows');
      await rows.restore();
    }
  }
  stage.none(nameOf(row), faults);
}

async function askWithTakenId(scene: Scene, row: (typeof takenIds)[number]): Promise<void> {
  const { stage, world, rows } = scene;
  const sent = await ask(scene, 'stranger', questionOf(row, 'stranger', world));
  const faults = [...faultsOfStatus(sent, 409, 200), ...told(sent.text, world)];
  const changed = (await rows.changed()).map(({ table }) => `changed ${table}`);
  stage.none(`${row.call} with an id of others`, [...faults, ...changed]);
  await rows.restore();
}

type Question = { method: string; path: string; body: unknown; bytes: Uint8Array<ArrayBuffer> | undefined };

function questionOf(
  { call, id, query, send, bytes }: Pick<RouteRow, 'call' | 'id' | 'query' | 'send' | 'bytes'>,
  asker: Asker,
  world: World,
): Question {
  const [method = '', pattern = ''] = call.split(' ');
  const address = id === undefined ? pattern : pattern.replace(/\[[.\w]+\]/, id(world, asker));
  const path = query === undefined ? address : `${address}?${query(world, asker)}`;
  return { method, path, body: send?.(world, asker), bytes: bytes?.(world, asker) };
}

/** A write that needs no body is sent without one, as by our pages. */
function ask({ server, cookies }: Scene, asker: Asker, { method, path, body, bytes }: Question): Promise<Sent> {
  return visitor(server, cookies[asker]).send(method, path, body, bytes && sentAsPicture(bytes));
}

/** Each question is asked afresh: what one answer did to the cookie is not the next one's. */
function visitor(server: Server, cookie: string): Person {
  return Object.assign(new Person(server), { cookie });
}

function faultsOfStatus({ status, headers, text }: Sent, answer: Answer, good: number): string[] {
  const to = headers.get('location');
  const found = to === null ? `${status}` : `to ${new URL(to, 'http://here').pathname}`;
  const wanted = answer === 'done' || answer === 'own' ? `${good}` : `${answer}`;
  return found === wanted ? [] : [`answered ${found} instead of ${wanted}: ${text.slice(0, 160)}`];
}

function faultsOfRows(changed: readonly ChangedRow[], row: RouteRow, asker: Asker, answer: Answer, world: World) {
  const tables = [...new Set(changed.map(({ table }) => table))];
  const writes = row.changes !== undefined && !row.unchangedFor?.includes(asker);
  if ((answer !== 'done' && answer !== 'own') || !writes)
    return tables.length === 0 ? [] : [`changed ${tables.join(', ')}`];
  const foreign = answer === 'own' ? changed.filter((each) => idsOf(world).some((id) => each.row.includes(id))) : [];
  return [
    ...(tables.includes(row.changes ?? '') ? [] : [`changed no row of ${row.changes}, only ${tables.join(', ')}`]),
    ...foreign.map(({ table }) => `changed a row of another household in ${table}`),
  ];
}

/** What an answer says of the first household. */
function told(text: string, world: World): string[] {
  return [secret, ...idsOf(world)].filter((word) => text.includes(word)).map((word) => `was told ${word}`);
}
