import type { Browser, BrowserContext, Page } from 'playwright-core';
import { chromium } from 'playwright-core';

/** Debian's Chromium, told to speak to nobody but the pages under test. */
export const openBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: process.env['COLDBENCH_E2E_CHROMIUM'] ?? '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });

export interface Visit {
  context: BrowserContext;
  page: Page;
  /** errors the page itself reported */ errors: string[];
}

/** A fresh browser profile; every error of the page is kept. */
export async function visit(
  browser: Browser,
  url: string,
  viewport = { width: 1440, height: 900 },
): Promise<Visit> {
  const context = await browser.newContext({ baseURL: url, viewport });
  const page = await context.newPage();
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(error.message));
  page.setDefaultTimeout(15_000);
  return { context, page, errors };
}

export async function signIn(
  page: Page,
  email: string,
  password = 'cold-bench-demo',
): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}
