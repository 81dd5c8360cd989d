import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { DoseTick } from '@/lib/schemas/plan-dose';
import { fetchJson, RequestProblem } from './fetch-json';
import { weekKeys, weekSheetReply } from './week';

export type SentTick = { doseId: string; tick: DoseTick };

/**
 * Says what became of a dose. The reply is the whole sheet of the dose's week with its new plan, so the curve moves at once;
 * where another week is on the screen, that is fetched again. Never held back while offline: the caller keeps what could not be sent.
 *
 * @param start the week on the screen, as it was asked for
 */
export function useTickDose(start: string | undefined) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationKey: ['tick-dose'],
    networkMode: 'always',
    mutationFn: ({ doseId, tick }: SentTick) =>
      fetchJson(`/api/doses/${doseId}/ticks`, weekSheetReply, { method: 'POST', body: tick }),
    onSuccess: async (sheet) => {
      const shown = weekKeys.starting(start);
      // A refetch that set out before the tick would bring the old sheet back.
      await queryClient.cancelQueries({ queryKey: weekKeys.all });
      const known = queryClient.getQueryData<typeof sheet>(shown);
      const isShown = known === undefined || known.days[0]?.day === sheet.days[0]?.day;
      await queryClient.invalidateQueries({ queryKey: weekKeys.all, refetchType: isShown ? 'none' : 'active' });
      if (isShown) queryClient.setQueryData(shown, sheet);
    },
    // Somebody was first, or the plan has moved on: what is on the screen is no longer true.
    onError: (problem) =>
      problem instanceof RequestProblem && problem.code === 'conflict'
        ? queryClient.invalidateQueries({ queryKey: weekKeys.all })
        : undefined,
  });
}
