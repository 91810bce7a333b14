// What people do in the walk, as they do it: by names and roles.
import path from 'node:path';
import type { Locator, Page } from 'playwright-core';
import type { Visitor } from './visitor';

export const fixture = (name: string): string => path.join(__dirname, '../../fixtures', name);

/** Waits until it is there to be seen. */
export const see = (...all: Locator[]): Promise<void[]> =>
  Promise.all(all.map((one) => one.first().waitFor({ state: 'visible' })));

/** Waits until it is gone from sight. */
export const gone = (one: Locator): Promise<void> => one.first().waitFor({ state: 'hidden' });

export const button = (page: Page | Locator, name: string | RegExp): Locator =>
  page.getByRole('button', { name, exact: true });
export const link = (page: Page | Locator, name: string | RegExp): Locator =>
  page.getByRole('link', { name, exact: true });

let people = 0;

/** A new account, made in the browser. */
export async function signUp(visitor: Visitor, name: string): Promise<string> {
  const { page } = visitor;
  const email = `flow-${(people += 1)}-${Date.now()}@lab.example`;
  await visitor.go('/sign-up');
  await page.getByLabel('Your name').fill(name);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill('a long enough password');
  await button(page, 'Make the account').click();
  await see(page.getByRole('heading', { name: 'My projects' }));
  return email;
}

export async function signIn(visitor: Visitor, email: string, password: string): Promise<void> {
  const { page } = visitor;
  await visitor.go('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await button(page, 'Sign in').click();
  await see(page.getByRole('heading', { name: 'My projects' }));
}

/** A team and a project of an F-type motor, from the list of projects. Ends on the project's first page. */
export async function makeProject(page: Page, name: string): Promise<void> {
  await link(page, 'Make a project').click();
  await page.getByLabel('Name of the team').fill('Rotor group');
  await page.getByLabel('Name of the project').fill(name);
  await button(page, 'Make the project').click();
  await see(page.getByRole('heading', { name: 'Start' }));
}

export const field = (page: Page | Locator, name: string): Locator => page.getByLabel(name, { exact: true });

/** Chooses by what an option says. */
export async function choose(select: Locator, says: RegExp): Promise<void> {
  const option = select.locator('option', { hasText: says });
  await option.waitFor({ state: 'attached' });
  await select.selectOption((await option.getAttribute('value')) ?? '');
}

/** To one of the places in the rail or the bottom bar. */
export const toPlace = (page: Page, name: 'Find' | 'Threads' | 'Plan'): Promise<void> =>
  link(page.getByRole('navigation', { name: 'Places' }), name).click();

/** Presses what opens the file chooser, and chooses. */
export async function chooseFile(page: Page, press: Locator, file: string | FilePayload): Promise<void> {
  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), press.click()]);
  await chooser.setFiles(file);
}
export interface FilePayload {
  name: string;
  mimeType: string;
  buffer: Buffer;
}

/** A text as a file of that name. */
export const asFile = (name: string, text: string): FilePayload => ({
  name,
  mimeType: 'text/plain',
  buffer: Buffer.from(text),
});

/** Uploads an aligned file from the open upload form; the family is chosen when it isn't yet. */
export async function uploadAlignment(page: Page, family: string, file: string | FilePayload): Promise<void> {
  await see(page.getByRole('heading', { name: 'Upload a file' }));
  await choose(field(page, 'Family'), new RegExp(`^${family}( |$)`));
  await chooseFile(page, button(page, 'Choose a file'), file);
}

/** Types an address into the locator: the box in the bar of a wide screen, the page of its own on a phone. */
export async function writeAddress(visitor: Visitor, text: string): Promise<Locator> {
  const { page, size } = visitor;
  if (size.name === 'phone') {
    await link(page, 'Find a residue').click();
    await page.waitForURL(/\/locate/);
  }
  const scope = size.name === 'phone' ? page.getByRole('main') : page.getByRole('search');
  const box = scope.getByRole('combobox', { name: 'Find a residue' });
  await box.fill(text);
  await see(page.getByRole('status').filter({ hasText: new RegExp(`readings? of ${escaped(text)}`) }));
  return page.getByRole('listbox', { name: 'Readings' });
}

/** Opens one of the readings of an address. */
export async function locate(visitor: Visitor, text: string, reading: RegExp): Promise<void> {
  const readings = await writeAddress(visitor, text);
  await readings.getByRole('option', { name: reading }).first().click();
  await visitor.page.waitForURL(/\/residues\//);
}

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** The rows of a real table, each as its cells' text. */
export async function tableRows(table: Locator): Promise<string[][]> {
  await see(table);
  const rows = await table.locator('tbody tr').all();
  return Promise.all(
    rows.map(async (row) => (await row.locator('th, td').allInnerTexts()).map((text) => words(text))),
  );
}

/** Text with its line breaks and runs of blanks as one blank. */
export const words = (text: string): string => text.replace(/\s+/g, ' ').trim();

/** Names and values of a list of facts. */
export async function facts(list: Locator): Promise<Record<string, string>> {
  await see(list);
  const names = await list.locator('dt').allInnerTexts();
  const values = await list.locator('dd').allInnerTexts();
  expect(values).toHaveLength(names.length);
  return Object.fromEntries(names.map((name, place) => [words(name), words(values[place] ?? '')]));
}

/** By family, protein and its number in the sequence; from any page of the project. */
export async function openResidue(page: Page, organism: string, number: number, family = 'c'): Promise<void> {
  await toPlace(page, 'Find');
  await link(page.getByRole('list', { name: 'Families' }), new RegExp(`^family ${family}, `)).click();
  await link(page, organism).click();
  await field(page, 'Go to residue number, sequence numbering').fill(String(number));
  await button(page, 'Go').click();
  await page.waitForURL(/\/residues\//);
}

/** Looks again until it holds: what a screen shows comes in its own time. */
export async function eventually(check: () => Promise<void>, withinMilliseconds = 10_000): Promise<void> {
  const until = Date.now() + withinMilliseconds;
  for (;;) {
    try {
      return await check();
    } catch (error) {
      if (Date.now() > until) throw error;
      await new Promise((done) => setTimeout(done, 50));
    }
  }
}
