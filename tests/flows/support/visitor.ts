// Somebody at a screen of a certain size and theme, and what every page must keep while they use it.
import { readFileSync } from 'node:fs';
import type axe from 'axe-core';
import type { Browser, BrowserContext, Page } from 'playwright-core';

export const phone = { name: 'phone', width: 390, height: 844 } as const;
export const wide = { name: 'wide', width: 1440, height: 900 } as const;
export type Size = typeof phone | typeof wide;
export type Theme = 'light' | 'dark';

// Read and not imported: it is a script of pages, and looks for one when it is loaded.
const axeSource = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

export class Visitor {
  /** What the page complained about: script errors, refused styles, missing files. */
  readonly complaints: string[] = [];

  private constructor(
    readonly context: BrowserContext,
    readonly page: Page,
    readonly origin: string,
    readonly size: Size,
  ) {}

  static async at(browser: Browser, origin: string, size: Size, theme: Theme = 'light'): Promise<Visitor> {
    const { width, height } = size;
    const context = await browser.newContext({
      viewport: { width, height },
      hasTouch: size.name === 'phone',
      reducedMotion: 'reduce',
      colorScheme: theme,
      acceptDownloads: true,
    });
    await context.addInitScript((chosen) => localStorage.setItem('locant.theme', chosen), theme);
    const page = await context.newPage();
    page.setDefaultTimeout(15_000);
    const visitor = new Visitor(context, page, origin, size);
    page.on('pageerror', (error) => visitor.complaints.push(`error: ${error.message}`));
    page.on('console', (message) => {
      // A refused request is a line of the browser's own; what the page makes of it is looked at on the page.
      const isOwn = !/Failed to load resource|ERR_INTERNET_DISCONNECTED/.test(message.text());
      if (message.type() === 'error' && isOwn) visitor.complaints.push(`console: ${message.text()}`);
    });
    return visitor;
  }

  async go(address: string): Promise<void> {
    await this.page.goto(this.origin + address);
  }

  /** The page itself never scrolls sideways; frames within may. */
  async sidewaysPixels(): Promise<number> {
    return this.page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
  }

  /** Violations axe finds on the page as it stands. */
  async violations(): Promise<string[]> {
    // Not as a script of the page: its content security policy would refuse that, as it should.
    await this.page.evaluate(axeSource);
    return this.page.evaluate(async () => {
      const page = (window as unknown as { axe: typeof axe }).axe;
      const { violations } = await page.run(document, { resultTypes: ['violations'] });
      return violations.map(
        (one) =>
          `${one.id}: ${one.nodes
            .map((node) => node.target.join(' '))
            .slice(0, 4)
            .join(', ')}`,
      );
    });
  }

  async close(): Promise<void> {
    await this.context.close();
  }
}
