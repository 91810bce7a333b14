// A structure on its way to a confirmed map.
import type { Locator, Page } from 'playwright-core';
import { button, chooseFile, link, see, toPlace, words } from './walk';

/** Uploads coordinates from the project's first page and goes on to their map, past every stage of the reading. */
export async function uploadStructure(page: Page, file: string): Promise<void> {
  await toPlace(page, 'Find');
  await link(page, 'Upload coordinates').click();
  await chooseFile(page, button(page, 'Choose a file'), file);
  const stages = page.getByRole('progressbar').locator('xpath=following-sibling::ol');
  await see(stages);
  expect((await stages.first().getByRole('listitem').allInnerTexts()).map(words)).toEqual([
    'upload',
    'read',
    'map',
    'confirm',
    'done',
  ]);
  // Whoever looks while it is read is led to the map; else a button leads there.
  const there = page.getByText(/protein chains? waits? for you/);
  const way = link(page, 'Confirm the map');
  await see(there.or(way));
  if (await way.isVisible()) await way.click();
  await see(there);
}

const chainsOf = (page: Page): Locator => page.getByRole('region', { name: 'Chains', exact: true });

/** Rows of the list on a phone, of the table on a wide screen: chains that are alike stand in one. */
export async function chainsShown(page: Page): Promise<string[]> {
  const chains = chainsOf(page);
  const list = chains.getByRole('list', { name: 'Chains' }).getByRole('listitem');
  const rows = list.or(chains.locator('tbody tr'));
  await see(rows);
  return (await rows.allInnerTexts()).map(words);
}

/** Opens the row of these chains: `J`, `A to I`. */
export async function openChain(page: Page, names: string): Promise<Locator> {
  await button(chainsOf(page), new RegExp(`(^| )${names}( |$)`)).click();
  await see(page.getByRole('heading', { name: `${names.includes(' ') ? 'Chains' : 'Chain'} ${names}` }));
  return page.getByRole('region', { name: 'The open chain' });
}
