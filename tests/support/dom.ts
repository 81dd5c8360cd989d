import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterAll, afterEach, vi } from 'vitest';

afterEach(() => {
  cleanup();
  // Also what a test has put there by hand.
  document.body.replaceChildren();
});

// The next file runs in the same browser.
afterAll(() => {
  vi.unstubAllGlobals();
  localStorage.clear();
  sessionStorage.clear();
});
