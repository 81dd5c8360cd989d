import { z } from 'zod';

const likeThis = 'Write an e-mail address like ines@pool.example.';

/**
 * One spelling for one address, so that nobody has two accounts by a capital letter, and plain letters only: others look
 * like them, and two people could not tell their addresses apart. A domain in another script has a spelling of plain
 * letters, too (RFC 5891).
 */
export const emailSchema = z
  .string({ error: 'Write your e-mail address.' })
  .normalize('NFKC')
  .trim()
  .toLowerCase()
  .max(254, likeThis)
  .regex(/^[\x20-\x7e]*$/, {
    error:
      'This address has letters beyond a to z, which can look like others. Write it with plain letters, as your mail program shows it.',
    abort: true,
  })
  // Letters and signs as HTML's own e-mail field permits them, and a dot in the domain.
  .regex(/^[a-z0-9.!#$%&'*+/=?^_`{|}~-]{1,64}@(?:[a-z0-9](?:[a-z0-9-]{0,61}[a-z0-9])?\.)+[a-z0-9-]{2,63}$/, likeThis);
