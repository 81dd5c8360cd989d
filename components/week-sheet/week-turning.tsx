'use client';

import Link from 'next/link';
import { useEffect, useRef } from 'react';
import { useSheet } from './sheet-context';
import { type Point, swipeOf } from './swipe';
import { useIsPhone } from './use-is-phone';
import { useTimes } from './use-times';
import { weeksBeside } from './weeks';

/** What says of itself that a finger on it turns the weeks. */
export const turnsWeeks = { 'data-turns-weeks': '', className: 'max-sm:touch-pan-y max-sm:touch-pinch-zoom' } as const;

/**
 * Turns the weeks without a button: the left and right arrow keys, while nothing else on the page wants them, and on a
 * phone a swipe over the head of the page or over today. Draws nothing: it presses two links that nobody sees.
 */
export function WeekTurning() {
  const { sheet } = useSheet();
  const { today } = useTimes();
  const isPhone = useIsPhone();
  const previous = useRef<HTMLAnchorElement>(null);
  const next = useRef<HTMLAnchorElement>(null);

  useEffect(() => {
    const turn = (to: 'previous' | 'next') => (to === 'previous' ? previous : next).current?.click();
    const onKey = (event: KeyboardEvent) => {
      const way = event.key === 'ArrowLeft' ? 'previous' : event.key === 'ArrowRight' ? 'next' : undefined;
      if (way === undefined || event.defaultPrevented || event.repeat || isWithModifier(event)) return;
      if (!isFree(event.target)) return;
      event.preventDefault();
      turn(way);
    };
    document.addEventListener('keydown', onKey);
    const endSwipes = isPhone ? onSwipe(turn) : undefined;
    return () => {
      document.removeEventListener('keydown', onKey);
      endSwipes?.();
    };
  }, [isPhone]);

  const first = sheet.days[0]?.day;
  if (first === undefined) return null;
  const beside = weeksBeside(first, today);
  return (
    <div hidden>
      <Link ref={previous} href={beside.previous} scroll={false} prefetch={false} tabIndex={-1} />
      <Link ref={next} href={beside.next} scroll={false} prefetch={false} tabIndex={-1} />
    </div>
  );
}

function isWithModifier({ altKey, ctrlKey, metaKey, shiftKey }: KeyboardEvent): boolean {
  return altKey || ctrlKey || metaKey || shiftKey;
}

/** The keys are free while nothing has the focus, and on the arrows themselves; a field, a chart or a scroller has its own use for them. */
function isFree(target: EventTarget | null): boolean {
  return target === document.body || (target instanceof Element && target.closest('[data-weeks]') !== null);
}

/** Listens for fingers that begin on what turns the weeks; a curve that is read hour by hour, and a field, keep theirs. */
function onSwipe(turn: (to: 'previous' | 'next') => void): () => void {
  let began: (Point & { id: number }) | undefined;
  const onDown = ({ target, isPrimary, pointerType, pointerId, clientX, clientY }: PointerEvent) => {
    const element = target instanceof Element ? target : undefined;
    const turns = element?.closest('[data-turns-weeks]') && !element.closest('[role=slider], input, select, textarea');
    // A second finger makes it a pinch.
    began = turns && isPrimary && pointerType === 'touch' ? { id: pointerId, x: clientX, y: clientY } : undefined;
  };
  const onUp = ({ pointerId, clientX, clientY }: PointerEvent) => {
    if (began?.id !== pointerId) return;
    const way = swipeOf(began, { x: clientX, y: clientY });
    began = undefined;
    if (way !== undefined) turn(way);
  };
  // The browser has taken the finger for scrolling.
  const onCancel = () => (began = undefined);
  document.addEventListener('pointerdown', onDown);
  document.addEventListener('pointerup', onUp);
  document.addEventListener('pointercancel', onCancel);
  return () => {
    document.removeEventListener('pointerdown', onDown);
    document.removeEventListener('pointerup', onUp);
    document.removeEventListener('pointercancel', onCancel);
  };
}
