import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect, vi } from 'vitest';
import { type Application, serveApplication } from '#tests/support/application.ts';
import { openBrowser, type PageProblem, watchPage } from '#tests/support/browser.ts';

export interface Opened {
  readonly page: Page;
  readonly context: BrowserContext;
}

type SignedIn = Awaited<ReturnType<BrowserContext['storageState']>>;

interface OpenOptions {
  readonly width?: number;
  readonly expected?: (text: string) => boolean;
}

export interface Stage {
  readonly origin: string;
  /** The application's database, as its owner. */
  readonly databaseUrl: string;
  /** A page of a person of its own; what goes wrong in it fails the test unless it is expected. */
  open(options?: OpenOptions): Promise<Opened>;
  /** The same on the desk of one of the demo's people, who signs in once in a file. */
  openAs(name: string, options?: OpenOptions): Promise<Opened>;
}

/** How long a page may take to show what is waited for, also on a busy machine. */
const patience = 30_000;

/** The built application with its demo, and a browser, for the tests of one file. */
export function openStage(): Stage {
  let application: Application;
  let browser: Browser;
  const contexts: BrowserContext[] = [];
  const problems: PageProblem[][] = [];
  const signedIn = new Map<string, SignedIn>();

  // Each wait ends by itself; how many of them fit in a time is the machine's matter.
  vi.setConfig({
    testTimeout: 600_000,
    expect: { poll: { timeout: patience, interval: 100 } },
  });
  beforeAll(async () => {
    [application, browser] = await Promise.all([serveApplication(), openBrowser()]);
  });
  afterAll(async () => {
    await browser?.close();
    await application?.stop();
  });
  afterEach(async () => {
    const found = problems.splice(0).flat();
    await Promise.all(contexts.splice(0).map((context) => context.close()));
    expect(found).toEqual([]);
  });

  async function openPage({ width = 1280, expected }: OpenOptions = {}, storageState?: SignedIn) {
    const context = await browser.newContext({
      baseURL: application.origin,
      viewport: { width, height: 860 },
      permissions: ['clipboard-read', 'clipboard-write'],
      ...(storageState ? { storageState } : {}),
    });
    contexts.push(context);
    const page = await context.newPage();
    page.setDefaultTimeout(patience);
    problems.push(await watchPage(page, expected));
    return { page, context };
  }

  return {
    get origin() {
      return application.origin;
    },
    get databaseUrl() {
      return application.ownerUrl;
    },
    open: (options) => openPage(options),
    async openAs(name, options) {
      const known = signedIn.get(name);
      const opened = await openPage(options, known);
      const { page, context } = opened;
      await page.goto('/');
      if (!known) await page.getByRole('button', { name: `Sign in as ${name}` }).click();
      await page.getByRole('heading', { name: `The desk of ${name}` }).waitFor();
      if (!known) signedIn.set(name, await context.storageState());
      return opened;
    },
  };
}

export const engineer = 'Ines Marlow';
export const reviewer = 'Tomas Okoye';

/** Opens a calculation from the desk; resolves when its list of members stands. */
export async function openCalculation(page: Page, calculation = 'TQ-CAL-012') {
  if (new URL(page.url()).pathname !== '/') await page.goto('/');
  await page.getByRole('link', { name: calculation }).first().click();
  await page.getByRole('table', { name: 'Members' }).waitFor();
}

/** Opens a member of the demo's hall columns by its mark; resolves when its sheet stands. */
export async function openMember(page: Page, mark: string, calculation = 'TQ-CAL-012') {
  await openCalculation(page, calculation);
  await page.getByRole('rowheader', { name: mark, exact: true }).getByRole('link').click();
  await page.locator('[data-line]').first().waitFor();
}

/** Looked for in the top bar only: a search of a whole sheet for a text takes long. */
export const saved = (page: Page) =>
  page
    .locator('header')
    .first()
    .getByText(/^saved \d\d:\d\d$/)
    .waitFor();

/** The control of an input in the margin, by the path that problems carry. */
export const input = (page: Page, path: string) =>
  page.locator(`#input-${path.replace(/[^A-Za-z0-9]+/g, '-')}`);

/** The line of an address on the sheet. */
export const line = (page: Page, address: string) => page.locator(`[data-line="${address}"]`);
