'use client';

import { useState } from 'react';
import { oneOf, readKept, writeKept } from '@/lib/client/device-store';
import { readingMethods } from '@/lib/schemas/reading-kinds';
import { emptyTest } from './empty-test';
import { draftName } from './kept-draft';
import { useReadingSetting } from './reading-setting';
import { isTouched, testInSystem } from './test-draft';
import type { TestDraft } from './test-draft-schema';

/**
 * The test being written down, kept on this device until it is answered, and how this person tested last.
 *
 * @param draft what is kept from before
 */
export function useTestDraft(kind: TestDraft['kind'], draft: TestDraft | undefined) {
  const setting = useReadingSetting();
  const { householdId, personId, unitSystem, locale } = setting;
  const name = draftName(setting);
  const methodName = `wadewell.test-method.${personId}.${householdId}`;
  const fresh = (which: TestDraft['kind']) =>
    emptyTest(crypto.randomUUID(), which, readKept(methodName, oneOf(readingMethods)) ?? 'strip', unitSystem);

  const [kept, setKept] = useState<TestDraft>(() => {
    if (draft === undefined) return fresh(kind);
    // A draft in which nothing was written yet follows the link that led here.
    return isTouched(draft) ? draft : { ...draft, kind };
  });
  const setDraft = (next: TestDraft) => {
    setKept(next);
    writeKept(name, next);
    writeKept(methodName, next.method);
  };
  return {
    draft: testInSystem(kept, unitSystem, locale),
    setDraft,
    forget: () => writeKept(name, undefined),
    startAgain: () => setDraft(fresh('quick')),
  };
}
