import 'server-only';
import { jsonReply } from './replies';
import type { Handler } from './routes';

const methodNames = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
type Method = (typeof methodNames)[number];

/** A route answers every method: the ones it has, and the rest with 405 and the list of those. */
export function methods(handlers: Partial<Record<Method, Handler>>): Record<Method, Handler> {
  const allow = methodNames.filter((name) => handlers[name]).join(', ');
  const refuse: Handler = () =>
    Promise.resolve(
      jsonReply({ error: { code: 'not-found', message: `This address answers ${allow} only.`, problems: [] } }, 405, {
        allow,
      }),
    );
  const of = (name: Method) => handlers[name] ?? refuse;
  return { GET: of('GET'), POST: of('POST'), PUT: of('PUT'), PATCH: of('PATCH'), DELETE: of('DELETE') };
}
