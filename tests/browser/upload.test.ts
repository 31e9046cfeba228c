import { readdirSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { axeViolations, fixtureId, launch, openPage, signIn } from '../helpers/browser.ts';

let browser: Browser;

beforeAll(async () => {
  browser = await launch();
});

afterAll(() => browser.close());

const messy = readdirSync('datasets').find((name) => name.startsWith('messy-')) ?? '';

it('takes an engineer from a messy file to the new verdict', async () => {
  const { page, problems } = await openPage(browser);
  await signIn(page, 'engineer');
  const id = await fixtureId(page, 'CC-3');
  await page.goto(`/fixtures/${id}/boundary`);
  await page.getByRole('heading', { name: 'Boundary', level: 1 }).waitFor();
  await page.getByText('not shown').first().waitFor();
  expect(await page.getByText('slips early').count()).toBe(0);

  await page.goto(`/fixtures/${id}/trials/upload`);
  await page.getByLabel('Trial log').setInputFiles(`datasets/${messy}`);
  const store = page.getByRole('button', { name: 'Store 70 trials' });
  await store.waitFor();
  const main = page.getByRole('main');
  expect(await main.innerText()).toContain('9');
  // Refused rows say which row, what was there and what to do.
  await page
    .getByText(/refused/i)
    .first()
    .waitFor();
  expect(await axeViolations(page)).toEqual([]);
  await store.click();
  await page.getByText(/75 mm turned from not shown to slips early/).waitFor();

  await page.goto(`/fixtures/${id}/boundary`);
  await page.getByText('slips early').first().waitFor();
  expect(await main.innerText()).toMatch(/75 mm slips early/);

  // The same file again is recognised and stores nothing.
  await page.goto(`/fixtures/${id}/trials/upload`);
  await page.getByLabel('Trial log').setInputFiles(`datasets/${messy}`);
  await page
    .getByText(/already/i)
    .first()
    .waitFor();
  expect(problems).toEqual([]);
  await page.context().close();
});
