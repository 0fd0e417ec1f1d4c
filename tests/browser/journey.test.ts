import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { demoPassword, startSystem, type RunningSystem } from '../journeys/running-system.js';
import { pixelsLike } from './canvas-ink.js';
import { firstSessionFiles } from './filled-lab.js';
import { openBrowser, signIn, wide, type OpenBrowser } from './open-browser.js';

const ink = '#23201c';
const copper = '#a0461c';

let system: RunningSystem;
let browser: OpenBrowser;

beforeAll(async () => {
  system = await startSystem();
  browser = await openBrowser({ ...wide, theme: 'light' });
});
afterAll(async () => {
  await browser.close();
  await system.stop();
});

const searchOf = (): URLSearchParams => new URL(browser.page.url()).searchParams;

describe('an engineer brings three sweeps in and reads the curve', () => {
  test('signs in, after being told what is missing', async () => {
    const { page } = browser;
    await page.goto(system.baseUrl);
    await page.waitForURL(/sign-in/);
    await page.getByRole('button', { name: 'Sign in' }).click();
    const summary = page.getByRole('alert');
    await summary.getByRole('link', { name: 'Your password is missing.' }).waitFor();
    expect(await summary.evaluate((element) => element === document.activeElement)).toBe(true);
    await signIn(page, system.baseUrl, 'engineer@leeside.example', demoPassword);
    await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor();
  });

  test('opens a session against a requirement', async () => {
    const { page } = browser;
    await page.getByRole('link', { name: 'New session' }).click();
    await page.getByLabel('Title').fill('Pouches, first bench day');
    await page.getByLabel('Bench day').fill('2026-11-30');
    const rule = await page.getByLabel('Requirement').locator('option').filter({ hasText: 'Rule of thumb' }).getAttribute('value');
    await page.getByLabel('Requirement').selectOption(rule);
    await page.getByRole('button', { name: 'Open the session' }).click();
    await page.getByRole('heading', { level: 1, name: 'Pouches, first bench day' }).waitFor();
  });

  test('drops three files and sees each read, live, and the curve appear', async () => {
    const { page } = browser;
    await page.getByTestId('tray-input').setInputFiles(firstSessionFiles);
    await expect.poll(() => page.locator('#tray li[data-state="read"]').count(), { timeout: 30_000 }).toBe(3);
    await page.locator('#curves tr[data-state="ready"]').waitFor({ timeout: 30_000 });
    await page.reload();
    await page.locator('#curves tr[data-state="ready"]').waitFor();
    expect(await page.locator('#tray li[data-state="read"]').count()).toBe(3);
  });

  test('says that the guesses are right by one click', async () => {
    const { page } = browser;
    await page.getByRole('button', { name: 'All guesses are right' }).click();
    await expect.poll(() => page.locator('#traces').getByText('a guess').count()).toBe(0);
    await page.locator('#curves tr[data-state="ready"]').waitFor({ timeout: 30_000 });
  });

  test('sees the curve drawn, in ink, and the levels beneath it', async () => {
    const { page } = browser;
    await page.locator('#curves').getByRole('link', { name: 'MP24-011' }).click();
    await page.locator('.plot-canvas canvas').nth(1).waitFor();
    await expect.poll(() => pixelsLike(page, 0, ink)).toBeGreaterThan(800);
    await expect.poll(() => pixelsLike(page, 1, copper)).toBeGreaterThan(300);
  });

  test('zooms by dragging, keeps the zoom over a reload, and goes back by a double click', async () => {
    const { page } = browser;
    const area = await page.locator('.plot-canvas .u-over').first().boundingBox();
    if (!area) throw new Error('The plot has no area.');
    const y = area.y + area.height / 2;
    await page.mouse.move(area.x + area.width * 0.3, y);
    await page.mouse.down();
    await page.mouse.move(area.x + area.width * 0.6, y, { steps: 5 });
    await page.mouse.up();
    await expect.poll(() => Number(searchOf().get('to')) / Number(searchOf().get('from'))).toBeGreaterThan(1.5);
    const zoomed = page.url();
    await page.reload();
    await page.locator('.plot-canvas canvas').nth(1).waitFor();
    expect(page.url()).toBe(zoomed);
    await page.locator('.plot-canvas .u-over').first().dblclick();
    await expect.poll(() => searchOf().get('from')).toBeNull();
  });

  test('moves the cursor and zooms by the keyboard alone', async () => {
    const { page } = browser;
    const slider = page.getByRole('slider', { name: 'Attenuation over frequency' });
    await slider.focus();
    await page.keyboard.press('Home');
    const first = await slider.getAttribute('aria-valuetext');
    await page.keyboard.press('ArrowRight');
    await expect.poll(() => slider.getAttribute('aria-valuetext')).not.toBe(first);
    await page.keyboard.press('+');
    await expect.poll(() => searchOf().get('from')).not.toBeNull();
    await page.keyboard.press('Escape');
    await expect.poll(() => searchOf().get('from')).toBeNull();
  });

  test('finds a bound in the table, and the plot follows to it', async () => {
    const { page } = browser;
    await page.getByLabel('Show').selectOption('bounds');
    const bound = page.locator('tr[data-bound="true"]').first();
    await bound.waitFor();
    expect(await bound.locator('td').nth(1).innerText()).toMatch(/^≥/);
    await bound.getByRole('button').click();
    await expect.poll(() => page.getByTestId('cursor-readout').innerText()).toContain('≥');
    expect(searchOf().get('rows')).toBe('bounds');
  });

  test('finds the way back to the bytes', async () => {
    const { page } = browser;
    await page.getByRole('link', { name: /enclosed-MP24-011/ }).click();
    await page.getByRole('heading', { name: 'How it was read' }).waitFor();
    expect(await page.getByText(/^SHA-256 [0-9a-f]{64}$/).count()).toBe(1);
  });

  test('and nothing was complained about on the way, no policy broken', () => expect(browser.complaints).toEqual([]));
});
