/** Two people at one drawing, and what each role is offered, on the real product. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../db/demo/people';
import { PHONE, startProduct, type Product } from '../helpers/product';
import { Phone } from './phone';

describe('a site that people share', () => {
  let product: Product;

  async function openAs(id: (typeof DEMO_PEOPLE)[number]['id']): Promise<Phone> {
    const context = await product.open(PHONE, { isMobile: true });
    context.setDefaultTimeout(15_000);
    const phone = new Phone(await context.newPage());
    await phone.page.goto('/sign-in');
    await phone.fill('E-mail', DEMO_PEOPLE.find((person) => person.id === id)!.email);
    await phone.fill('Password', DEMO_PASSWORD);
    await phone.tap('Sign in');
    await phone.page.getByText('Cedar Bend tool store').first().tap();
    await phone.seeText('Draft after revision 3 · saved');
    return phone;
  }

  async function savedReadings(): Promise<number[]> {
    const { rows } = await product.database.pool.query<{ survey: { readings: { down: number }[] } }>(
      "select survey from drafts join sites on sites.id = drafts.site_id where sites.name = 'Cedar Bend tool store'",
    );
    return rows.flatMap((row) => row.survey.readings.map((reading) => reading.down));
  }

  beforeAll(async () => {
    product = await startProduct({ demo: true });
  });
  afterAll(() => product.close());

  it('keeps both versions when two save at once, and goes on with the chosen one', { timeout: 120_000 }, async () => {
    const [lead, designer] = [await openAs('demo-lead'), await openAs('demo-designer')];
    for (const phone of [lead, designer]) {
      await phone.tap('Draw');
      await phone.select('Door in A–B');
    }
    await lead.setField('Head', '80');
    await lead.seeText('Draft after revision 3 · saved');
    await designer.setField('Width, masonry', '42');
    await designer.seeText('Two people changed the drawing');
    await designer.seeText(/Ines Halloran saved/);
    await designer.tap('Go on with theirs');
    await designer.page.getByRole('dialog').waitFor({ state: 'detached' });
    await designer.tap('Details');
    // Theirs has the lowered head and the width of before.
    const fields = designer.page.getByRole('dialog').last();
    await fields.getByRole('button', { name: /^Head.*(80|eighty inches)/ }).waitFor();
    await fields.getByRole('button', { name: /^Width, masonry.*(36|thirty-six)/ }).waitFor();
    await designer.tap('Close');
    await designer.tap('Done');
    await designer.goTo('More');
    await designer.tap(/^Revisions/);
    await designer.seeText('Drawing by Tobias Renwick');
  });

  it('lets a mason enter levels and not draw', { timeout: 60_000 }, async () => {
    const mason = await openAs('demo-mason');
    expect(await mason.page.getByRole('button', { name: 'Draw' }).count()).toBe(0);
    expect(await savedReadings()).not.toContain(800_608);
    await mason.goTo('Levels');
    await mason.type('49', '1/4');
    await mason.tap(/^Set/);
    // 49 1/4 in is 800 608 ticks.
    await expect.poll(savedReadings, { timeout: 10_000 }).toContain(800_608);
  });

  it('shows an observer everything and offers no change', { timeout: 60_000 }, async () => {
    const observer = await openAs('demo-observer');
    expect(await observer.page.getByRole('button', { name: 'Draw' }).count()).toBe(0);
    await observer.goTo('Levels');
    await observer.seeText('Your role reads the levels; a mason, designer or lead enters them.');
    await observer.goTo('Poles');
    await observer.page.getByRole('button', { name: /^Course 1:/ }).waitFor();
  });
});
