/** The drawing under two fingers: they pan and pinch in every tool, and a second finger takes a stroke back. */
import type { CDPSession, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../db/demo/people';
import { PHONE, startProduct, type Product } from '../helpers/product';
import { Phone } from './phone';

interface Finger {
  readonly x: number;
  readonly y: number;
}

describe('two fingers on the drawing', () => {
  let product: Product;
  let page: Page;
  let phone: Phone;
  let cdp: CDPSession;

  async function touch(type: 'touchStart' | 'touchMove' | 'touchEnd', fingers: readonly Finger[]): Promise<void> {
    await cdp.send('Input.dispatchTouchEvent', {
      type,
      touchPoints: fingers.map((finger, id) => ({ ...finger, id })),
    });
    await page.waitForTimeout(30);
  }

  /** Screen distance between the corner letters A and B: how large the plan is drawn. */
  async function spanOfAB(): Promise<{ width: number; middle: number }> {
    const box = async (letter: string) => {
      const found = await page
        .locator('svg text', { hasText: new RegExp(`^${letter}$`) })
        .first()
        .boundingBox();
      if (found === null) throw new Error(`letter ${letter} is not drawn`);
      return found;
    };
    const [a, b] = [await box('A'), await box('B')];
    return { width: Math.hypot(b.x - a.x, b.y - a.y), middle: (a.y + b.y) / 2 };
  }

  const runs = () => page.getByRole('button', { name: /^Wall [A-Z]–[A-Z]$/ }).count();

  beforeAll(async () => {
    product = await startProduct({ demo: true });
    const context = await product.open(PHONE, { isMobile: true });
    context.setDefaultTimeout(15_000);
    page = await context.newPage();
    phone = new Phone(page);
    cdp = await context.newCDPSession(page);
    await page.goto('/sign-in');
    await phone.fill('E-mail', DEMO_PEOPLE[0].email);
    await phone.fill('Password', DEMO_PASSWORD);
    await phone.tap('Sign in');
    await page.getByText('Cedar Bend tool store').first().tap();
    await phone.tap('Draw');
    await page.locator('svg text', { hasText: /^A$/ }).first().waitFor();
  });
  afterAll(() => product.close());

  it('enlarge the plan by as much as they part', { timeout: 60_000 }, async () => {
    const before = await spanOfAB();
    await touch('touchStart', [
      { x: 170, y: 330 },
      { x: 220, y: 330 },
    ]);
    for (let i = 1; i <= 5; i += 1)
      await touch('touchMove', [
        { x: 170 - 5 * i, y: 330 },
        { x: 220 + 5 * i, y: 330 },
      ]);
    await touch('touchEnd', []);
    await page.waitForTimeout(400);
    const after = await spanOfAB();
    // 50 px apart at first and 100 px at the end: twice as large, but for where the letters found room.
    expect(after.width / before.width).toBeGreaterThan(1.6);
    expect(after.width / before.width).toBeLessThan(2.4);
    await phone.tap('Show all');
    await page.waitForTimeout(600);
  });

  it('take back a wall that one finger had begun, and leave nothing drawn', { timeout: 60_000 }, async () => {
    await phone.tap('Wall run');
    const before = await runs();
    await touch('touchStart', [{ x: 60, y: 180 }]);
    for (let i = 1; i <= 6; i += 1) await touch('touchMove', [{ x: 60 + 20 * i, y: 180 }]);
    await touch('touchStart', [
      { x: 180, y: 180 },
      { x: 250, y: 260 },
    ]);
    await touch('touchMove', [
      { x: 170, y: 190 },
      { x: 260, y: 270 },
    ]);
    await touch('touchEnd', []);
    await page.waitForTimeout(400);
    expect(await runs()).toBe(before);
    expect(await phone.button(/^Undo/).isDisabled()).toBe(true);
  });

  it('and one finger still draws: a wall from drag to drag', { timeout: 60_000 }, async () => {
    const before = await runs();
    await touch('touchStart', [{ x: 60, y: 150 }]);
    for (let i = 1; i <= 6; i += 1) await touch('touchMove', [{ x: 60 + 20 * i, y: 150 }]);
    await touch('touchEnd', []);
    await page.waitForTimeout(500);
    expect(await runs()).toBe(before + 1);
  });
});
