import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

export type ReceivedMail = { to: string[]; from: string; source: string };

/** A mail server on this machine that keeps what it gets, and refuses whom it is told to. */
export class MailServer {
  readonly mails: ReceivedMail[] = [];
  /** What to answer to a recipient; nothing to take the mail. */
  refuse: (email: string) => { code: number; message: string } | undefined = () => undefined;
  readonly #server: SMTPServer;

  private constructor() {
    this.#server = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      logger: false,
      onRcptTo: ({ address }, _session, callback) => {
        const refused = this.refuse(address);
        if (refused) callback(Object.assign(new Error(refused.message), { responseCode: refused.code }));
        else callback();
      },
      onData: (stream, session, callback) => {
        const pieces: Buffer[] = [];
        stream.on('data', (piece: Buffer) => pieces.push(piece));
        stream.on('end', () => {
          const { mailFrom, rcptTo } = session.envelope;
          this.mails.push({
            to: rcptTo.map(({ address }) => address),
            from: mailFrom ? mailFrom.address : '',
            source: Buffer.concat(pieces).toString('utf8'),
          });
          callback();
        });
      },
    });
  }

  static async start(): Promise<MailServer> {
    const server = new MailServer();
    server.#server.listen(0, '127.0.0.1');
    await once(server.#server.server, 'listening');
    return server;
  }

  get url(): string {
    return `smtp://127.0.0.1:${(this.#server.server.address() as AddressInfo).port}`;
  }

  /** The newest mail to an address. */
  to(email: string): ReceivedMail | undefined {
    return this.mails.findLast(({ to }) => to.includes(email));
  }

  stop(): Promise<void> {
    return new Promise((resolve) => this.#server.close(() => resolve()));
  }
}

/** The parts of a mail, as a mail program reads them: its headers on lines of their own, its text and its HTML decoded. */
export function readMail(source: string): { headers: string; text: string; html: string } {
  const [head = ''] = source.split('\r\n\r\n');
  const boundary = /boundary="([^"]+)"/.exec(head)?.[1];
  if (boundary === undefined) throw new Error('The mail has not two parts.');
  const part = (type: string) => {
    const found = source.split(`--${boundary}`).find((each) => each.includes(`Content-Type: ${type}`));
    if (found === undefined) throw new Error(`The mail has no ${type}.`);
    const [partHead = '', ...body] = found.split('\r\n\r\n');
    return decoded(body.join('\r\n\r\n'), partHead);
  };
  return { headers: head.replace(/\r\n[ \t]+/g, ' '), text: part('text/plain'), html: part('text/html') };
}

function decoded(body: string, head: string): string {
  if (/base64/i.test(head)) return Buffer.from(body, 'base64').toString('utf8');
  if (!/quoted-printable/i.test(head)) return body;
  const bytes = body
    .replace(/=\r?\n/g, '')
    .replace(/=([0-9A-F]{2})/gi, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1').toString('utf8');
}
