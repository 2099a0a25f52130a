/** The whole main job by touch on a phone: from signing up to the marks on a pole, and again from another device. */
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PHONE, startProduct, type Product } from '../helpers/product';
import { readPdf, strokesOf } from '../helpers/pdf';
import { Phone } from './phone';

const PERSON = { name: 'Marta Quill', email: 'marta@kilnyard.example', password: 'spirit-level-9' };

/**
 * The marks of pole B, worked by hand. Readings 48, 48 3/8, 48 1/4 and 48 1/8 in at A, B, C and D: A is the high point.
 * First mark: 3/8 in least bedding + 3 5/8 in unit = 4 in above A, so 48 − 4 = 44 in below the line, at every pole.
 * Sill, head and beam stand at whole gauges of 4 in, so course n is 4n in above A and 4n − 48 in from the line. At B the
 * foundation lies 3/8 in lower than at A: 4n + 3/8 in above it. The door's head of 84 in is course 21, the beam's soffit
 * of 96 in is course 24, its top 8 in more.
 */
const MARKS_OF_B: readonly (readonly [string, string, string])[] = [
  ['beam top', 'up fifty-six inches', 'one hundred and four and three eighths inches'],
  ['Course 24, beam soffit', 'up forty-eight inches', 'ninety-six and three eighths inches'],
  ['Course 21, head', 'up thirty-six inches', 'eighty-four and three eighths inches'],
  ['Course 13', 'up four inches', 'fifty-two and three eighths inches'],
  ['Course 12', 'on the line', 'forty-eight and three eighths inches'],
  ['Course 11', 'down four inches', 'forty-four and three eighths inches'],
  ['Course 1', 'down forty-four inches', 'four and three eighths inches'],
];

