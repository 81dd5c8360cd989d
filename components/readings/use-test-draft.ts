'use client';

import { useState } from 'react';
import { z } from 'zod';
import { readKept, writeKept } from '@/lib/client/device-store';
import { readingMethods } from '@/lib/schemas/reading-kinds';
import { emptyTest } from './empty-test';
import { useReadingSetting } from './reading-setting';
import { isTouched, type TestDraft, testDraftSchema, testInSystem } from './test-draft';

const methodSchema = z.enum(readingMethods);

/** The test being written down, kept on this device until it is answered, and how this person tested last. */
export function useTestDraft(kind: TestDraft['kind']) {
  const { householdId, personId, unitSystem, locale } = useReadingSetting();
  const name = `wadewell.test.${personId}.${householdId}`;
  const methodName = `wadewell.test-method.${personId}.${householdId}`;
  const fresh = (which: TestDraft['kind']) =>
    emptyTest(crypto.randomUUID(), which, readKept(methodName, methodSchema) ?? 'strip', unitSystem);

  const [kept, setKept] = useState<TestDraft>(() => {
    const draft = readKept(name, testDraftSchema);
    if (draft === undefined) return fresh(kind);
    // A draft in which nothing was written yet follows the link that led here.
    return isTouched(draft) ? draft : { ...draft, kind };
  });
  const setDraft = (draft: TestDraft) => {
    setKept(draft);
    writeKept(name, draft);
    writeKept(methodName, draft.method);
  };
  return {
    draft: testInSystem(kept, unitSystem, locale),
    setDraft,
    forget: () => writeKept(name, undefined),
    startAgain: () => setDraft(fresh('quick')),
  };
}
