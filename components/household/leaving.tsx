'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useEndMember } from '@/lib/client/members';
import { leaveFor } from '@/lib/client/session';
import type { Member } from '@/lib/schemas/member';
import { useRefusalWords } from './use-refusal-words';

/** The way out of a household; not for its last owner. */
export function Leaving({ members }: { members: readonly Member[] }) {
  const t = useTranslations('household');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const end = useEndMember();
  const [asked, setAsked] = useState(false);
  const you = members.find((member) => member.you);
  if (you === undefined) return null;
  const owners = members.filter(({ role }) => role === 'owner');
  if (you.role === 'owner' && owners.length === 1) return <p className="text-small text-ink-2">{t('lastOwner')}</p>;
  return (
    <div>
      <Button variant="quiet" className="-ml-1.5" onClick={() => setAsked(true)}>
        {t('leave')}
      </Button>
      <Dialog
        open={asked}
        onOpenChange={setAsked}
        title={t('leaveTitle')}
        description={t('leaveWords')}
        closeLabel={common('close')}
        actions={
          <>
            <Button
              variant="primary"
              busy={end.isPending || end.isSuccess ? t('leaving') : undefined}
              onClick={() => end.mutate(you.id, { onSuccess: () => leaveFor('/week') })}
            >
              {t('leaveYes')}
            </Button>
            <Button onClick={() => setAsked(false)}>{common('cancel')}</Button>
          </>
        }
      >
        {end.error === null ? null : <p role="alert">{words(end.error)}</p>}
      </Dialog>
    </div>
  );
}
