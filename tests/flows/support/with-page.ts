// A test that walks a page: what went wrong is told with the page as it stood.
import type { Page } from 'playwright-core';
import type { Visitor } from './visitor';

type Walk = (page: Page, visitor: Visitor) => Promise<void>;

/** Steps of a walk stand on one another: after one that failed the rest only say so. */
const stuck = new WeakSet<Visitor>();

/** Whatever is done there, the page neither complains nor scrolls sideways. */
export function withPage(visitorOf: () => Visitor, walk: Walk): () => Promise<void> {
  return async () => {
    const visitor = visitorOf();
    const { page } = visitor;
    if (stuck.has(visitor)) throw new Error('A step before this one failed.');
    try {
      await walk(page, visitor);
      expect(visitor.complaints).toEqual([]);
      expect(await visitor.sidewaysPixels()).toBe(0);
    } catch (error) {
      stuck.add(visitor);
      throw new Error(`${messageOf(error)}\n\nat ${page.url()}\n${await pageInWords(page)}`);
    }
  };
}

const messageOf = (error: unknown): string =>
  error instanceof Error ? (error.stack ?? error.message) : String(error);

async function pageInWords(page: Page): Promise<string> {
  const dialog = page.getByRole('dialog');
  const shown = (await dialog.count()) > 0 ? dialog.last() : page.locator('main');
  const words = await shown.ariaSnapshot({ timeout: 2_000 }).catch(() => 'The page could not be read.');
  return words.slice(0, 5_000);
}
