import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, openStage, reviewer } from './stage.ts';

const stage = openStage();

async function openLibrary(page: Page) {
  await page.getByRole('link', { name: 'Library' }).click();
  await page.getByRole('heading', { name: 'Library', exact: true }).waitFor();
}

/** The row of a published value by its example and what it is. */
const valueRow = (page: Page, example: string, what: string) =>
  page.locator(`[data-published="${example}"]`).filter({ hasText: what });

describe('looking up a clause', () => {
  it('leads from an equation number over the published value to a line of a calculation', async () => {
    const { page } = await stage.openAs(engineer);
    await openLibrary(page);
    await page.getByRole('rowheader', { name: 'E3', exact: true }).waitFor();
    await page.getByLabel('Find a formula').fill('E3-2');
    const found = page.locator('[data-formula]');
    await expect.poll(() => found.first().getAttribute('data-formula')).toBe('aisc360-22/E3-2');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'E3 Flexural buckling' }).waitFor();
    const line = page.locator('[data-formula="aisc360-22/E3-2"]');
    expect(await line.getAttribute('aria-current')).toBe('true');
    expect(await line.evaluate((element) => document.activeElement === element)).toBe(true);
    expect(await line.locator('.katex').count()).toBe(1);

    // Fn: nominal stress, in the units of both sets.
    const symbols = page.getByRole('table', { name: 'Symbols of the clause' });
    const Fn = symbols.getByRole('row').filter({ hasText: 'nominal compressive stress' });
    expect(await Fn.textContent()).toMatch(/ksi[\s\S]*MPa/);

    // Design Examples v16.0, E.1D: Fn = 38.9 ksi; worked by hand from its inputs 38.887.
    const row = valueRow(page, 'E.1D', 'nominal stress');
    await row.waitFor();
    expect(await row.textContent()).toContain('38.9 ksi');
    expect(await row.locator('[data-computed]').textContent()).toContain('38.887');
    expect(await row.textContent()).toMatch(/−0\.03 %[\s\S]*agrees/);
    expect(await row.textContent()).toContain('E3-2');
    // E.11 goes on with 21.4 ksi for Fn and prints 246 for 246.63.
    const rounded = valueRow(page, 'E.11', 'the stress as printed, 21.4 ksi');
    expect(await rounded.textContent()).toContain('246 kip');
    // What follows from the clause stands folded: E.1A, 893 kip.
    await page.getByText(/values that follow from this clause/).click();
    const strength = valueRow(page, 'E.1A', 'available compressive strength').first();
    expect(await strength.textContent()).toContain('893.20');

    const uses = page.getByRole('table', { name: 'Members that use the clause' });
    const member = uses.getByRole('row').filter({ hasText: 'C-07' });
    expect(await member.textContent()).toContain('TQ-CAL-012');
    await member.getByRole('link', { name: /^E3-2/ }).click();
    const chosen = page.locator('.sheet-line.is-chosen[data-line="E3/Fn"]');
    await chosen.waitFor();
    expect(await chosen.textContent()).toContain('E3-2');
    await page.goBack();
    await page.getByRole('heading', { name: 'E3 Flexural buckling' }).waitFor();
  });

  it('shows constants and decisions, the neighbours, and where nothing is published', async () => {
    const { page } = await stage.openAs(reviewer);
    await openLibrary(page);
    await page.getByRole('link', { name: 'E1', exact: true }).click();
    await page.getByText('φc is 0.90').waitFor();
    await page.getByText('Ωc is 1.67').waitFor();
    const neighbours = page.getByRole('navigation', { name: 'Neighbouring clauses' });
    await neighbours.getByRole('link', { name: /after: E2/ }).click();
    await neighbours.getByRole('link', { name: /after: E3/ }).click();
    await page.getByText(/buckling is inelastic: E3-2 applies/).waitFor();
    await page.getByRole('link', { name: 'Library', exact: true }).first().click();
    await page.getByRole('link', { name: 'App. 7.3', exact: true }).click();
    await page.getByText(/No published example/).waitFor();
  });

  it('lists every clause of the standard, and of those without formulas why', async () => {
    const { page } = await stage.openAs(reviewer);
    await openLibrary(page);
    const standard = page.getByRole('table', { name: 'Clauses of ANSI/AISC 360-22' });
    // ANSI/AISC 360-22: E5 single angles, H3 torsion.
    const angles = standard.getByRole('row').filter({ hasText: 'Single angles' }).first();
    expect(await angles.textContent()).toMatch(/E5[\s\S]*outside scope: angles are not among/);
    expect(await angles.getByRole('link').count()).toBe(0);
    expect(await standard.getByRole('row', { name: /^H3 Torsion/ }).count()).toBe(1);
    await page.getByText(/clauses within reach of a member check/).waitFor();
  });

  it('finds nothing, says so, and knows no clause that is not there', async () => {
    const { page } = await stage.openAs(engineer);
    await openLibrary(page);
    await page.getByLabel('Find a formula').fill('no such thing');
    await page.getByText('Nothing fits.').waitFor();
    await page.goto('/library/aisc360-22/Z9');
    await page.getByText('No clause at this address').waitFor();
  });

  it('says that the uses could not be fetched, and fetches them again', async () => {
    const { page } = await stage.openAs(engineer, { expected: (text) => text.includes('500') });
    await page.route('**/api/library/**', (route) => route.fulfill({ status: 500, body: '' }));
    await page.goto('/library/aisc360-22/E3');
    await page.getByText(/could not be fetched/).waitFor();
    await page.unroute('**/api/library/**');
    await page.getByRole('button', { name: 'Try again' }).click();
    await page.getByRole('table', { name: 'Members that use the clause' }).waitFor();
  });
});
