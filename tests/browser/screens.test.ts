import { mkdir } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { demoPassword, startSystem, type RunningSystem } from '../journeys/running-system.js';
import { fillLab, type FilledLab } from './filled-lab.js';
import { openBrowser, phone, signIn, wide, type Look } from './open-browser.js';

const folder = fileURLToPath(new URL('../../.data/screenshots/', import.meta.url));
const looks: [string, Look][] = [
  ['wide-light', { ...wide, theme: 'light' }], ['wide-dark', { ...wide, theme: 'dark' }], ['phone-light', { ...phone, theme: 'light' }], ['phone-dark', { ...phone, theme: 'dark' }],
];

let system: RunningSystem;
let filling: Promise<FilledLab> | undefined;
const filledLab = (): Promise<FilledLab> => (filling ??= fillLab(system));

beforeAll(async () => {
  await mkdir(folder, { recursive: true });
  system = await startSystem();
});
afterAll(() => system.stop());

const beforeSigningIn: Record<string, string> = { 'sign-in': '/sign-in', 'first-admin': '/first-admin?token=not-a-token' };

const forEngineer = (lab: FilledLab): Record<string, string> => ({
  'today': '/', 'sessions': '/sessions', 'new-session': '/sessions/new', 'session': `/sessions/${lab.sessionId}`, 'session-in-trouble': `/sessions/${lab.troubledSessionId}`,
  'curve': `/curves/${lab.curveId}`, 'curve-zoomed': `/curves/${lab.curveId}?from=100000000&to=400000000&axis=linear&rows=bounds`, 'curve-of-spots': `/curves/${lab.spotCurveId}`,
  'file': `/files/${lab.fileId}`, 'file-that-asks': `/files/${lab.askingFileId}`, 'file-refused': `/files/${lab.refusedFileId}`,
  'samples': '/samples', 'sample': `/samples/${lab.sampleId}`, 'new-sample': '/samples/new', 'no-sample': '/samples?code=NO-SUCH-CODE',
  'requirements': '/requirements', 'requirement': `/requirements/${lab.requirementId}`, 'new-requirement': '/requirements/new', 'tokens': '/tokens', 'no-such-page': '/nowhere',
});

/** Everything wrong with a page as it stands: axe's findings, and content wider than the window. */
async function faultsOf(page: Page, name: string): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  return [
    ...violations.map(({ id, nodes }) => `${name}: ${id} at ${nodes.map(({ target }) => target.join(' ')).join(', ')}`),
    ...(over > 0 ? [`${name}: ${String(over)} px wider than the window`] : []),
  ];
}

async function look(page: Page, label: string, pages: Record<string, string>): Promise<string[]> {
  const faults: string[] = [];
  for (const [name, path] of Object.entries(pages)) {
    await page.goto(`${system.baseUrl}${path}`);
    await page.mouse.move(1, 1);
    await page.waitForLoadState('networkidle');
    if (name.startsWith('curve')) await page.locator('.plot-canvas canvas').nth(1).waitFor();
    await page.screenshot({ path: `${folder}${name}-${label}.png`, fullPage: true });
    faults.push(...(await faultsOf(page, name)));
  }
  return faults;
}

const twoLooks = looks.filter(([label]) => label === 'wide-light' || label === 'phone-dark');

describe.each(twoLooks)('before anything was measured: %s', (label, size) => {
  test('each empty list says what to do first', async () => {
    const { page, complaints, close } = await openBrowser(size);
    await signIn(page, system.baseUrl, 'engineer@leeside.example', demoPassword);
    const faults = await look(page, label, { 'empty-tokens': '/tokens', 'empty-today': '/', 'empty-sessions': '/sessions' });
    await page.getByRole('link', { name: 'Open the first session' }).click();
    await page.getByLabel('Title').waitFor();
    await close();
    expect([...faults, ...complaints]).toEqual([]);
  });
});

describe.each(looks)('filled: %s', (label, size) => {
  beforeAll(() => filledLab());

  test('every page of an engineer is accessible and fits', async () => {
    const { page, complaints, close } = await openBrowser(size);
    const faults = await look(page, label, beforeSigningIn);
    await signIn(page, system.baseUrl, 'engineer@leeside.example', demoPassword);
    faults.push(...(await look(page, label, forEngineer(await filledLab()))));
    await close();
    expect([...faults, ...complaints]).toEqual([]);
  });
});

describe.each(twoLooks)('%s', (label, size) => {
  test('a client sees only the plain page of their own samples', async () => {
    const { page, complaints, close } = await openBrowser(size);
    await signIn(page, system.baseUrl, 'client-a@leeside.example', demoPassword);
    const faults = await look(page, label, { 'client-samples': '/samples' });
    const places = await page.getByRole('navigation', { name: 'Places' }).getByRole('link').allInnerTexts();
    await close();
    expect([...faults, ...complaints]).toEqual([]);
    expect(places.filter((word) => word !== '')).toEqual(['Your samples', 'Tokens']);
  });

  test('when the API fails, each list says what went wrong and what to do', async () => {
    const { page, close } = await openBrowser(size);
    await signIn(page, system.baseUrl, 'engineer@leeside.example', demoPassword);
    await page.route(/\/api\/v1\/(today|sessions|samples|requirements|auth\/tokens)/, (route) =>
      route.fulfill({ status: 400, contentType: 'application/problem+json', body: JSON.stringify({ type: '/problems/test', title: 'Not now', status: 400, detail: 'The shelf is locked.', instance: '/x', requestId: 'r-1' }) }));
    const pages = { 'error-today': '/', 'error-sessions': '/sessions', 'error-samples': '/samples', 'error-requirements': '/requirements', 'error-tokens': '/tokens' };
    const faults = await look(page, label, pages);
    const said = await page.getByRole('alert').innerText();
    await close();
    expect(faults).toEqual([]);
    expect(said).toContain('The shelf is locked. Nothing was changed.');
  });
});
