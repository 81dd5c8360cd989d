import { useTranslations } from 'next-intl';
import { Disclosure } from '@/components/ui/disclosure';
import { textLink } from '@/components/ui/text-link';

type Mail = { id: string; email: string; subject: string; text: string; html: string };

/** Mail that was written and goes nowhere else: as text with its links, and as it looks in a mail program. */
export function KeptMails({ mails }: { mails: readonly Mail[] }) {
  const t = useTranslations('start.mailbox');
  if (mails.length === 0) return <p className="text-body">{t('none')}</p>;
  return (
    <ol className="grid gap-6">
      {mails.map(({ id, email, subject, text, html }) => (
        <li key={id} className="grid min-w-0 gap-1.5 border-t border-rule pt-3">
          <h2 className="font-display text-name break-words">{subject}</h2>
          <p className="text-small break-words text-ink-2">{t('to', { email })}</p>
          <p className="min-w-0 text-body wrap-anywhere whitespace-pre-line">{withLinks(text)}</p>
          <Disclosure summary={<span className="text-small">{t('asHtml')}</span>}>
            <iframe sandbox="" srcDoc={html} title={subject} className="h-96 w-full border border-rule" />
          </Disclosure>
        </li>
      ))}
    </ol>
  );
}

function withLinks(text: string): React.ReactNode[] {
  return text.split(/(https?:\/\/\S+)/).map((part, index) =>
    // Every second part is an address.
    index % 2 === 0 ? (
      part
    ) : (
      <a key={index} href={part} className={textLink}>
        {part}
      </a>
    ),
  );
}
