import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';

/** Asks for the key of the mailbox. */
export function MailboxKey({ wrong }: { wrong: boolean }) {
  const t = useTranslations('start.mailbox');
  return (
    <form method="get" className="grid gap-4">
      <TextField
        label={t('key')}
        hint={t('keyHint')}
        name="key"
        autoComplete="off"
        problem={wrong ? t('wrong') : undefined}
      />
      <Button type="submit" variant="primary">
        {t('open')}
      </Button>
    </form>
  );
}
