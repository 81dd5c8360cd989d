'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { textLink } from '@/components/ui/text-link';
import { RequestProblem } from '@/lib/client/fetch-json';
import { confirmEmail } from '@/lib/client/session';
import { useProblemWords } from '@/lib/messages/use-problem-words';

/** Says that an address is one's own. Only pressing it counts: mail programs open links by themselves. */
export function ConfirmButton({ token }: { token: string }) {
  const t = useTranslations('start.confirm');
  const words = useProblemWords();
  const confirm = useMutation({ networkMode: 'always', mutationFn: confirmEmail });
  if (confirm.isSuccess)
    return (
      <div role="status" className="grid gap-2 text-body">
        <p>{t('done')}</p>
        <PageLink href="/week" className={`inline-flex min-h-11 items-center ${textLink}`}>
          {t('on')}
        </PageLink>
      </div>
    );
  const refused = confirm.error instanceof RequestProblem && confirm.error.code === 'conflict';
  return (
    <div className="grid gap-3">
      <Button
        variant="primary"
        size="large"
        wide
        busy={confirm.isPending ? t('busy') : undefined}
        onClick={() => confirm.mutate({ token })}
      >
        {t('yes')}
      </Button>
      {confirm.error === null ? null : <ProblemState title={refused ? confirm.error.message : words(confirm.error)} />}
    </div>
  );
}
