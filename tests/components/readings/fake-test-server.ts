import { vi } from 'vitest';
import { type NewReading, newReadingSchema, type RecordedReading } from '@/lib/schemas/reading';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { WeekSheet } from '@/lib/schemas/week-sheet';

/** What the routes of readings and week answer, kept in memory; every body is checked by the schema of its route. */
export function fakeTestServer(sheet: WeekSheet, shelf: readonly HouseholdProduct[] = []) {
  const readings = new Map<string, NewReading>();
  const requests: { method: string; path: string; reading?: NewReading }[] = [];
  let now = sheet;
  const record = (reading: NewReading): RecordedReading => ({
    ...reading,
    createdAt: now.now,
    zeroAnswer: reading.zeroAnswer ?? null,
    note: reading.note ?? null,
    doneBy: now.me.name,
    recordedBy: now.me.name,
  });
  const answer = vi.fn<typeof fetch>(async (address, options) => {
    const path = String(address);
    const method = options?.method ?? 'GET';
    if (path.startsWith('/api/week')) {
      requests.push({ method, path });
      // The next calendar week holds no doses of its own here.
      return Response.json(path.includes('start=') ? { ...now, doses: [] } : now);
    }
    if (path === '/api/shelf-products') return Response.json(shelf);
    const reading = newReadingSchema.parse(JSON.parse(String(options?.body)));
    requests.push({ method, path, reading });
    if (method === 'POST' && !readings.has(reading.id)) readings.set(reading.id, reading);
    if (method === 'PUT') readings.set(reading.id, reading);
    return Response.json(record(readings.get(reading.id) ?? reading));
  });
  vi.stubGlobal('fetch', answer);
  return {
    answer,
    /** Every test that was sent, resends included. */
    sent: () => requests.flatMap(({ method, reading }) => (method !== 'GET' && reading ? [reading] : [])),
    stored: () => [...readings.values()],
    requests,
    /** What the sheet shows from now on. */
    become: (next: WeekSheet) => {
      now = next;
    },
  };
}
