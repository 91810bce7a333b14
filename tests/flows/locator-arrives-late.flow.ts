// The locator's list is fetched after the page: what is typed meanwhile is kept, with the caret and an Enter pressed.
import type { Locator, Page } from 'playwright-core';
import { addressOf, enterDemo } from './support/demo';
import { openFlowStage, type FlowStage } from './support/stage';
import { Visitor, wide } from './support/visitor';
import { see } from './support/walk';

let stage: FlowStage;
let visitor: Visitor;
beforeAll(async () => {
  stage = await openFlowStage({ demo: true });
  visitor = await Visitor.at(stage.browser, stage.server.origin, wide);
  await enterDemo(visitor, 'Sana Corrow');
});
afterAll(() => stage?.close());
afterEach(() => visitor.page.unrouteAll({ behavior: 'ignoreErrors' }));

const code = /\/locator-parts-[0-9a-f]+\.js$/;
const address = addressOf('c', 'carboxylate');
const entry = (page: Page): Locator => page.getByRole('search').getByLabel('Find a residue');
const list = (page: Page): Locator => page.getByRole('search').getByRole('combobox');
const caretOf = (input: Locator): Promise<number | null> =>
  input.evaluate((element) =>
    element === document.activeElement ? (element as HTMLInputElement).selectionStart : null,
  );

/** Opens the page anew with the list's code held back; the promise's function lets it go. */
async function openHeldBack(page: Page): Promise<() => void> {
  let letGo = () => {};
  const held = new Promise<void>((done) => (letGo = done));
  await page.route(code, async (route) => {
    await held;
    await route.continue();
  });
  await page.reload();
  await see(entry(page));
  expect(await list(page).count()).toBe(0);
  return letGo;
}

test('text, focus and caret pass to the list when it comes, and the list is open', async () => {
  const { page } = visitor;
  const letGo = await openHeldBack(page);
  await entry(page).click();
  await page.keyboard.type(address);
  await page.keyboard.press('ArrowLeft');
  letGo();
  await see(list(page), page.getByRole('option').first());
  expect(await list(page).inputValue()).toBe(address);
  expect(await caretOf(list(page))).toBe(address.length - 1);
  expect(visitor.complaints).toEqual([]);
});

test('Enter pressed before the list is there counts', async () => {
  const { page } = visitor;
  const letGo = await openHeldBack(page);
  await entry(page).click();
  await page.keyboard.type(address);
  await page.keyboard.press('Enter');
  letGo();
  await see(page.getByText('Choose one with the arrow keys or a press.'));
});

test('code that could not be fetched is asked for again', async () => {
  const { page } = visitor;
  let refused = 0;
  await page.route(code, (route) => {
    refused += 1;
    return refused === 1 ? route.abort() : route.continue();
  });
  await page.reload();
  await entry(page).fill(address);
  await see(list(page), page.getByRole('option').first());
  expect(refused).toBe(2);
  expect(await list(page).inputValue()).toBe(address);
});
