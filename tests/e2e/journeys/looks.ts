import { randomUUID } from 'node:crypto';
import { lookAt, widths } from '../looks/look-at';
import {
  clearing,
  due,
  firstRun,
  happened,
  recordOnly,
  signedIn,
  signedOut,
  stopped,
  untested,
  unread,
  type View,
  workedOut,
} from '../looks/pages';
import { clearThreeDays } from '../support/clearing';
import { confirmStops } from '../support/doses';
import { enterAs } from '../support/enter';
import { describePool, describeSteps, fullTest, slowTablets, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';

/** Colours, type, overlaps, cut text and accessibility of every page, and a picture of each. */
export const looks: readonly Journey[] = [
  looking('looks: signed out', signedOut, async () => undefined),
  looking('looks: how it is worked out', workedOut, async () => undefined),
  looking('looks: first run', firstRun, async (server) => {
    const person = new Person(server);
    await person.signUp();
    await describeSteps(person, ['scope', 'size', 'lining', 'sun', 'water', 'shelf']);
    await person.must('POST', '/api/shelf-products', { ...slowTablets, id: randomUUID() });
    return person;
  }),
  looking('looks: signed in', signedIn, async (server) => {
    const person = new Person(server);
    await person.must('POST', '/api/look-round');
    return person;
  }),
  looking('looks: a dose is due', due, async (server) => {
    const person = await household(server);
    await person.must('POST', '/api/readings', fullTest(sundayEvening));
    await confirmStops(person);
    return person;
  }),
  looking('looks: a Stop is to be read', unread, async (server) => {
    const person = await household(server);
    await person.must('POST', '/api/readings', fullTest(sundayEvening));
    return person;
  }),
  looking('looks: something happened', happened, async (server) => {
    const person = await household(server);
    await person.must('POST', '/api/readings', fullTest(sundayEvening));
    for (const kind of ['storm', 'drain-cover'])
      await person.must('POST', '/api/pool-events', {
        id: randomUUID(),
        kind,
        happenedAt: '2026-07-05T19:00:30-04:00',
      });
    return person;
  }),
  looking('looks: the water is clearing', clearing, async (server) => {
    const person = new Person(server);
    await person.signUp();
    await clearThreeDays(server, person);
    return person;
  }),
  looking('looks: out of scope', stopped, async (server) => {
    const person = new Person(server);
    await person.signUp();
    await describeSteps(person, ['scope'], { scope: { system: 'bromine', roofed: true } });
    return person;
  }),
  looking('looks: nothing tested', untested, (server) => household(server)),
  looking('looks: record only', recordOnly, async (server) => {
    const person = await household(server, { scope: { system: 'salt-generator' } });
    await person.must('POST', '/api/readings', fullTest(sundayEvening));
    return person;
  }),
];

async function household(server: Server, answers?: Parameters<typeof describePool>[1]): Promise<Person> {
  const person = new Person(server);
  await person.signUp();
  await describePool(person, answers);
  return person;
}

function looking(
  name: string,
  views: readonly View[],
  enter: (server: Server) => Promise<Person | undefined>,
): Journey {
  return {
    name,
    // Two journeys share two cores with their servers; alone the longest takes a quarter of this.
    seconds: 480,
    async run(stage: Stage) {
      const server = await stage.server({ name: name.replace(/\W+/g, '-'), clock: sundayEvening });
      const person = await enter(server);
      for (const width of widths) {
        const touch = width === 390;
        const visitor = await stage.visitor(server, `${name} at ${width}`, { width, touch });
        if (person) await enterAs(visitor, person);
        for (const view of views) {
          if (view.missing) visitor.expect(/404/);
          await stage.part(`${view.name} at ${width}`, () => lookAt(stage, visitor.page, view, width));
        }
      }
    },
  };
}
