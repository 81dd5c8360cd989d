import type { Visitor } from './browser';
import type { Person } from './person';

/** Gives a browser the session of somebody who was signed in without one. */
export async function enterAs(visitor: Visitor, person: Person): Promise<void> {
  const [name = '', value = ''] = person.cookie.split('=');
  await visitor.context.addCookies([{ name, value, url: person.server.address, httpOnly: true, sameSite: 'Lax' }]);
}

/** The session of a browser, to ask the server without it. */
export async function borrowSession(visitor: Visitor, person: Person): Promise<void> {
  const cookies = await visitor.context.cookies(person.server.address);
  person.cookie = cookies.map(({ name, value }) => `${name}=${value}`).join('; ');
}
