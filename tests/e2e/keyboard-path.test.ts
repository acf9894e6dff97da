import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openStage, saved } from './stage.ts';

const stage = openStage();

const focused = (page: Page) =>
  page.evaluate(() => {
    const element = document.activeElement;
    if (!(element instanceof HTMLElement)) return '';
    const label = element.id ? document.querySelector(`label[for="${element.id}"]`) : null;
    return `${element.getAttribute('aria-label') ?? ''} ${label?.textContent ?? ''} ${element.textContent ?? ''}`;
  });

/** Presses Tab until what has the focus is called so; at most as often as a patient person. */
async function tabTo(page: Page, called: RegExp, key = 'Tab') {
  for (let presses = 0; presses < 120; presses += 1) {
    await page.keyboard.press(key);
    if (called.test(await focused(page))) return;
  }
  throw new Error(`Tab does not come to ${called}`);
}

describe('the whole path by keyboard alone', () => {
  it('leads from signing in over a changed input to a traced line and its sources', async () => {
    const { page } = await stage.open();
    await page.goto('/');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await tabTo(page, /E-mail address/);
    await page.keyboard.type('ines.marlow@harrow-pike.example');
    await page.keyboard.press('Tab');
    await page.keyboard.type('ferry hall columns');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: /The desk of/ }).waitFor();

    await tabTo(page, /^\s*TQ-CAL-012/);
    await page.keyboard.press('Enter');
    await page.getByRole('table', { name: 'Members' }).waitFor();
    await tabTo(page, /^\s*C-06\s*$/);
    await page.keyboard.press('Enter');
    await page.locator('[data-line]').first().waitFor();

    await tabTo(page, /^\s*Unbraced/);
    const before = await page.locator('.verdict-ratio').textContent();
    await page.keyboard.press('Control+A');
    await page.keyboard.type('9 ft');
    await expect.poll(() => page.locator('.verdict-ratio').textContent()).not.toBe(before);
    await saved(page);
    await page.keyboard.press('Control+Z');
    await expect.poll(() => page.locator('.verdict-ratio').textContent()).toBe(before);

    await tabTo(page, /Source of Unbraced/);
    await page.keyboard.press('Enter');
    await page.getByText('Where Unbraced Lb comes from').waitFor();
    await page.keyboard.press('Escape');

    await tabTo(page, /Line 2\.1,/);
    // Down over heads of sections; what a folded one holds is passed over.
    await tabTo(page, /Line 2\.46,/, 'ArrowDown');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Trace of line 2.46' }).waitFor();
    await page.keyboard.press('s');
    await expect
      .poll(() => page.evaluate(() => document.activeElement?.className))
      .toContain('rung');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Trace of line 2.46' }).waitFor({ state: 'detached' });
    await expect.poll(() => page.locator('.sheet-line.is-chosen:focus').count()).toBe(1);
    await page.keyboard.press('u');
    await expect
      .poll(() => page.evaluate(() => document.activeElement?.closest('[data-used-by]') !== null))
      .toBe(true);
    await page.keyboard.press('c');
    await page.getByText(/copied as text/).waitFor();
    await page.keyboard.press('Escape');
    await expect.poll(() => page.locator('.sheet-line.is-chosen').count()).toBe(0);
    expect(
      await page.evaluate(() => document.activeElement?.getAttribute('data-line')),
    ).toBeTruthy();
  });

  it('chooses a section by typing part of its designation', async () => {
    const { page } = await stage.openAs('Ines Marlow');
    await page.goto('/');
    await page.getByRole('link', { name: 'TQ-CAL-012' }).first().click();
    await page.getByRole('rowheader', { name: 'C-05' }).getByRole('link').click();
    await page.locator('[data-line]').first().waitFor();
    await tabTo(page, /Section/);
    await page.keyboard.press('Control+A');
    await page.keyboard.type('w12x7');
    await page.locator('[role=option]').first().waitFor();
    const found = await page.locator('[role=option]').allInnerTexts();
    expect(found.map((text) => text.replace(/\s+/g, ' ')).sort()).toEqual([
      'W12×72 W, 72 lb/ft',
      'W12×79 W, 79 lb/ft',
    ]);
    await page.keyboard.type('9');
    const list = page.getByRole('dialog', { name: 'Sections found' });
    await list.getByRole('img', { name: /Outline of W12×79/ }).waitFor();
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: /C-05 · W12×79/ }).waitFor();
    await saved(page);
  });
});
