import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { untilFetched } from '@/components/ui/until-fetched';

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

const lost = () => Object.assign(new Error('Failed to load chunk'), { name: 'ChunkLoadError' });

it('asks again until the code comes, ever more seldom', async () => {
  const fetchPart = vi.fn<() => Promise<string>>().mockRejectedValue(lost());
  const part = untilFetched(fetchPart);
  await vi.advanceTimersByTimeAsync(7_500);
  // At once, and after 1, 3 and 7 seconds.
  expect(fetchPart).toHaveBeenCalledTimes(4);
  fetchPart.mockResolvedValue('chart');
  await vi.advanceTimersByTimeAsync(8_000);
  await expect(part).resolves.toBe('chart');
});

it('asks at once when the connection is back', async () => {
  const fetchPart = vi.fn<() => Promise<string>>().mockRejectedValueOnce(lost()).mockResolvedValue('chart');
  const part = untilFetched(fetchPart);
  await vi.advanceTimersByTimeAsync(10);
  window.dispatchEvent(new Event('online'));
  await expect(part).resolves.toBe('chart');
});

it('does not hide a fault in the code', async () => {
  const fetchPart = vi.fn<() => Promise<string>>().mockRejectedValue(new TypeError('x is not a function'));
  await expect(untilFetched(fetchPart)).rejects.toThrow('x is not a function');
  expect(fetchPart).toHaveBeenCalledTimes(1);
});
