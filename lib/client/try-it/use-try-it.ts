'use client';

import { useEffect, useRef, useState } from 'react';
import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import type { Advice, CourseAnswer } from './messages';
import { TryItSession } from './session';

/** What is known of the newest changes, as far as it has been worked out. */
export type Tried = { course?: CourseAnswer; advice?: Advice; failed?: boolean };

const nothing: Tried = {};

/**
 * The engine behind Try it, from when there is something to try on. An answer stays until the next one has come, so that
 * line and words do not flicker between two inputs.
 *
 * @param changes undefined while nothing is tried
 */
export function useTryIt(start: TryOutStart | undefined, changes: TryOutChanges | undefined): Tried {
  const session = useRef<TryItSession>(undefined);
  const [tried, setTried] = useState(nothing);
  // The sheet is fetched anew every minute: what says the same is not worked out again.
  const asked = changes && JSON.stringify(changes);

  useEffect(() => {
    if (start === undefined) return undefined;
    const opened = new TryItSession(start, {
      // Advice on what was tried before goes with the first course of the next.
      course: (course) =>
        setTried((known) => (known.course?.number === course.number ? { ...known, course } : { course })),
      advice: ({ advice }) => setTried((known) => ({ ...known, advice })),
      failed: () => setTried({ failed: true }),
      stopped: () => setTried(nothing),
    });
    session.current = opened;
    return () => {
      session.current = undefined;
      opened.close();
    };
  }, [start]);

  useEffect(() => {
    if (asked === undefined) session.current?.stop();
    else session.current?.try(tryOutChangesOf(asked));
    // A new start is a new session, which has yet to hear what is tried.
  }, [start, asked]);

  return changes === undefined ? nothing : tried;
}

function tryOutChangesOf(asked: string): TryOutChanges {
  // Written a line above by this very module.
  return JSON.parse(asked) as TryOutChanges;
}
