import { type Browser, chromium, type Page } from 'playwright-core';

const flags = [
  ...['--no-sandbox', '--disable-gpu', '--no-first-run'],
  ...['--disable-background-networking', '--disable-component-update', '--disable-sync'],
];

/** Starts Chromium without a window, on a fresh profile that goes when it closes. */
export function openBrowser(): Promise<Browser> {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  return chromium.launch({ executablePath, args: flags, headless: true });
}

export interface PageProblem {
  readonly kind: 'console' | 'exception' | 'policy';
  readonly text: string;
}

const violation = 'Content policy violated:';

/**
 * Collects what goes wrong in a page: errors in its console, uncaught exceptions, violations of
 * the content policy. Call it before the first navigation and expect the list to be empty; an
 * answer that a test provokes (a 401) is in the console too, `expected` leaves it out.
 */
export async function watchPage(
  page: Page,
  expected: (text: string) => boolean = () => false,
): Promise<PageProblem[]> {
  const problems: PageProblem[] = [];
  const add = (kind: PageProblem['kind'], text: string) => {
    if (!expected(text)) problems.push({ kind, text });
  };
  page.on('console', (message) => {
    const text = message.text();
    const place = message.location().url;
    if (message.type() !== 'error') return;
    add(text.startsWith(violation) ? 'policy' : 'console', `${text} (${place})`);
  });
  page.on('pageerror', (error) => add('exception', error.stack ?? error.message));
  await page.addInitScript((prefix) => {
    document.addEventListener('securitypolicyviolation', (event) => {
      console.error(`${prefix} ${event.effectiveDirective} ${event.blockedURI} ${event.sample}`);
    });
  }, violation);
  return problems;
}
