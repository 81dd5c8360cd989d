import { vi } from 'vitest';

/** The router of a page that is not served by Next. */
export const router = { push: vi.fn(), replace: vi.fn() };
export const useRouter = () => router;
