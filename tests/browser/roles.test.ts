import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { fixtureId, launch, openPage, productUrl, signIn } from '../helpers/browser.ts';

let browser: Browser;

beforeAll(async () => {
  browser = await launch();
});

afterAll(() => browser.close());

it('leads a visitor to sign in and then to where they wanted', async () => {
  const { page } = await openPage(browser);
  await page.goto('/fixtures?line=Line+4+assembly');
  await page.waitForURL('**/sign-in?next=*');
  // By keyboard alone: the first field has the focus.
  await page.getByLabel('E-mail').and(page.locator(':focus')).waitFor();
  await page.keyboard.type('manager@tautline.example');
  await page.keyboard.press('Tab');
  await page.keyboard.type('hold-below-the-line');
  await page.keyboard.press('Enter');
  await page.waitForURL('**/fixtures?line=Line+4+assembly');
  await page.getByRole('heading', { name: 'Fixtures', level: 1 }).waitFor();
  await page.context().close();
});

it('never leads away from this origin after signing in', async () => {
  const { page } = await openPage(browser);
  await page.goto('/sign-in?next=//evil.test/fixtures');
  await page.getByLabel('E-mail').fill('manager@tautline.example');
  await page.getByLabel('Password').fill('hold-below-the-line');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(`${productUrl()}/`);
  await page.context().close();
});

it('shows the manager what needs a decision, and nothing to edit', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'manager');
  await page.getByText(/fixtures need you/).waitFor();
  await page.getByRole('link', { name: 'TT-2' }).first().click();
  await page.getByRole('heading', { name: 'Boundary', level: 1 }).waitFor();
  await page
    .getByText(/70 mm slips early/)
    .first()
    .waitFor();
  expect(await page.getByRole('button', { name: 'Save analysis' }).count()).toBe(0);
  const id = await fixtureId(page, 'TT-2');
  await page.goto(`/fixtures/${id}`);
  await page.getByRole('heading', { name: /TT-2/, level: 1 }).waitFor();
  expect(await page.getByRole('link', { name: 'Edit' }).count()).toBe(0);
  await page.goto(`/fixtures/${id}/trials`);
  await page.getByRole('heading', { name: 'Trials', level: 1 }).waitFor();
  await page.getByRole('cell', { name: '70 mm' }).first().waitFor();
  expect(await page.getByRole('button', { name: /Exclude/ }).count()).toBe(0);
  expect(await page.getByRole('link', { name: /Upload/ }).count()).toBe(0);
  await page.context().close();
});

it('refuses a forbidden address to the manager, on the page and on the server', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'manager');
  await page.goto('/fixtures/new');
  await page.getByRole('heading', { name: 'Your roles do not allow this' }).waitFor();
  const session = (await (await page.request.get('/api/session')).json()) as { csrfToken: string };
  const answer = await page.request.post('/api/fixtures', {
    data: {},
    headers: { 'X-CSRF-Token': session.csrfToken },
  });
  expect(answer.status()).toBe(403);
  await page.context().close();
});

it('lets the analyst read the boundary, choose a position and keep the analysis', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'analyst');
  const id = await fixtureId(page, 'TT-2');
  await page.goto(`/fixtures/${id}/boundary`);
  await page.getByRole('link', { name: /20 mm/ }).first().click();
  await page.waitForURL('**position=20*');
  await page.getByRole('heading', { name: /Why 20 mm/ }).waitFor();
  await page.getByRole('button', { name: 'Save analysis' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.waitFor();
  await dialog.getByRole('textbox').first().fill('Kept by a browser test');
  await dialog.getByRole('button', { name: /Save/ }).click();
  await dialog.waitFor({ state: 'detached' });
  await page.getByText('Kept by a browser test').waitFor();
  await page.context().close();
});

it('lets the engineer exclude a trial with a reason and take it back', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'engineer');
  const id = await fixtureId(page, 'PX-1');
  await page.goto(`/fixtures/${id}/trials`);
  await page
    .getByRole('button', { name: /^Exclude/ })
    .first()
    .click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('textbox').fill('The part was not seated');
  await dialog.getByRole('button', { name: /Exclude/ }).click();
  await dialog.waitFor({ state: 'detached' });
  await page.goto(`/fixtures/${id}/history`);
  await page
    .getByText(/trial excluded/)
    .last()
    .waitFor();
  await page
    .getByText(/The part was not seated/)
    .first()
    .waitFor();
  await page.context().close();
});

it('forgets everything at sign-out', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'analyst');
  await page.goto('/fixtures');
  await page.getByRole('link', { name: 'TT-2' }).first().waitFor();
  await page.getByRole('button', { name: /Demo analyst/ }).click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await page.waitForURL('**/sign-in');
  await page.goBack();
  await page.waitForURL('**/sign-in*');
  expect((await page.request.get('/api/fixtures')).status()).toBe(401);
  await page.context().close();
});
