import { describe, expect, it } from 'vitest';
import { deviceOf } from '@/lib/auth/device';

const webkit = 'AppleWebKit/605.1.15 (KHTML, like Gecko)';
const blink = 'AppleWebKit/537.36 (KHTML, like Gecko)';

describe('what a browser says of itself', () => {
  it.each([
    [`Mozilla/5.0 (Linux; Android 15; K) ${blink} Chrome/140.0.0.0 Mobile Safari/537.36`, 'chrome', 'android'],
    [
      `Mozilla/5.0 (Linux; Android 15; SM) ${blink} SamsungBrowser/28.0 Chrome/130.0.0.0 Safari/537.36`,
      'samsung-internet',
      'android',
    ],
    [
      `Mozilla/5.0 (iPhone; CPU iPhone OS 18_6 like Mac OS X) ${webkit} Version/18.6 Mobile/15E148 Safari/604.1`,
      'safari',
      'iphone',
    ],
    [
      `Mozilla/5.0 (iPhone; CPU iPhone OS 18_6 like Mac OS X) ${webkit} CriOS/140.0 Mobile/15E148 Safari/604.1`,
      'chrome',
      'iphone',
    ],
    [
      `Mozilla/5.0 (iPad; CPU OS 16_7 like Mac OS X) ${webkit} FxiOS/140.0 Mobile/15E148 Safari/605.1.15`,
      'firefox',
      'ipad',
    ],
    [`Mozilla/5.0 (Macintosh; Intel Mac OS X 10_15_7) ${webkit} Version/18.6 Safari/605.1.15`, 'safari', 'mac'],
    [
      `Mozilla/5.0 (Windows NT 10.0; Win64; x64) ${blink} Chrome/140.0.0.0 Safari/537.36 Edg/140.0.0.0`,
      'edge',
      'windows',
    ],
    [
      `Mozilla/5.0 (Windows NT 10.0; Win64; x64) ${blink} Chrome/138.0.0.0 Safari/537.36 OPR/122.0.0.0`,
      'opera',
      'windows',
    ],
    [`Mozilla/5.0 (X11; CrOS x86_64 14541.0.0) ${blink} Chrome/140.0.0.0 Safari/537.36`, 'chrome', 'chrome-os'],
    ['Mozilla/5.0 (X11; Linux x86_64; rv:142.0) Gecko/20100101 Firefox/142.0', 'firefox', 'linux'],
    ['SomeBrowser/1.0 (Android)', null, 'android'],
  ])('%s', (said, browser, system) => {
    expect(deviceOf(said)).toEqual({ browser, system });
  });

  it('is nothing where it names neither, and is not read to the end of a novel', () => {
    expect([deviceOf(null), deviceOf(''), deviceOf('curl/8.14.1')]).toEqual([null, null, null]);
    expect(deviceOf(`${'x'.repeat(20_000)} Firefox/142.0`)).toBeNull();
  });
});
