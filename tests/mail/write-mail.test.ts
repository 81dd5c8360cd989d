import { describe, expect, it } from 'vitest';
import { type Letter, writeMail } from '@/lib/mail/write-mail';
import { languages } from '@/lib/schemas/languages';

const link = 'http://127.0.0.1:3000/confirm/abc';
const invitation = {
  ...({ about: 'invitation', name: 'Otto', link, inviter: 'Ines', household: 'The Larches' } as const),
  ...({ role: 'viewer', day: '12 July 2026' } as const),
};
const letters: Letter[] = [
  { about: 'confirm', name: 'Ines', link },
  { about: 'change', name: 'Ines', link },
  { about: 'reset', name: 'Ines', link },
  { about: 'changes', name: 'Ines', email: 'new@pool.example' },
  { about: 'password', name: 'Ines' },
  { about: 'passkey', name: 'Ines', passkey: 'My telephone' },
  invitation,
];
const plain = (html: string) =>
  html
    .replace(/<head>.*<\/head>/s, '')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&#39;/g, "'")
    .replace(/&quot;/g, '"')
    .replace(/&amp;/g, '&');

describe.each(languages)('a mail in %s', (language) => {
  it.each(letters.map((letter) => [letter.about, letter] as const))(
    'says as text what it says as HTML: %s',
    (_, letter) => {
      const { subject, text, html } = writeMail(letter, language);
      expect(subject).not.toMatch(/[\r\n{]|mail\./);
      expect(text).not.toMatch(/[{}]|mail\./);
      expect(html).toContain(`<html lang="${language}">`);
      const words = plain(html).replace(/\s+/g, ' ');
      const sentences = text
        .replace(/^-- $/m, '')
        .split(/\n+/)
        .map((line) => line.replace(/:$/, '').trim())
        .filter((line) => line !== '');
      for (const sentence of sentences) expect(words).toContain(sentence);
      if ('link' in letter) {
        expect(text).toContain(letter.link);
        expect(html).toContain(`href="${letter.link}"`);
      }
      // Nothing is fetched, nothing runs.
      expect(html).not.toMatch(/<(img|script|link|iframe)|url\(/i);
    },
  );

  it('keeps what people call themselves as text', () => {
    const inviter = `<b onload="x">"Ines" & 'Otto'</b>`;
    const { html, text } = writeMail({ ...invitation, inviter }, language);
    expect(html).not.toContain('<b onload');
    expect(html).toContain('&lt;b onload=&quot;x&quot;&gt;');
    expect(text).toContain(inviter);
  });
});

it('speaks two languages', () => {
  for (const letter of letters) {
    const [english, spanish] = languages.map((language) => writeMail(letter, language));
    expect(english?.subject).not.toBe(spanish?.subject);
  }
});
