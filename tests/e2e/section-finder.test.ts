import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, reviewer, saved } from './stage.ts';

const stage = openStage();

const finder = (page: Page) => page.getByRole('region', { name: 'Section finder' });
const table = (page: Page) =>
  page.getByRole('table', { name: 'Sections that satisfy every check, by weight' });
const searched = (page: Page) =>
  page.getByText(/W shapes tried, the lightest first/).waitFor({ timeout: 60_000 });

const verdictOf = async (page: Page, section: RegExp) =>
  table(page)
    .getByRole('row', { name: section })
    .first()
    .getByText(/^(NOT )?OK /)
    .textContent();

describe('the section finder', () => {
  it('finds a lighter section by keyboard, takes it, and says what becomes of the forces', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-05');
    await page.getByRole('button', { name: 'Find a section' }).focus();
    await page.keyboard.press('Enter');
    await expect.poll(() => page.evaluate(() => document.activeElement?.tagName)).toBe('SELECT');
    await page.getByText(/were analysed with W10×49: with another section they stay/).waitFor();
    await searched(page);
    const weights = (await table(page).getByRole('row').allInnerTexts())
      .slice(1)
      .map((text) => Number(text.split('\t')[1]));
    expect(weights.length).toBeGreaterThanOrEqual(10);
    expect(weights).toEqual(weights.toSorted((a, b) => a - b));

    // From the kind of section over the four limits to the first section, and on with the arrows.
    for (let presses = 0; presses < 5; presses += 1) await page.keyboard.press('Tab');
    await page.keyboard.press('ArrowDown');
    const chosen = await page.evaluate(() => document.activeElement?.textContent ?? '');
    expect(chosen).toMatch(/^W\d+×\d+$/);
    expect(Number(chosen.split('×')[1])).toBeLessThan(49);
    const promised = await verdictOf(page, new RegExp(chosen));
    expect(promised).toMatch(/^OK 0\./);
    await page.keyboard.press('Enter');
    await page.getByText(`C-05 is ${chosen} now, in place of W10×49.`).waitFor();
    await page.getByText(/The forces of 2 combinations are still those of the section/).waitFor();
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe(chosen);
    await saved(page);

    await page.getByRole('button', { name: 'Show its sheet' }).click();
    await page.getByRole('heading', { name: `C-05 · ${chosen}` }).waitFor();
    expect(await input(page, 'section').inputValue()).toBe(chosen);
    // The sheet of the combination that governs says what the finder said.
    const ratio = await page.locator('.verdict-ratio').textContent();
    expect(promised).toBe(`OK ${ratio}`);
    await page
      .getByText(/These forces were analysed with W10X49/)
      .first()
      .waitFor();
    await page.keyboard.press('Control+z');
    await page.getByRole('heading', { name: 'C-05 · W10×49' }).waitFor();
    await saved(page);
  });

  it('keeps to limits, shows the present section in its place, and can be stopped', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-05');
    await page.getByRole('button', { name: 'Find a section' }).click();
    await finder(page).getByLabel('Depth, at most').fill('tall');
    await finder(page).locator('[data-problem]').waitFor();
    await finder(page).getByText('The search starts by itself once').waitFor();
    await finder(page).getByLabel('Depth, at most').fill('10.5 in');
    await searched(page);
    const depths = (await table(page).getByRole('row').allInnerTexts())
      .slice(1)
      .map((text) => Number.parseFloat(text.split('\t')[3] ?? ''));
    expect(Math.max(...depths)).toBeLessThanOrEqual(10.5);
    const present = table(page).getByRole('row').filter({ hasText: 'present' });
    expect(await present.textContent()).toContain('W10×49');

    await finder(page).getByLabel('Depth, at most').fill('');
    await finder(page).getByRole('button', { name: 'Stop' }).click();
    await page.getByText(/^Stopped/).waitFor();
    await finder(page).getByRole('button', { name: 'Search again' }).click();
    await searched(page);
  });

  it('says why where nothing is found, and that a steel is not made so', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    await page.getByRole('button', { name: 'Find a section' }).click();
    // The heaviest W8 that is at most 8.6 in deep is W8×48, 8.50 in.
    await finder(page).getByLabel('Depth, at most').fill('8.6 in');
    await page
      .getByText(/None of the \d+ W shapes satisfies every check/)
      .waitFor({ timeout: 60_000 });
    await page.getByText(/The nearest is W8×48: NOT OK 1\.\d+ under/).waitFor();
    await finder(page).getByLabel('Depth, at most').fill('');
    await finder(page).getByLabel('Kind of section').selectOption('square HSS');
    await page.getByText(/A992 is not made as such sections/).waitFor({ timeout: 60_000 });
    await finder(page).getByLabel('Width, at least').fill('90 in');
    await page.getByText('No square HSS are within these limits.').waitFor();
  });

  it('is only read by a reviewer', async () => {
    const { page } = await stage.openAs(reviewer);
    await openMember(page, 'C-05');
    await page.getByRole('button', { name: 'Find a section' }).click();
    await searched(page);
    expect(await table(page).getByRole('button').count()).toBe(0);
  });
});
