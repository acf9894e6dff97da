import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, line, openMember, openStage } from './stage.ts';

const stage = openStage();

/** The crane bay's wind column: three segments, of which one governs. */
const openColumn = (page: Page) => openMember(page, 'K-03', 'TQ-CAL-014');

const head = (page: Page, address: string) => page.locator(`[data-section="${address}"]`);
const expanded = (page: Page, address: string) =>
  expect.poll(() => head(page, address).getAttribute('aria-expanded'));
/** Lines whose working lies over their result. */
const coveredResults = (page: Page) =>
  page.locator('[data-line]').evaluateAll((lines) =>
    lines.flatMap((each) => {
      const result = each.querySelector('.line-result')?.getBoundingClientRect();
      const covers = [...each.querySelectorAll('.line-working .katex-base')].some((part) => {
        const { right, top, bottom } = part.getBoundingClientRect();
        return result && right > result.left && bottom > result.top && top < result.bottom;
      });
      return covers ? [(each as HTMLElement).dataset.line] : [];
    }),
  );
const focusedPlace = (page: Page) =>
  page.evaluate(() => {
    const { line: of, section } = (document.activeElement as HTMLElement).dataset;
    return of ?? section;
  });

describe('sections of a sheet', () => {
  it('fold to their result and stay so on the way to another member and back', async () => {
    const { page } = await stage.openAs(engineer);
    await openColumn(page);
    expect(await line(page, 'section/A').isVisible()).toBe(false);
    await expanded(page, 'E3/strength').toBe('true');
    await head(page, 'E3/strength').click();
    await expanded(page, 'E3/strength').toBe('false');
    expect(await line(page, 'E1/Pc').isVisible()).toBe(false);
    const folded = page.locator('[data-group="E3/strength"] > .sheet-section');
    expect(await folded.textContent()).toMatch(/Compressive strength[\s\S]*kN/);
    await page.getByRole('link', { name: /K-02/ }).click();
    await page.getByRole('heading', { name: /^K-02/ }).waitFor();
    await page.getByRole('link', { name: /K-03/ }).click();
    await page.getByRole('heading', { name: /^K-03/ }).waitFor();
    await expanded(page, 'E3/strength').toBe('false');
  });

  it('fold and open by keyboard, one and all', async () => {
    const { page } = await stage.openAs(engineer);
    await openColumn(page);
    await line(page, 'E1/Pc').focus();
    await page.keyboard.press('f');
    await expanded(page, 'E3/strength').toBe('false');
    expect(await focusedPlace(page)).toBe('E3/strength');
    await page.keyboard.press('Enter');
    await expanded(page, 'E3/strength').toBe('true');
    await page.keyboard.press('ArrowDown');
    expect(await focusedPlace(page)).toMatch(/^E3\//);
    await page.keyboard.press('Shift+F');
    await expect.poll(() => page.locator('[data-section][aria-expanded=true]').count()).toBe(0);
    expect(await focusedPlace(page)).toBe('E3/strength');
    await page.keyboard.press('Shift+F');
    await expect.poll(() => page.locator('[data-section][aria-expanded=false]').count()).toBe(0);
    // F2-6 with its numbers is wider than the column beside its result.
    await expect.poll(() => coveredResults(page)).toEqual([]);
  });

  it('open for a line that is followed or linked to', async () => {
    const { page } = await stage.openAs(engineer);
    await openColumn(page);
    const area = line(page, 'section/A');
    expect(await area.isVisible()).toBe(false);
    await line(page, 'E3/Pn').locator('[data-ref="section/A"]').first().click();
    await expect.poll(() => area.isVisible()).toBe(true);
    await expect.poll(() => focusedPlace(page)).toBe('section/A');
    await page.goto(`${new URL(page.url()).pathname}?line=section%2FJ`);
    await expect.poll(() => line(page, 'section/J').isVisible()).toBe(true);
    await expect.poll(() => focusedPlace(page)).toBe('section/J');
  });

  it('are all on paper', async () => {
    const { page } = await stage.openAs(engineer);
    await openColumn(page);
    await page.emulateMedia({ media: 'print' });
    const hidden = await page
      .locator('[data-line]')
      .evaluateAll(
        (lines) => lines.filter((each) => each.getBoundingClientRect().height < 5).length,
      );
    expect(hidden).toBe(0);
  });
});

describe('the table of limit states', () => {
  it('leads by keyboard from a ratio to its line, whose section opens', async () => {
    const { page } = await stage.openAs(engineer);
    await openColumn(page);
    const table = page.getByRole('region', { name: /^Limit states of K-03/ });
    const ratio = table
      .getByRole('row', { name: /Compression alone/ })
      .getByRole('button')
      .first();
    const address = (await ratio.getAttribute('data-ref')) ?? '';
    await page
      .getByRole('region', { name: 'Sheet', exact: true })
      .locator('[data-line]')
      .first()
      .focus();
    await page.keyboard.press('Shift+F');
    await expect.poll(() => line(page, address).isVisible()).toBe(false);
    await ratio.focus();
    await page.keyboard.press('Enter');
    await expect.poll(() => line(page, address).isVisible()).toBe(true);
    await expect.poll(() => focusedPlace(page)).toBe(address);
    await page.locator('.sheet-line.is-chosen').waitFor();
  });
});
