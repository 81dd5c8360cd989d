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
    const advice = within(dialog).getByText(/Everyone out and pump off now/).textContent;
    // Out of the water before the pump, and a person who knows before anybody swims.
    expect(advice.indexOf('Everyone out')).toBeLessThan(advice.indexOf('pump off'));
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
    fireEvent.click(screen.getByRole('button', { name: 'It is replaced' }));
    expect(screen.getByText(/Has someone seen that the new cover is whole/)).toBeInTheDocument();
    expect(asked.some(({ method }) => method === 'DELETE')).toBe(false);
    fireEvent.click(screen.getByRole('button', { name: 'Yes, it is replaced' }));
    await waitFor(() =>
      expect(asked).toContainEqual(expect.objectContaining({ method: 'DELETE', url: `/api/pool-events/${cover.id}` })),
    );
  });

  it('a mistake is taken back in one tap', async () => {
    await showSheet(aWeekSheet({}, { events: [{ ...cover, kind: 'storm' }] }));
    const asked = listen();
    fireEvent.click(screen.getByRole('button', { name: 'That was a mistake' }));
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
