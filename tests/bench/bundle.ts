/** JavaScript of the first loads, gzipped, against an empty Expo Router page exported by the same tools. */
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import type { Page } from 'playwright-core';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../db/demo/people';
import { needClient } from '../../server/launch/client.mjs';
import { startProduct, PHONE } from '../helpers/product';
import { exportEmptyApp } from './emptyApp';
import type { Figure } from './figure';

function gzipped(file: string): number {
  return gzipSync(readFileSync(file), { level: 9 }).length;
}

function allScripts(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.js'))
    .map((name) => path.join(folder, name));
}

/** Gzipped bytes of the scripts that a page asks for while `work` goes on. */
async function scriptsOf(page: Page, built: string, work: () => Promise<void>): Promise<number> {
  const asked = new Set<string>();
  page.on('request', (request) => {
    const { pathname } = new URL(request.url());
    if (pathname.endsWith('.js')) asked.add(pathname);
  });
  await work();
  await page.waitForLoadState('networkidle');
  if (asked.size === 0) throw new Error('the page asked for no script');
  return [...asked].reduce((sum, pathname) => sum + gzipped(path.join(built, pathname)), 0);
}

async function signIn(page: Page): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(DEMO_PEOPLE[0].email);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByText('Cedar Bend tool store').waitFor();
}

export async function benchBundle(): Promise<Figure[]> {
  const empty = allScripts(exportEmptyApp()).reduce((sum, file) => sum + gzipped(file), 0);
  const built = await needClient();
  const product = await startProduct({ demo: true });
  try {
    const context = await product.open(PHONE);
    const first = await context.newPage();
    const signInAndSites = await scriptsOf(first, built, () => signIn(first));
    const href = await first
      .getByRole('link', { name: /Cedar Bend tool store/ })
      .first()
      .getAttribute('href');
    if (!href) throw new Error('the sites list has no link to the demo site');
    // A fresh page, so that everything the drawing needs is asked for again.
    const second = await context.newPage();
    const drawing = await scriptsOf(second, built, async () => {
      await second.goto(href);
      await second.getByRole('button', { name: 'Draw' }).waitFor();
    });
    const kilobytes = (bytes: number) => bytes / 1000;
    return [
      { name: 'bundle: empty Expo Router page', value: kilobytes(empty), unit: 'kB', most: null },
      { name: 'bundle: sign-in and sites list', value: kilobytes(signInAndSites), unit: 'kB', most: null },
      { name: 'bundle: the drawing, all its chunks', value: kilobytes(drawing), unit: 'kB', most: null },
      { name: 'bundle: sign-in and sites list to empty', value: signInAndSites / empty, unit: '×', most: 1.35 },
      { name: 'bundle: the drawing to empty', value: drawing / empty, unit: '×', most: 2 },
    ];
  } finally {
    await product.close();
  }
}
