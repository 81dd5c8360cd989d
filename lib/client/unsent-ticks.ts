import type { SentTick } from './doses';
import { unsentLists } from './unsent';

const { all, keep, forget, useAll } = unsentLists<SentTick>(
  () => import('./checked-ticks').then(({ checkedTicks }) => checkedTicks),
  ({ tick }) => tick.id,
);

/** Ticks that could not be sent, kept on this device for one person. */
export function useUnsentTicks(personId: string): readonly SentTick[] {
  return useAll(keyOf(personId));
}

export function unsentTicks(personId: string): readonly SentTick[] {
  return all(keyOf(personId));
}

/** @returns whether the device took it */
export function keepTick(personId: string, sent: SentTick): Promise<boolean> {
  return keep(keyOf(personId), sent);
}

export function forgetTick(personId: string, tickId: string): Promise<void> {
  return forget(keyOf(personId), tickId);
}

function keyOf(personId: string): string {
  return `wadewell.unsent-ticks.${personId}`;
}
