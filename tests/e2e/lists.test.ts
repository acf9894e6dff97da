import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, openCalculation, openStage, reviewer } from './stage.ts';

const stage = openStage();

const marks = (page: Page) =>
  page.getByRole('table', { name: 'Members' }).getByRole('rowheader').allInnerTexts();

describe('the members of a calculation', () => {
  it('are searched, reordered by keyboard, duplicated, deleted and restored', async () => {
    const { page } = await stage.openAs(engineer);
    await openCalculation(page);
    const before = await marks(page);
    expect(before.slice(0, 3)).toEqual(['C-05', 'C-06', 'C-07']);

    await page.getByLabel('Search').fill('w12 4/b');
    await expect.poll(() => marks(page)).toEqual(['C-07']);
    await page.getByLabel('Search').fill('nothing like it');
    await page.getByText('No member matches').waitFor();
    await page.getByRole('button', { name: /Show all/ }).click();

    await page.getByRole('button', { name: 'Move C-05: arrow up or down' }).focus();
    await page.keyboard.press('ArrowDown');
    await page.getByText('C-05 is now number 2').waitFor();
    await page.reload();
    await expect.poll(async () => (await marks(page)).slice(0, 2)).toEqual(['C-06', 'C-05']);

    await page.getByRole('button', { name: 'Duplicate C-07' }).click();
    await expect.poll(async () => (await marks(page)).length).toBe(before.length + 1);

    await page.getByRole('button', { name: 'Delete C-06' }).click();
    await expect.poll(() => marks(page)).not.toContain('C-06');
    await page.getByRole('button', { name: 'Restore', exact: true }).click();
    await expect.poll(() => marks(page)).toContain('C-06');
  });

  it('are only read by a reviewer', async () => {
    const { page } = await stage.openAs(reviewer);
    await openCalculation(page);
    expect(await page.getByRole('button', { name: /^(Delete|Duplicate|Move|Add)/ }).count()).toBe(
      0,
    );
    await page.getByRole('rowheader', { name: 'C-07', exact: true }).getByRole('link').click();
    await page.locator('[data-line]').first().waitFor();
    expect(await page.locator('#input-Lb').getAttribute('readonly')).not.toBeNull();
  });
});

describe('the drawings of a project', () => {
  it('are added, changed, deleted and restored', async () => {
    const { page } = await stage.openAs(engineer);
    await page
      .getByRole('table', { name: 'Projects', exact: true })
      .getByRole('link')
      .first()
      .click();
    await page.getByRole('button', { name: 'Add a drawing' }).click();
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByText('A drawing has a number').waitFor();
    await page.getByLabel('Number').fill('S-777');
    await page.getByLabel('Title').fill('Stairs');
    await page.getByLabel('Revision').fill('A');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    const row = page.getByRole('row', { name: /S-777/ });
    await row.waitFor();
    await page.getByRole('button', { name: 'Change S-777' }).click();
    await page.getByLabel('Revision').fill('B');
    await page.getByLabel('Status').selectOption('for construction');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await expect.poll(() => row.textContent()).toMatch(/B[\s\S]*for construction/);
    await page.getByRole('button', { name: 'Delete S-777' }).click();
    await row.waitFor({ state: 'detached' });
    await page.getByText(/deleted drawing/).click();
    await page.getByRole('button', { name: 'Restore S-777' }).click();
    await row.waitFor();
  });
});
