import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import events from '@/lib/messages/en/events.json';
import type { PoolEvent } from '@/lib/schemas/pool-event';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());

const cover: PoolEvent = {
  id: '00000000-0000-4000-8000-0000000000e1',
  kind: 'drain-cover',
  happenedAt: '2026-07-08T09:00:00+02:00',
  reportedBy: 'Ines',
};

/** Answers every request and keeps what was asked. */
function listen() {
  const asked: { url: string; method: string; body: unknown }[] = [];
  vi.stubGlobal('fetch', (url: string, init: RequestInit = {}) => {
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined;
    asked.push({ url, method: init.method ?? 'GET', body });
    const reply = url.startsWith('/api/pool-events') ? { done: true } : aWeekSheet();
    return Promise.resolve(new Response(JSON.stringify(reply), { headers: { 'content-type': 'application/json' } }));
  });
  return asked;
}

describe('what happened to the pool', () => {
  it('is asked for below the verdict; the advice comes with the choice and before anything is sent', async () => {
    await showSheet(aWeekSheet());
    const asked = listen();
    fireEvent.click(screen.getByRole('button', { name: 'Did something happen to the pool?' }));
    const dialog = await screen.findByRole('dialog', { name: 'What happened?' });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Write it down' }));
    expect(await within(dialog).findByText('Choose what happened.')).toBeInTheDocument();
    fireEvent.click(within(dialog).getByRole('radio', { name: /A drain cover is loose/ }));
    const advice = within(dialog).getByText(/Somebody held: pump off first/).textContent;
    // Who is held comes first, and for them the pump; everybody else leaves the water before it.
    const order = ['held', 'pump off first', 'emergency number', 'everyone out', 'pump off.'].map((said) =>
      advice.indexOf(said),
    );
    expect(order).toEqual(order.toSorted((a, b) => a - b));
    expect(Math.min(...order)).toBeGreaterThanOrEqual(0);
    expect(asked.filter(({ method }) => method === 'POST')).toEqual([]);
    fireEvent.click(within(dialog).getByRole('button', { name: 'Write it down' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(asked.find(({ method }) => method === 'POST')).toMatchObject({
      url: '/api/pool-events',
      body: { kind: 'drain-cover', happenedAt: expect.any(String) as string, id: expect.any(String) as string },
    });
  });

  it('a new drain cover is asked about before the water is given free', async () => {
    await showSheet(aWeekSheet({}, { events: [cover] }));
    const asked = listen();
    expect(screen.getByText('Drain cover not whole, this morning, Ines.')).toBeInTheDocument();
    // What to do stays there for everybody, and no dose is described that wants the pump on.
    expect(screen.getByText(/Somebody held: pump off first/)).toBeInTheDocument();
    fireEvent.click(screen.getByRole('button', { name: 'It is replaced' }));
    expect(screen.getByText(/Has someone seen that the new cover is whole/)).toBeInTheDocument();
    expect(asked.some(({ method }) => method === 'DELETE')).toBe(false);
    fireEvent.click(screen.getByRole('button', { name: 'Yes, it is replaced' }));
    await waitFor(() =>
      expect(asked).toContainEqual(expect.objectContaining({ method: 'DELETE', url: `/api/pool-events/${cover.id}` })),
    );
  });

  it('no dose is described while it bars dosing', async () => {
    const phone = { width: 390 };
    const { unmount } = await showSheet(aWeekSheet(), phone);
    expect(screen.getAllByText(/Pump on now/).length).toBeGreaterThan(0);
    unmount();
    for (const kind of ['drain-cover', 'storm', 'pump-failure'] as const) {
      const shown = await showSheet(aWeekSheet({}, { events: [{ ...cover, kind }] }), phone);
      expect(screen.queryByText(/Pump on now/)).toBeNull();
      expect(screen.queryByRole('button', { name: 'I am adding it now' })).toBeNull();
      expect(screen.getAllByText(/^Nothing goes in/).length).toBeGreaterThan(0);
      shown.unmount();
    }
  });

  it('a mistake is taken back after one question', async () => {
    await showSheet(aWeekSheet({}, { events: [{ ...cover, kind: 'storm' }] }));
    const asked = listen();
    fireEvent.click(screen.getByRole('button', { name: 'That was a mistake' }));
    expect(screen.getByText(/If it did, it is over with the next test/)).toBeInTheDocument();
    expect(asked.some(({ method }) => method === 'DELETE')).toBe(false);
    fireEvent.click(screen.getByRole('button', { name: 'It did not happen' }));
    await waitFor(() => expect(asked.some(({ method }) => method === 'DELETE')).toBe(true));
  });

  it('whoever only looks sees it and is not asked', async () => {
    const sheet = aWeekSheet({}, { events: [cover] });
    await showSheet({ ...sheet, me: { ...sheet.me, role: 'viewer' } });
    expect(screen.getByText(/Drain cover not whole/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'It is replaced' })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Did something happen to the pool?' })).toBeNull();
  });

  it('advises nobody to touch a switch in a wet pump room, and never promises safety', () => {
    const words = JSON.stringify(events);
    expect(words).toContain('touch no switch');
    expect(words).not.toMatch(/\bsafe\b/i);
  });
});