describe('the main job on a phone', () => {
  let product: Product;
  let second: Phone;
  const errors: string[] = [];

  async function openPhone(): Promise<{ page: Page; phone: Phone }> {
    const context = await product.open(PHONE, { isMobile: true });
    context.setDefaultTimeout(15_000);
    const page = await context.newPage();
    page.on('pageerror', (error) => errors.push(error.message));
    page.on('console', (message) => message.type() === 'error' && errors.push(message.text()));
    return { page, phone: new Phone(page) };
  }

  beforeAll(async () => {
    product = await startProduct();
  });
  afterAll(() => product.close());

  it('goes from signing up to the marks of one pole', { timeout: 180_000 }, async () => {
    const { page, phone } = await openPhone();
    await page.goto('/');
    await page.getByRole('link', { name: 'Make an account' }).tap();
    await phone.fill('Your name', PERSON.name);
    await phone.fill('E-mail', PERSON.email);
    await phone.fill('Password', PERSON.password);
    await phone.tap('Make the account');
    await phone.tap('New site');
    await phone.fill('Name of the site', 'Kiln yard');
    await phone.tap('Start the site');

    // Four walls by five taps, a door in the first, then the two lengths set exactly.
    await phone.tap('Draw');
    await phone.tap('Wall run');
    for (const [x, y] of [
      [80, 420],
      [310, 420],
      [310, 267],
      [80, 267],
      [80, 420],
    ] as const) {
      await phone.tapAt(x, y);
      await page.waitForTimeout(150);
    }
    await phone.button('Wall D–A').waitFor({ state: 'attached' });
    await phone.tap('Door');
    await phone.tapAt(150, 420);
    await phone.button('Door in A–B').waitFor({ state: 'attached' });
    await phone.setLengthOf('Wall A–B', '24', "'");
    await phone.setLengthOf('Wall B–C', '16', "'");
    await phone.tap('Done');
    await phone.seeText('Draft, no revision yet · saved');

    await phone.goTo('Levels');
    for (const reading of [['48'], ['48', '3/8'], ['48', '1/4'], ['48', '1/8']]) {
      await phone.type(...reading);
      await phone.tap(/^Set/);
    }
    await phone.seeText('4 of 4 stations read');

    await phone.goTo('Plan');
    await phone.select('Corner B');
    await phone.tap('Marks');
    for (const [what, fromLine, above] of MARKS_OF_B) {
      const row = page.getByRole('button', { name: new RegExp(`^${what}:`) });
      expect(await row.getAttribute('aria-label')).toBe(`${what}: ${fromLine}, ${above} above the foundation here`);
    }
    expect(await page.getByRole('button', { name: /^Course \d+/ }).count()).toBe(24);

    await phone.goTo('More');
    await phone.tap(/^Revisions/);
    await phone.tap('Save revision 1');
    await page.getByRole('dialog').getByRole('textbox').fill('First drawing');
    await page.getByRole('dialog').getByRole('button', { name: 'Save revision 1' }).tap();
    await phone.seeText('First drawing');
  });

  it(
    'goes on from another device: the revision is there, a door changes, the two are compared',
    { timeout: 180_000 },
    async () => {
      const { page, phone } = await openPhone();
      second = phone;
      await page.goto('/');
      await phone.fill('E-mail', PERSON.email);
      await phone.fill('Password', PERSON.password);
      await phone.tap('Sign in');
      await page.getByText('Kiln yard').first().tap();
      await phone.seeText('Draft after revision 1 · saved');

      await phone.tap('Draw');
      await phone.select('Door in A–B');
      await phone.setField('Head', '80');
      await phone.tap('Done');
      await phone.seeText('Draft after revision 1 · saved');
      await phone.goTo('More');
      await phone.tap(/^Revisions/);
      await phone.seeText('First drawing');
      await phone.tap('Save revision 2');
      await page.getByRole('dialog').getByRole('textbox').fill('Door one course lower');
      await page.getByRole('dialog').getByRole('button', { name: 'Save revision 2' }).tap();
      await phone.seeText('Door one course lower');

      await page.goto(`${page.url()}/compare?before=1&after=2`);
      await phone.seeText('What changed');
      await phone.seeText('Door in A–B');
      // 84 in was 7 ft; 80 in is 6 ft 8 in.
      await phone.seeText('head at 6\' 8", was 7\' 0"');
      await phone.seeText('Poles to mark again');
    },
  );

  it('takes the sheets, with a wall’s length on them true to scale', { timeout: 120_000 }, async () => {
    const { page } = second;
    await page.goBack();
    await second.goTo('More');
    // The link opens the browser's own reader, which a browser without a window lacks: the file is fetched by its address.
    const href = await page.getByRole('link', { name: 'Open Revision 2 as PDF' }).getAttribute('href');
    const answer = await page.request.get(href ?? '');
    expect(answer.headers()['content-type']).toBe('application/pdf');
    const pdf = readPdf(await answer.body());
    // One plan, four walls, four pole cards: some walls may share a sheet.
    expect(pdf.pages.length).toBeGreaterThanOrEqual(6);
    const [plan] = pdf.pages;
    if (plan === undefined) throw new Error('the file has no page');
    // The sheet says 3/16 in to the foot: C–D's 24 ft are 4 1/2 in of paper, 114.3 mm, and D–A's 16 ft are 3 in, 76.2 mm.
    const millimetres = strokesOf(plan).flatMap(({ points }) =>
      points.slice(1).map((point, i) => (Math.hypot(point.x - points[i]!.x, point.y - points[i]!.y) * 25.4) / 72),
    );
    const isDrawn = (length: number) => millimetres.some((each) => Math.abs(each - length) <= 0.1);
    expect([114.3, 76.2].map(isDrawn)).toEqual([true, true]);
    // An inch more on the building would be 0.4 mm more here: the check can tell.
    expect(isDrawn(114.3 + 25.4 / 64)).toBe(false);
  });

  it('says nothing to the console on the way', () => {
    expect(errors).toEqual([]);
  });
});
