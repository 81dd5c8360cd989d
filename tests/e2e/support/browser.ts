import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import type { Server } from './server';

export const flags = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM_PATH || '/usr/bin/chromium',
    headless: true,
    args: flags,
  });
}

export type VisitorOptions = {
  width?: number;
  height?: number;
  timeZone?: string;
  locale?: string;
  theme?: 'light' | 'dark';
  /** A finger instead of a mouse. */
  touch?: boolean;
  /** False for a browser that runs none of the page's scripts. */
  scripts?: boolean;
};

/** One person with a browser of their own, and everything the browser complained about. */
export class Visitor {
  /** Console errors and warnings, uncaught errors, refused policies, answers of 500 and over. */
  readonly complaints: string[] = [];
  // The emergency card's worker is fetched once a page has been left alone, also where a journey has stopped the server by then.
  #expected: RegExp[] = [/An unknown error occurred when fetching the script/];

  private constructor(
    readonly name: string,
    readonly context: BrowserContext,
    readonly page: Page,
  ) {}

  static async open(browser: Browser, server: Server, name: string, options: VisitorOptions = {}): Promise<Visitor> {
    const { width = 1280, height = 900, timeZone = 'America/New_York', locale = 'en-US' } = options;
    const { theme = 'light', touch = false, scripts = true } = options;
    const context = await browser.newContext({
      baseURL: server.address,
      viewport: { width, height },
      timezoneId: timeZone,
      locale,
      colorScheme: theme,
      reducedMotion: 'reduce',
      hasTouch: touch,
      isMobile: touch,
      javaScriptEnabled: scripts,
    });
    context.setDefaultTimeout(15_000);
    // The loader of TypeScript marks functions by their names, also those that run in the page.
    await context.addInitScript('globalThis.__name ??= (named) => named');
    // A refused policy is reported to nobody unless somebody listens before the page's own code runs.
    await context.addInitScript(() => {
      document.addEventListener('securitypolicyviolation', (event) => {
        console.error(`policy refused ${event.violatedDirective} ${event.blockedURI} ${event.sourceFile}`);
      });
    });
    const visitor = new Visitor(name, context, await context.newPage());
    visitor.watch(visitor.page);
    return visitor;
  }

  /** Another tab of the same browser. */
  async newTab(): Promise<Page> {
    const page = await this.context.newPage();
    this.watch(page);
    return page;
  }

  /** What is about to be provoked on purpose. */
  expect(...complaints: RegExp[]): void {
    this.#expected.push(...complaints);
  }

  private watch(page: Page): void {
    const complain = (words: string) => {
      if (!this.#expected.some((expected) => expected.test(words))) this.complaints.push(`${page.url()}: ${words}`);
    };
    page.on('console', (message) => {
      if (['error', 'warning'].includes(message.type())) complain(`${message.text()} ${message.location().url}`);
    });
    page.on('pageerror', (error) => complain(`uncaught ${error.message}`));
    page.on('response', (response) => {
      if (response.status() >= 500) complain(`${response.status()} ${response.url()}`);
    });
  }
}
