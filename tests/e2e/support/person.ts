import { randomUUID } from 'node:crypto';
import type { Server } from './server';

export type Answer = { status: number; body: unknown; headers: Headers; text: string };

/** Somebody who talks to the server without a browser: to set a scene quickly, and to send what no page would. */
export class Person {
  cookie = '';

  constructor(readonly server: Server) {}

  async send(
    method: string,
    path: string,
    body?: unknown,
    {
      headers = {},
      text,
      bytes,
    }: { headers?: Record<string, string>; text?: string; bytes?: Uint8Array<ArrayBuffer> } = {},
  ): Promise<Answer> {
    const sent = bytes ?? text ?? (body === undefined ? undefined : JSON.stringify(body));
    const response = await fetch(`${this.server.address}${path}`, {
      method,
      redirect: 'manual',
      headers: {
        origin: this.server.origin,
        ...(sent === undefined ? {} : { 'content-type': 'application/json' }),
        ...(this.cookie === '' ? {} : { cookie: this.cookie }),
        ...headers,
      },
      ...(sent === undefined ? {} : { body: sent }),
      signal: AbortSignal.timeout(30_000),
    });
    const replied = await response.text();
    for (const cookie of response.headers.getSetCookie()) this.cookie = cookie.split(';')[0] ?? '';
    return { status: response.status, body: jsonOf(replied), headers: response.headers, text: replied };
  }

  /** As send, for what has to succeed before a scene is set. */
  async must<Reply>(method: string, path: string, body?: unknown): Promise<Reply> {
    const answer = await this.send(method, path, body);
    if (answer.status !== 200) throw new Error(`${method} ${path} answered ${answer.status}: ${answer.text}`);
    return answer.body as Reply;
  }

  async signUp(overrides: Record<string, unknown> = {}): Promise<{ email: string; password: string }> {
    const email = `${randomUUID()}@pool.example`;
    const password = 'four words in a row';
    await this.must('POST', '/api/sign-up', {
      name: 'Ines',
      email,
      password,
      householdName: 'Marrow Lane',
      timeZone: 'America/New_York',
      unitSystem: 'metric',
      locale: 'en-US',
      ...overrides,
    });
    // It lies over the sheet until it is closed; 'first week' looks at it.
    await this.must('PUT', '/api/tour', { closed: true });
    return { email, password };
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
