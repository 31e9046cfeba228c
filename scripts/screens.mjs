/**
 * Pictures of every screen for people to look at: `npm run screens` while the product runs
 * (PORT, default 4173). Light and dark, 1440 and 390 wide, into .cache/screens; `-- --readme`
 * also renews the README's picture of the Boundary screen.
 */
import { copyFileSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { chromium } from 'playwright-core';

process.chdir(path.resolve(import.meta.dirname, '..'));
const base = `http://127.0.0.1:${process.env.PORT ?? '4173'}`;
const folder = '.cache/screens';
const only = process.argv.slice(2).filter((word) => !word.startsWith('--'));

const screens = {
  overview: '/',
  fixtures: '/fixtures',
  'fixture-new': '/fixtures/new',
  summary: '/fixtures/1',
  'build-up': '/fixtures/1/build-up',
  grip: '/fixtures/1/grip',
  trials: '/fixtures/1/trials',
  upload: '/fixtures/1/trials/upload',
  boundary: '/fixtures/1/boundary',
  'boundary-position': '/fixtures/1/boundary?against=position',
  history: '/fixtures/1/history',
  'not-found': '/nowhere',
};

const root = process.getuid?.() === 0;
const browser = await chromium.launch({
  executablePath: '/usr/bin/chromium',
  args: [...(root ? ['--no-sandbox'] : []), '--disable-gpu', '--disable-background-networking'],
});
mkdirSync(folder, { recursive: true });
for (const colorScheme of ['light', 'dark']) {
  for (const width of [1440, 390]) {
    const page = await browser.newPage({ viewport: { width, height: 900 }, colorScheme });
    const problems = [];
    page.on('console', (message) => {
      if (message.type() === 'error') problems.push(message.text());
    });
    page.on('pageerror', (error) => problems.push(String(error)));
    await page.goto(`${base}/sign-in`);
    if (only.length === 0) await shoot(page, 'sign-in', colorScheme, width);
    await page.getByLabel('E-mail').fill('analyst@tautline.example');
    await page.getByLabel('Password').fill('hold-below-the-line');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL((url) => url.pathname !== '/sign-in');
    for (const [name, address] of Object.entries(screens)) {
      if (only.length > 0 && !only.includes(name)) continue;
      await page.goto(base + address);
      await page.waitForLoadState('networkidle');
      await page.waitForTimeout(600);
      await shoot(page, name, colorScheme, width);
    }
    for (const problem of new Set(problems)) console.log(`${colorScheme} ${width}: ${problem}`);
    await page.close();
  }
}
await browser.close();
if (process.argv.includes('--readme')) {
  mkdirSync('docs', { recursive: true });
  copyFileSync(`${folder}/boundary-light-1440.png`, 'docs/boundary.png');
}

async function shoot(page, name, colorScheme, width) {
  const wide = await page.evaluate(() => document.documentElement.scrollWidth > innerWidth);
  if (wide) console.log(`${name} ${width}: the page scrolls sideways`);
  await page.screenshot({ path: `${folder}/${name}-${colorScheme}-${width}.png`, fullPage: true });
}
