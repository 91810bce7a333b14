// Somebody who has only a keyboard.
import type { Locator, Page } from 'playwright-core';

/** More presses of Tab than any page of the walk needs. */
const mostStops = 150;

export class Keys {
  /** The file that the next chooser is answered with. */
  private file: string | null = null;

  constructor(private readonly page: Page) {
    // Listened to from the start: a chooser that opens at once would go unseen.
    page.on('filechooser', (chooser) => void (this.file !== null && chooser.setFiles(this.file)));
  }

  press(key: string): Promise<void> {
    return this.page.keyboard.press(key);
  }

  write(text: string): Promise<void> {
    return this.page.keyboard.type(text);
  }

  /** What the clipboard would put in. */
  paste(text: string): Promise<void> {
    return this.page.keyboard.insertText(text);
  }

  /** Walks with Tab until the focus is there; it must be in sight, with a ring around it. */
  async to(target: Locator): Promise<void> {
    await target.first().waitFor({ state: 'visible' });
    for (let stop = 0; stop < mostStops; stop += 1) {
      if (await this.isOn(target)) return;
      await this.press('Tab');
    }
    throw new Error(`Tab never reached ${String(target)}.`);
  }

  /** Walks there and presses Enter. */
  async enter(target: Locator): Promise<void> {
    await this.to(target);
    await this.press('Enter');
  }

  /** Walks to a field and writes anew what stands in it. */
  async fill(field: Locator, text: string): Promise<void> {
    await this.to(field);
    await this.press('ControlOrMeta+a');
    await this.paste(text);
  }

  /** Walks to a select and down its options until one says this. */
  async choose(select: Locator, says: RegExp): Promise<void> {
    await this.to(select);
    await select.locator('option', { hasText: says }).waitFor({ state: 'attached' });
    const options = await select.locator('option').count();
    for (let step = 0; step <= options; step += 1) {
      if (says.test(await select.evaluate((one: HTMLSelectElement) => one.selectedOptions[0]?.label ?? '')))
        return;
      await this.press(step === 0 ? 'Home' : 'ArrowDown');
    }
    throw new Error(`No option of ${String(select)} says ${String(says)}.`);
  }

  /** Walks to a button that opens the file chooser, presses it and chooses. */
  async chooseFile(target: Locator, file: string): Promise<void> {
    this.file = file;
    await this.enter(target);
  }

  private isOn(target: Locator): Promise<boolean> {
    return target.first().evaluate((one) => one === document.activeElement);
  }
}
