// Step 7: two people, one on a phone and one at a desk, talk about one residue.
import type { Locator, Page } from 'playwright-core';
import { modelOrganism } from '@/shared/scenario/organisms.data';
import { addressOf, enterDemo } from './support/demo';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import { button, eventually, gone, locate, see, words } from './support/walk';

let stage: FlowStage;
let teo: Visitor;
let ysolde: Visitor;
beforeAll(async () => {
  stage = await openFlowStage({ demo: true });
  [teo, ysolde] = await Promise.all([
    Visitor.at(stage.browser, stage.server.origin, phone),
    Visitor.at(stage.browser, stage.server.origin, wide),
  ]);
});
afterAll(() => stage?.close());

const address = addressOf('c', 'carboxylate');
const log = ({ page }: Visitor): Locator => page.getByRole('log', { name: 'Messages' });
const composer = (page: Page): Locator => page.getByRole('textbox', { name: /^Message about / });
const said = (visitor: Visitor, text: string): Locator =>
  log(visitor).getByRole('article').locator('p', { hasText: text });

async function write({ page }: Visitor, text: string): Promise<void> {
  await composer(page).fill(text);
  await button(page, /^Send/).click();
  await gone(composer(page).filter({ hasText: text }));
}

/** Who said what, oldest first; the same for everybody who reads it. */
async function minutes(visitor: Visitor, own: string): Promise<string[]> {
  const lines = await log(visitor).getByRole('article').locator('p').allInnerTexts();
  return lines.map((line) => words(line).replace(/^You contributor$/, `${own} contributor`));
}

/** Both show the same list; gives it. */
async function sameMinutes(): Promise<string[]> {
  let one: string[] = [];
  let other: string[] = [];
  await eventually(async () => {
    one = await minutes(teo, 'Teo Marrick');
    other = await minutes(ysolde, 'Ysolde Brant');
    expect(one).toEqual(other);
  });
  return one;
}

test('both open the thread of the same residue, and see one another there', async () => {
  await enterDemo(teo, 'Teo Marrick');
  await locate(teo, address, new RegExp(modelOrganism));
  await button(teo.page, 'Reply').click();
  await see(composer(teo.page));
  await enterDemo(ysolde, 'Ysolde Brant');
  await locate(ysolde, address, new RegExp(modelOrganism));
  await see(composer(ysolde.page));
  await see(ysolde.page.getByText('2 here'), ysolde.page.getByRole('img', { name: 'Teo Marrick, here' }));
  // The last words of the demo's thread.
  await see(said(teo, 'The three pairs fit one row.'), said(ysolde, 'The three pairs fit one row.'));
  await sameMinutes();
});

test('a message stands at the other’s without a reload, and writing shows before it', async () => {
  await composer(ysolde.page).pressSequentially('First');
  await see(teo.page.getByText('Ysolde Brant is writing'));
  await write(ysolde, 'First from the desk, about cE64.');
  await see(said(teo, 'First from the desk'));
  await composer(teo.page).pressSequentially('And');
  await see(ysolde.page.getByText('Teo Marrick is writing'));
  await write(teo, 'And **one** from the train.');
  await see(said(ysolde, 'And one from the train.').locator('strong', { hasText: 'one' }));
});

test('written without a line it waits in sight, and comes to all once, in one order', async () => {
  await teo.context.setOffline(true);
  await see(teo.page.getByText(/No connection since/));
  await write(teo, 'Second from the train, in the tunnel.');
  await write(teo, 'Third from the train, in the tunnel.');
  const waiting = log(teo).getByText('waiting, sent once you are online');
  expect(await waiting.count()).toBe(2);
  await see(button(teo.page, 'Send later'));
  await write(ysolde, 'Second from the desk, meanwhile.');
  await see(said(ysolde, 'Second from the desk'));
  expect(await said(ysolde, 'in the tunnel').count()).toBe(0);
  expect(await said(teo, 'meanwhile').count()).toBe(0);

  await teo.context.setOffline(false);
  await see(teo.page.getByText('Connected again.'));
  await gone(waiting);
  await see(
    said(teo, 'meanwhile'),
    said(ysolde, 'Second from the train'),
    said(ysolde, 'Third from the train'),
  );
  const own = (await sameMinutes())
    .filter((line) => / from the (desk|train)/.test(line))
    .map((line) => line.slice(0, 22));
  expect(own).toEqual([
    'First from the desk, a',
    'And one from the train',
    'Second from the desk, ',
    'Second from the train,',
    'Third from the train, ',
  ]);
});

test('what is stored is the same list: a reload of both changes nothing', async () => {
  const before = await sameMinutes();
  await Promise.all([teo.page.reload(), ysolde.page.reload()]);
  await see(said(teo, 'Third from the train'), said(ysolde, 'Third from the train'));
  await eventually(async () => expect(await sameMinutes()).toEqual(before));
  expect([...teo.complaints, ...ysolde.complaints]).toEqual([]);
});

test('who leaves is no longer shown as here', async () => {
  await teo.page.close();
  await see(ysolde.page.getByText('1 here'));
  await gone(ysolde.page.getByRole('img', { name: 'Teo Marrick, here' }));
});
