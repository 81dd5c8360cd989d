import { fireEvent, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

const pressed: string[] = [];
/** There is no server to go to: the address is noted before the page acts on it. */
function note(event: Event): void {
  const link = event.target instanceof Element ? event.target.closest('a') : null;
  if (link === null) return;
  pressed.push(link.getAttribute('href') ?? '');
  event.preventDefault();
  event.stopPropagation();
}

beforeEach(() => {
  localStorage.clear();
  pressed.length = 0;
  document.addEventListener('click', note, true);
});
afterEach(() => {
  document.removeEventListener('click', note, true);
  vi.restoreAllMocks();
});

const before = '/week?start=2026-06-29';
const after = '/week?start=2026-07-13';

describe('the arrow keys', () => {
  it('turn the weeks while nothing has the focus', async () => {
    await showSheet(aWeekSheet());
    fireEvent.keyDown(document.body, { key: 'ArrowLeft' });
    fireEvent.keyDown(document.body, { key: 'ArrowRight' });
    expect(pressed).toEqual([before, after]);
  });

  it('turn them on the arrows of the page, which stay in focus', async () => {
    const { user } = await showSheet(aWeekSheet());
    const link = within(screen.getByRole('navigation', { name: 'Weeks' })).getByRole('link', { name: 'Week after' });
    expect(link).toHaveAttribute('href', after);
    link.focus();
    await user.keyboard('{ArrowRight}');
    expect(pressed).toEqual([after]);
    expect(link).toHaveFocus();
  });

  it('are left to a chart, a scroller and a field', async () => {
    await showSheet(aWeekSheet(), { plot: 910 });
    const curve = await screen.findByRole('slider', { name: /^Free chlorine/ }, { timeout: 15_000 });
    fireEvent.keyDown(curve, { key: 'ArrowRight' });
    fireEvent.keyDown(screen.getByRole('region', { name: /^The week in lanes/ }), { key: 'ArrowRight' });
    expect(pressed).toEqual([]);
  });

  it('are left to the browser with another key held, and turn one week for one press', async () => {
    await showSheet(aWeekSheet());
    for (const held of [{ altKey: true }, { ctrlKey: true }, { metaKey: true }, { shiftKey: true }, { repeat: true }])
      fireEvent.keyDown(document.body, { key: 'ArrowLeft', ...held });
    expect(pressed).toEqual([]);
  });
});

describe('a finger on a phone', () => {
  const swipe = (element: Element, x: number, y = 0, type = 'touch') => {
    const finger = { pointerId: 1, pointerType: type, isPrimary: true, bubbles: true };
    fireEvent.pointerDown(element, { ...finger, clientX: 200, clientY: 300 });
    fireEvent.pointerUp(element, { ...finger, clientX: 200 + x, clientY: 300 + y });
  };

  it('turns the weeks over the head of the page and over today', async () => {
    await showSheet(aWeekSheet(), { width: 390 });
    swipe(screen.getByRole('heading', { level: 1 }), -90);
    swipe(screen.getByRole('heading', { name: /^Wed 8/ }), 90);
    expect(pressed).toEqual([after, before]);
  });

  it('does not while it scrolls, on the rest of the page, or when it is a mouse', async () => {
    await showSheet(aWeekSheet(), { width: 390 });
    const head = screen.getByRole('heading', { level: 1 });
    swipe(head, -70, 200);
    swipe(head, -90, 0, 'mouse');
    swipe(screen.getByRole('heading', { name: 'The rest of the week' }), -90);
    const finger = { pointerId: 1, pointerType: 'touch', isPrimary: true, clientX: 200, clientY: 300 };
    fireEvent.pointerDown(head, finger);
    fireEvent.pointerCancel(head, finger);
    fireEvent.pointerUp(head, { ...finger, clientX: 90 });
    expect(pressed).toEqual([]);
  });

  it('reads along the curve of today instead', async () => {
    await showSheet(aWeekSheet(), { width: 390, plot: 340 });
    swipe(await screen.findByRole('slider', {}, { timeout: 15_000 }), -90);
    expect(pressed).toEqual([]);
  });

  it('does not on a desk, where lanes scroll sideways', async () => {
    await showSheet(aWeekSheet(), { width: 700 });
    swipe(screen.getByRole('heading', { level: 1 }), -90);
    expect(pressed).toEqual([]);
  });
});

it('says at the head of a phone which other week it shows, with the way back', async () => {
  const past = aWeekSheet({ now: ['2026-07-15', '10:20'] });
  await showSheet(past, { width: 390, start: '2026-07-06' });
  const head = screen.getByRole('banner', { name: 'Week sheet' });
  const other = within(head).getAllByText('6 to 12 July')[0]!.parentElement!;
  expect(within(other).getByRole('link', { name: 'Week after' })).toHaveAttribute('href', '/week');
  expect(within(other).getByRole('link', { name: 'This week' })).not.toHaveAttribute('aria-current');
});

it('marks the week of now', async () => {
  await showSheet(aWeekSheet());
  const nav = screen.getByRole('navigation', { name: 'Weeks' });
  expect(within(nav).getByRole('link', { name: 'This week' })).toHaveAttribute('aria-current', 'date');
});
