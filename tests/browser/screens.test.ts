import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeViolations, fixtureId, launch, openPage, signIn } from '../helpers/browser.ts';

let browser: Browser;

beforeAll(async () => {
  browser = await launch();
});

afterAll(() => browser.close());

const screens = (id: number) => ({
  overview: '/',
  fixtures: '/fixtures',
  'new fixture': '/fixtures/new',
  'edit fixture': `/fixtures/${id}/edit`,
  summary: `/fixtures/${id}`,
  'build-up': `/fixtures/${id}/build-up`,
  grip: `/fixtures/${id}/grip`,
  trials: `/fixtures/${id}/trials`,
  upload: `/fixtures/${id}/trials/upload`,
  boundary: `/fixtures/${id}/boundary`,
  history: `/fixtures/${id}/history`,
  'unknown address': '/nowhere',
  'unknown fixture': '/fixtures/999999',
});

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [1440, 390]) {
    describe(`in ${colorScheme}, ${width} wide`, () => {
      it('every screen passes axe, fits the width and draws without errors', async () => {
        const { page, problems } = await openPage(browser, {
          colorScheme,
          viewport: { width, height: 900 },
        });
        await page.goto('/sign-in');
        await page.getByLabel('E-mail').waitFor();
        const faults = (await axeViolations(page)).map((fault) => `sign-in: ${fault}`);
        await signIn(page, 'analyst');
        const id = await fixtureId(page, 'TT-2');
        for (const [name, address] of Object.entries(screens(id))) {
          await page.goto(address);
          await page.waitForLoadState('networkidle');
          await page.getByText(/^Loading…$/).waitFor({ state: 'detached' });
          faults.push(...(await axeViolations(page)).map((fault) => `${name}: ${fault}`));
          const sideways = await page.evaluate(
            'document.documentElement.scrollWidth > document.documentElement.clientWidth',
          );
          if (sideways === true) faults.push(`${name}: scrolls sideways`);
        }
        expect(faults).toEqual([]);
        // The unknown fixture's 404 is the only failed call.
        expect(problems.filter((text) => !text.includes('404'))).toEqual([]);
        await page.context().close();
      });
    });
  }
}
