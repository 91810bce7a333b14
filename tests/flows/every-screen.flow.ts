// Each screen of the walk on the demo: both widths, both themes, and the widths between.
import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { enterDemo } from './support/demo';
import { demoScreens, type Screen } from './support/demo-screens';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide, type Size, type Theme } from './support/visitor';
import { button, gone, see } from './support/walk';

/** Set to take one picture of each screen for the pages about the product. */
const takesPictures = process.env.PICTURES === '1';
const pictures = path.join(__dirname, '../../docs/pictures');
const widthsBetween = [360, 430, 768, 1000];

let stage: FlowStage;
let screens: Screen[];
beforeAll(async () => {
  stage = await openFlowStage({ demo: true });
  screens = await demoScreens(stage.server.origin);
  if (takesPictures) await mkdir(pictures, { recursive: true });
});
afterAll(() => stage?.close());

/** Waits until nothing is being read any more. */
async function arrive(
  visitor: Visitor,
  { path: address, says }: Pick<Screen, 'path' | 'says'>,
): Promise<void> {
  await visitor.go(address);
  await see(visitor.page.getByText(says));
  await gone(visitor.page.getByRole('status').filter({ hasText: /^(Reading|Opening)/ }));
}

/** What is wrong with the page as it stands. */
async function faultsOf(visitor: Visitor): Promise<string[]> {
  const faults = await visitor.violations();
  const sideways = await visitor.sidewaysPixels();
  if (sideways > 0) faults.push(`scrolls sideways by ${sideways} pixels`);
  return [...faults, ...visitor.complaints.splice(0)];
}

/** A theme is one attribute of the document: the page in front changes it without being read again. */
async function show(visitor: Visitor, theme: Theme): Promise<void> {
  await visitor.page.evaluate((chosen) => (document.documentElement.dataset.theme = chosen), theme);
}

/** Goes through all screens at one size, in both themes, and gives what is wrong with each. */
async function lookAtAll(size: Size): Promise<Record<string, string[]>> {
  const visitor = await Visitor.at(stage.browser, stage.server.origin, size, 'light');
  const found: Record<string, string[]> = {};
  const note = (what: string, faults: string[]) => {
    if (faults.length > 0) found[what] = faults;
  };
  const look = async (name: string) => {
    for (const theme of ['light', 'dark'] as const) {
      await show(visitor, theme);
      note(`${name}, ${theme}`, await faultsOf(visitor));
      const file = path.join(pictures, `${name}-${size.name}-${theme}.png`);
      if (takesPictures) await visitor.page.screenshot({ path: file });
    }
    await show(visitor, 'light');
  };
  for (const screen of screens.filter(({ isOutside }) => isOutside)) {
    await arrive(visitor, screen);
    await look(screen.name);
  }
  await enterDemo(visitor, 'Anouk Verrin');
  for (const screen of screens.filter(({ isOutside }) => !isOutside)) {
    await arrive(visitor, screen);
    await look(screen.name);
    if (size === phone) note(`${screen.name}, other widths`, await sidewaysBetween(visitor, screen));
    if (screen.name === 'residue') {
      await visitor.page.keyboard.press('p');
      await see(button(visitor.page.getByRole('dialog', { name: 'Pin here' }), 'Add evidence'));
      await look('pin');
    }
  }
  await visitor.close();
  return found;
}

/** Whether the page scrolls sideways at other widths than the two that are looked at whole. */
async function sidewaysBetween(visitor: Visitor, { says }: Screen): Promise<string[]> {
  const found: string[] = [];
  for (const width of widthsBetween) {
    await visitor.page.setViewportSize({ width, height: phone.height });
    await see(visitor.page.getByText(says));
    const sideways = await visitor.sidewaysPixels();
    if (sideways > 0) found.push(`scrolls sideways by ${sideways} pixels at ${width}`);
  }
  await visitor.page.setViewportSize(phone);
  await see(visitor.page.getByText(says));
  return found;
}

test('no screen has a fault, on a phone or wide, light or dark', async () => {
  const [onPhone, onWide] = await Promise.all([lookAtAll(phone), lookAtAll(wide)]);
  expect(onPhone).toEqual({});
  expect(onWide).toEqual({});
});

test.each(['light', 'dark'] as const)(
  'the %s theme that was chosen is there from the first paint',
  async (theme) => {
    const visitor = await Visitor.at(stage.browser, stage.server.origin, phone, theme);
    await visitor.go('/sign-in');
    expect(await visitor.page.evaluate(() => document.documentElement.dataset.theme)).toBe(theme);
    await visitor.close();
  },
);
