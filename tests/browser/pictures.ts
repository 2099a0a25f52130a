/** `npm run pictures -- FOLDER`: every screen of the demo at three sizes in both themes, to be looked at. */
import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../db/demo/people';
import { needClient } from '../../server/launch/client.mjs';
import { DESK, PHONE, startProduct, TABLET } from '../helpers/product';
import { Phone } from './phone';

const SIZES = { phone: PHONE, tablet: TABLET, desk: DESK };
const THEMES = ['light', 'sun'] as const;
const PARTS = ['plan', 'elevation', 'poles', 'levels', 'takeoff', 'revisions', 'crew', 'more'];

async function settle(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.waitForTimeout(800);
}

async function main(folder: string): Promise<void> {
  mkdirSync(folder, { recursive: true });
  await needClient();
  const product = await startProduct({ demo: true });
  try {
    for (const [size, viewport] of Object.entries(SIZES)) {
      for (const theme of THEMES) {
        const context = await product.open(viewport, { isMobile: size === 'phone', deviceScaleFactor: 2 });
        await context.addInitScript((name) => localStorage.setItem('polewright.theme', name), theme);
        const page = await context.newPage();
        const hand = new Phone(page);
        const take = async (name: string) => {
          await settle(page);
          await page.screenshot({ path: path.join(folder, `${size}-${theme}-${name}.png`) });
        };
        for (const name of ['sign-in', 'sign-up', 'forgot', 'mail']) {
          await page.goto(`/${name}`);
          await take(name);
        }
        await page.goto('/sign-in');
        await hand.fill('E-mail', DEMO_PEOPLE[0].email);
        await hand.fill('Password', DEMO_PASSWORD);
        await hand.tap('Sign in');
        await page.getByText('Cedar Bend tool store').first().waitFor();
        await take('sites');
        await page.getByText('Cedar Bend tool store').first().tap();
        await page.waitForURL(/\/sites\//);
        const site = new URL(page.url()).pathname.split('/').slice(0, 3).join('/');
        for (const part of PARTS) {
          await page.goto(`${site}/${part}`);
          await take(part);
        }
        await page.goto(`${site}/revisions/compare?before=2&after=3`);
        await take('compare');
        await page.goto(`${site}/revisions/1`);
        await take('revision');
        await page.goto(`${site}/plan`);
        await hand.tap('Draw');
        await hand.select('Door in A–B');
        await take('draw');
        await page.goto('/no-such-page');
        await take('not-found');
        await context.close();
      }
    }
  } finally {
    await product.close();
  }
}

const folder = process.argv[2];
if (folder === undefined) {
  process.stderr.write('Name the folder for the pictures: npm run pictures -- FOLDER\n');
  process.exitCode = 1;
} else await main(path.resolve(folder));
