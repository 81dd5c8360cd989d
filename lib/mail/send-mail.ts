import 'server-only';
import { createTransport, type Transporter } from 'nodemailer';
import { isLoopback } from '@/lib/env';
import type { WrittenMail } from './write-mail';

const seconds = 1_000;
/** As much of what a mail server says as tells a person why. */
const LONGEST_REFUSAL = 200;

let known: { url: string; transport: Transporter } | undefined;

/** Hands a mail to the mail server. @returns null, or what it said or what went wrong when it did not take it */
export async function sendMail(
  { url, from }: { url: string; from: string },
  { email, ...mail }: WrittenMail & { email: string },
): Promise<string | null> {
  if (known?.url !== url) known = { url, transport: transportOf(new URL(url)) };
  try {
    // As objects: an address that is parsed could turn out to be two.
    await known.transport.sendMail({
      from: { name: 'Wadewell', address: from },
      to: { name: '', address: email },
      ...mail,
    });
    return null;
  } catch (problem) {
    return refusalOf(problem);
  }
}

/** Passwords and links do not cross a network in the clear, unless the address asks for it with `?requireTLS=false`. */
function transportOf({ protocol, hostname, port, username, password, searchParams }: URL): Transporter {
  const secure = protocol === 'smtps:';
  return createTransport({
    host: hostname.replace(/^\[|\]$/g, ''),
    ...(port === '' ? {} : { port }),
    secure,
    requireTLS: !secure && !isLoopback(hostname) && searchParams.get('requireTLS') !== 'false',
    ...(username === '' ? {} : { auth: { user: decodeURIComponent(username), pass: decodeURIComponent(password) } }),
    connectionTimeout: 10 * seconds,
    greetingTimeout: 10 * seconds,
    socketTimeout: 30 * seconds,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}

function refusalOf(problem: unknown): string {
  const said = problem instanceof Error && 'response' in problem ? problem.response : undefined;
  const words = typeof said === 'string' ? said : problem instanceof Error ? problem.message : String(problem);
  return words.replace(/[\p{Cc}\s]+/gu, ' ').slice(0, LONGEST_REFUSAL);
}
