import 'server-only';
import { environment } from '@/lib/env';
import { mailWords } from '@/lib/messages/mail-words';
import type { Language } from '@/lib/schemas/languages';
import type { Role } from '@/lib/schemas/week-sheet';

/** What a mail is about. A link is one that only whoever reads the mail may know. */
export type Letter =
  | { about: 'confirm' | 'change' | 'reset' | 'taken'; name: string; link: string }
  | { about: 'changes'; name: string; email: string }
  | { about: 'password'; name: string }
  | { about: 'passkey'; name: string; passkey: string }
  | { about: 'invitation'; name: string; link: string; inviter: string; household: string; role: Role; day: string };

export type WrittenMail = { subject: string; text: string; html: string };

type Paper = { subject: string; before: string[]; action: { label: string; link: string } | null; after: string[] };

/** A mail in words, as text and as HTML that says the same. */
export function writeMail(letter: Letter, language: Language): WrittenMail {
  const t = mailWords(language);
  const { subject, before, action, after } = paperOf(letter, language);
  const hello = t('hello', { name: letter.name });
  const foot = t('foot', { origin: environment().origin });
  const text = [hello, ...before, ...(action ? [`${action.label}:\n${action.link}`] : []), ...after, `-- \n${foot}`];
  const html = [
    paragraph(hello),
    ...before.map(paragraph),
    ...(action ? [button(action), paragraph(t('byHand')), paragraph(action.link)] : []),
    ...after.map(paragraph),
    paragraph(foot),
  ];
  return { subject, text: `${text.join('\n\n')}\n`, html: page(subject, language, html.join('\n')) };
}

function paperOf(letter: Letter, language: Language): Paper {
  const t = mailWords(language);
  switch (letter.about) {
    case 'confirm':
    case 'change':
    case 'reset': {
      const { about, link } = letter;
      return {
        subject: t(`${about}.subject`),
        before: [t(`${about}.words`)],
        action: { label: t(`${about}.action`), link },
        after: [t(`${about}.until`), t('notYou')],
      };
    }
    case 'taken':
      return {
        subject: t('taken.subject'),
        before: [t('taken.words')],
        action: { label: t('taken.action'), link: letter.link },
        after: [t('taken.forgotten'), t('notYou')],
      };
    case 'changes': {
      const { email } = letter;
      return {
        subject: t('changes.subject'),
        before: [t('changes.words', { email })],
        action: null,
        after: [t('changes.notYou')],
      };
    }
    case 'password':
      return {
        subject: t('password.subject'),
        before: [t('password.words')],
        action: null,
        after: [t('password.notYou')],
      };
    case 'passkey':
      return {
        subject: t('passkey.subject'),
        before: [t('passkey.words', { passkey: letter.passkey })],
        action: null,
        after: [t('passkey.notYou')],
      };
    case 'invitation': {
      const { inviter, household, role, day, link } = letter;
      return {
        subject: t('invitation.subject', { inviter, household }),
        before: [t('invitation.words', { inviter, household, role }), t('invitation.what')],
        action: { label: t('invitation.action'), link },
        after: [t('invitation.until', { day }), t('invitation.notYou', { inviter })],
      };
    }
  }
}

// No colours and no pictures: a mail program shows it in its own, light or dark, and nothing is fetched.
const page = (title: string, language: Language, body: string) =>
  `<!doctype html>
<html lang="${language}">
<head><meta charset="utf-8"><title>${escaped(title)}</title></head>
<body style="margin:0 auto;max-width:34em;padding:1.5em;font:1.05em/1.5 sans-serif">
${body}
</body>
</html>
`;

const paragraph = (words: string) => `<p style="overflow-wrap:anywhere">${escaped(words)}</p>`;

const button = ({ label, link }: { label: string; link: string }) =>
  `<p><a href="${escaped(link)}" style="display:inline-block;padding:.6em 1.1em;border:2px solid;border-radius:4px;font-weight:bold;text-decoration:none">${escaped(label)}</a></p>`;

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** What people call themselves stands in mail: it stays text. */
function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign);
}
