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

async function takePicture({ page, size }: Visitor, name: string, theme: Theme): Promise<void> {
  if (!takesPictures) return;
  await page.screenshot({ path: path.join(pictures, `${name}-${size.name}-${theme}.png`) });
}

/** Goes through all screens in one look, and gives what is wrong with each. */
async function lookAtAll(size: Size, theme: Theme): Promise<Record<string, string[]>> {
  const visitor = await Visitor.at(stage.browser, stage.server.origin, size, theme);
  const found: Record<string, string[]> = {};
  const look = async (name: string, more: string[] = []) => {
    const faults = [...more, ...(await faultsOf(visitor))];
    if (faults.length > 0) found[name] = faults;
    await takePicture(visitor, name, theme);
  };
  for (const screen of screens.filter(({ isOutside }) => isOutside)) {
    await arrive(visitor, screen);
    await look(screen.name);
  }
  await enterDemo(visitor, 'Anouk Verrin');
  for (const screen of screens.filter(({ isOutside }) => !isOutside)) {
    await arrive(visitor, screen);
    const isOnce = size === phone && theme === 'light';
    await look(screen.name, isOnce ? await sidewaysBetween(visitor, screen) : []);
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

test.each(['light', 'dark'] as const)(
  'in the %s theme no screen has a fault, on a phone or wide',
  async (theme) => {
    const [onPhone, onWide] = await Promise.all([lookAtAll(phone, theme), lookAtAll(wide, theme)]);
    expect(onPhone).toEqual({});
    expect(onWide).toEqual({});
  },
);
