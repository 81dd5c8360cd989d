'use client';

import { Copy } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';

/** A link to send on: it can be copied by the button, or by hand where a browser allows no page to. */
export function InvitationLink({ name, link }: { name: string; link: string }) {
  const t = useTranslations('household');
  const [copied, setCopied] = useState(false);
  return (
    <div role="status" className="mt-2 grid max-w-form gap-2">
      <TextField
        label={t('linkFor', { name })}
        value={link}
        readOnly
        onFocus={({ target }) => target.select()}
        aria-live="off"
      />
      <Button
        size="small"
        className="justify-self-start"
        onClick={() => {
          void navigator.clipboard.writeText(link).then(
            () => setCopied(true),
            () => undefined,
          );
        }}
      >
        <Copy aria-hidden="true" className="size-4.5" />
        {copied ? t('copied') : t('copy')}
      </Button>
    </div>
  );
}
