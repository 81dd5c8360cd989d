'use client';

import { type QueryClient, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { addDays } from '@/lib/calendar/household-day';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { NewReading, RecordedReading } from '@/lib/schemas/reading';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { UnsentReading } from './checked-readings';
import { fetchJson, RequestProblem } from './fetch-json';
import { forgetReading, keepReading, unsentReadings, useUnsentReadings } from './unsent-readings';
import type { ReadingOwner } from './unsent-readings-key';
import { weekKeys, weekSheet } from './week';

const recordedReadingReply = () =>
  import('@/lib/schemas/reading').then(({ recordedReadingSchema }) => recordedReadingSchema);

export { type FalseZeroCause, falseZeroQuestion } from '@/lib/verdict/false-zero';

/** The sheet of now, and the doses of it and of the week after: a plan runs into the next one. */
export type PlannedWeek = { sheet: WeekSheet; doses: readonly PlanDose[] };

/** What became of a test: on the server, with the week that follows from it, or kept on this device until it can be sent. */
export type SentReading =
  { where: 'server'; reading: RecordedReading; week: PlannedWeek | undefined } | { where: 'device' };

const patience = 30_000;

/**
 * Sends a test. Without a connection it waits on the device under the id it was given when its form opened, so that sending
 * it again, by hand or by itself, is the same one test.
 */
export function useSendReading(owner: ReadingOwner) {
  const client = useQueryClient();
  return useMutation({
    mutationKey: ['send-reading'],
    // Told at once where there is no connection, and not held back without a word.
    networkMode: 'always',
    mutationFn: async (reading: NewReading): Promise<SentReading> => {
      try {
        const recorded = await post(reading);
        await forgetReading(owner, reading.id);
        return { where: 'server', reading: recorded, week: await newWeek(client) };
      } catch (problem) {
        if (isOffline(problem) && (await keepReading(owner, reading))) return { where: 'device' };
        throw problem;
      }
    },
  });
}

/** Corrects a test that was sent before; what it was is kept in the record. */
export function useCorrectReading() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: async (reading: NewReading): Promise<SentReading> => {
      const corrected = await fetchJson(`/api/readings/${reading.id}`, recordedReadingReply, {
        method: 'PUT',
        body: reading,
      });
      return { where: 'server', reading: corrected, week: await newWeek(client) };
    },
  });
}

/** A test as it was recorded, to be sent again with a change. */
export function asNewReading(recorded: RecordedReading): NewReading {
  const { id, takenAt, kind, method, values, look, zeroAnswer, note } = recorded;
  return {
    ...{ id, takenAt, kind, method, values, look },
    ...(zeroAnswer === null ? {} : { zeroAnswer }),
    ...(note === null ? {} : { note }),
  };
}

/** Sends what waits on this device: when the page opens, when the connection is back, and every half minute. */
export function useSendUnsentReadings(owner: ReadingOwner): {
  unsent: readonly UnsentReading[];
  send: () => void;
  busy: boolean;
} {
  const client = useQueryClient();
  const unsent = useUnsentReadings(owner);
  const sending = useMutation({
    networkMode: 'always',
    mutationFn: () => sendAll(owner),
    onSuccess: async (sent) => {
      if (sent > 0) await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
  const { mutate } = sending;
  const waiting = unsent.filter(({ refusal }) => refusal === null).length;
  useEffect(() => {
    if (waiting === 0) return;
    const send = () => mutate();
    send();
    window.addEventListener('online', send);
    const timer = window.setInterval(send, patience);
    return () => {
      window.removeEventListener('online', send);
      window.clearInterval(timer);
    };
  }, [waiting, mutate]);
  return { unsent, send: () => mutate(), busy: sending.isPending };
}

let allSending: Promise<number> | null = null;

/** One round at a time; two of them would only wait for each other. @returns how many were sent */
function sendAll(owner: ReadingOwner): Promise<number> {
  allSending ??= sendEach(owner).finally(() => {
    allSending = null;
  });
  return allSending;
}

async function sendEach(owner: ReadingOwner): Promise<number> {
  let sent = 0;
  for (const { reading, refusal } of unsentReadings(owner)) {
    if (refusal !== null) continue;
    try {
      await post(reading);
      await forgetReading(owner, reading.id);
      sent += 1;
    } catch (problem) {
      if (isOffline(problem)) return sent;
      // What the server will never take stays where it can be seen, with the reason.
      const lasting = problem instanceof RequestProblem && lastingRefusals.includes(problem.code);
      if (lasting) await keepReading(owner, reading, problem.problems[0]?.message ?? problem.message);
    }
  }
  return sent;
}

const lastingRefusals: readonly string[] = ['invalid-input', 'not-allowed', 'conflict', 'not-found'];

function post(reading: NewReading): Promise<RecordedReading> {
  return fetchJson('/api/readings', recordedReadingReply, { method: 'POST', body: reading });
}

function isOffline(problem: unknown): boolean {
  return problem instanceof RequestProblem && problem.code === 'no-connection';
}

/** The sheet with its new plan; undefined when it could not be fetched: the test is saved all the same. */
async function newWeek(client: QueryClient): Promise<PlannedWeek | undefined> {
  // A refetch that set out before the test would bring the old sheet back.
  await client.cancelQueries({ queryKey: weekKeys.all });
  await client.invalidateQueries({ queryKey: weekKeys.all, refetchType: 'none' });
  return plannedWeek(client).catch(() => undefined);
}

async function plannedWeek(client: QueryClient): Promise<PlannedWeek> {
  const sheet = await client.fetchQuery({ ...weekSheet(undefined), staleTime: 0 });
  const next = await client.fetchQuery({ ...weekSheet(weekAfter(sheet)), staleTime: 0 });
  return { sheet, doses: [...sheet.doses, ...next.doses] };
}

function weekAfter({ days }: WeekSheet): string {
  return addDays(days[0]?.day ?? '', days.length);
}

/** The week and its plan as they stand before a test, asked for while it is written down. */
export function usePlannedWeek(enabled: boolean): PlannedWeek | undefined {
  const now = useQuery({ ...weekSheet(undefined), enabled });
  const next = useQuery({
    ...weekSheet(now.data && weekAfter(now.data)),
    enabled: now.data !== undefined,
  });
  if (now.data === undefined) return undefined;
  return { sheet: now.data, doses: [...now.data.doses, ...(next.data?.doses ?? [])] };
}
