/** A person's hand on a phone: what is tapped by name, and the tape keypad. */
import type { Locator, Page } from 'playwright-core';

const KEY_NAMES: Readonly<Record<string, string>> = {
  "'": 'feet',
  '1/8': 'one eighth',
  '1/4': 'one quarter',
  '3/8': '3 eighths',
  '1/2': 'one half',
  '5/8': '5 eighths',
  '3/4': 'three quarters',
  '7/8': '7 eighths',
};

export class Phone {
  constructor(readonly page: Page) {}

  button(name: string | RegExp): Locator {
    return this.page.getByRole('button', { name, exact: typeof name === 'string' }).last();
  }

  /** Fills a field of the screen on top: a screen gone on from stays below it. */
  async fill(label: string, text: string): Promise<void> {
    await this.page.getByLabel(label, { exact: true }).last().fill(text);
  }

  async tap(name: string | RegExp): Promise<void> {
    await this.button(name).tap();
  }

  async tapAt(x: number, y: number): Promise<void> {
    await this.page.touchscreen.tap(x, y);
  }

  /** Types a length on the tape keypad: `type('24', "'")`, `type('48', '3/8')`. */
  async type(...parts: string[]): Promise<void> {
    for (const part of parts) {
      const named = KEY_NAMES[part];
      for (const key of named === undefined ? [...part] : [named]) await this.tap(key);
    }
  }

  /** Picks a part of the plan by its name in the list beside the drawing. */
  async select(name: string): Promise<void> {
    await this.button(name).dispatchEvent('click');
  }

  /** Selects a wall and sets its length on the keypad. */
  async setLengthOf(wall: string, ...parts: string[]): Promise<void> {
    await this.select(wall);
    await this.tap(/feet|inch/);
    await this.type(...parts);
    await this.tap('Set');
  }

  /** Opens the sizes of what is selected and sets one of them. */
  async setField(name: string, ...parts: string[]): Promise<void> {
    await this.tap('Details');
    const dialog = this.page.getByRole('dialog').last();
    await dialog.getByRole('button', { name: new RegExp(`^${name}`) }).tap();
    await this.type(...parts);
    await this.tap('Set');
    await this.tap('Close');
  }

  /** Goes to a screen of the site by the bar at the bottom. */
  async goTo(name: string): Promise<void> {
    await this.page.getByRole('navigation').getByText(name, { exact: true }).tap();
  }

  async seeText(text: string | RegExp): Promise<void> {
    await this.page.getByText(text).first().waitFor();
  }
}
