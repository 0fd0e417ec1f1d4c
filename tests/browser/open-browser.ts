import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type BrowserContext, type Page } from 'playwright-core';

const executablePath = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium';
const args = [
  '--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync',
];

export interface Look { width: number; height: number; theme: 'light' | 'dark' }
export interface OpenBrowser { page: Page; context: BrowserContext; complaints: string[]; close: () => Promise<void> }

export const wide = { width: 1440, height: 900 } as const;
export const phone = { width: 390, height: 844 } as const;

/** Debian's chromium with a fresh profile. Whatever the page complains about (errors, refused content) is gathered. */
export async function openBrowser(look: Look): Promise<OpenBrowser> {
  const profile = await mkdtemp(join(tmpdir(), 'leeside-browser-'));
  const context = await chromium.launchPersistentContext(profile, {
    executablePath, headless: true, chromiumSandbox: false, args, viewport: { width: look.width, height: look.height },
    colorScheme: look.theme, locale: 'en-GB', timezoneId: 'Europe/Berlin', reducedMotion: 'reduce',
  });
  const page = context.pages()[0] ?? (await context.newPage());
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`error: ${error.message}`));
  page.on('console', (message) => {
    const expected = /status of 401/.test(message.text());
    if (message.type() === 'error' && !expected) complaints.push(message.text());
  });
  return {
    page, context, complaints,
    close: async () => {
      await context.close();
      await rm(profile, { recursive: true, force: true });
    },
  };
}

/** Signs in through the page itself. */
export async function signIn(page: Page, baseUrl: string, email: string, password: string): Promise<void> {
  await page.goto(`${baseUrl}/sign-in`);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}
