import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { inject } from 'vitest';

const axeSource = readFileSync(
  createRequire(import.meta.url).resolve('axe-core/axe.min.js'),
  'utf8',
);

export const productUrl = (): string => inject('productUrl');

/** Debian's Chromium without its background calls; the sandbox stays unless we are root. */
export function launch(): Promise<Browser> {
  const root = process.getuid?.() === 0;
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      ...(root ? ['--no-sandbox'] : []),
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export type DemoRole = 'engineer' | 'analyst' | 'manager' | 'admin';

/** A page of its own context; what the console reports as an error is kept in `problems`. */
export async function openPage(
  browser: Browser,
  options: BrowserContextOptions = {},
): Promise<{ page: Page; problems: string[] }> {
  const context = await browser.newContext({ baseURL: productUrl(), ...options });
  const page = await context.newPage();
  const problems: string[] = [];
  page.on('pageerror', (error) => problems.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error') problems.push(message.text());
  });
  return { page, problems };
}

export async function signIn(page: Page, role: DemoRole): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${role}@tautline.example`);
  await page.getByLabel('Password').fill('hold-below-the-line');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

type AxeResult = {
  violations: { id: string; nodes: { html: string; failureSummary: string }[] }[];
};

/** What axe-core finds on the page as it stands, one line a violation. */
export async function axeViolations(page: Page): Promise<string[]> {
  await page.evaluate(axeSource);
  const { violations } = await page.evaluate<AxeResult>(`axe.run(document, {
    runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'],
  })`);
  return violations.flatMap(({ id, nodes }) =>
    nodes
      .slice(0, 3)
      .map(({ html, failureSummary }) => `${id}: ${html.slice(0, 160)} ${failureSummary}`),
  );
}

/** The demo fixture's id, by its code. */
export async function fixtureId(page: Page, code: string): Promise<number> {
  const answer = await page.request.get(`/api/fixtures?search=${encodeURIComponent(code)}`);
  const { items } = (await answer.json()) as { items: { id: number; code: string }[] };
  const found = items.find((one) => one.code === code);
  if (found === undefined) throw new Error(`the demo has no fixture ${code}`);
  return found.id;
}
