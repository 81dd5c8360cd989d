import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewStopConfirmation } from '@/lib/schemas/stop-confirmation';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

/** Says that the Stop of a dose has been read; the sheet then asks for what goes in. */
export function useConfirmStop() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (confirmation: NewStopConfirmation) =>
      fetchJson('/api/stop-confirmations', doneReply, { method: 'POST', body: confirmation }),
    onSuccess: () => client.invalidateQueries({ queryKey: weekKeys.all }),
  });
}
