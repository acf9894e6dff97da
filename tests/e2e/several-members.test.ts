import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, input, openCalculation, openStage, reviewer } from './stage.ts';

const stage = openStage();

const box = (page: Page, mark: string) => page.getByRole('checkbox', { name: `Choose ${mark}` });
const row = (page: Page, mark: string) =>
  page.getByRole('table', { name: 'What changes in each member' }).getByRole('row', {
    name: new RegExp(`^${mark}`),
  });
const verdictOf = (page: Page, mark: string) =>
  page
    .getByRole('table', { name: 'Members' })
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: mark, exact: true }) })
    .getByText(/^(NOT )?OK \d/)
    .textContent();
const apply = (page: Page, text: string) => page.getByRole('button', { name: text, exact: true });

describe('several members of a list', () => {
  it('get another steel by keyboard, seen before and after, and go back', async () => {
    const { page } = await stage.openAs(engineer);
    await openCalculation(page);
    const before = await verdictOf(page, 'C-05');
    await box(page, 'C-05').focus();
    await page.keyboard.press('Space');
    await page.keyboard.press('Shift+ArrowDown');
    expect(await box(page, 'C-06').isChecked()).toBe(true);
    await page.getByText('2 members chosen').waitFor();
    await page.getByRole('button', { name: 'Change them' }).focus();
    await page.keyboard.press('Enter');
    await page.getByLabel('What changes').selectOption('Steel');
    await page.getByText('Nothing changes yet.').waitFor();
    expect(await apply(page, 'Change 0 members').isDisabled()).toBe(true);
    await input(page, 'material').selectOption('A36');

    await row(page, 'C-05')
      .getByText(/A992.*A36/)
      .waitFor();
    await row(page, 'C-05')
      .getByText(before ?? '', { exact: true })
      .waitFor();
    await expect.poll(() => apply(page, 'Change 2 members').isEnabled()).toBe(true);
    const promised = await row(page, 'C-05')
      .getByText(/^(NOT )?OK \d/)
      .last()
      .textContent();
    expect(promised).not.toBe(before);
    await apply(page, 'Change 2 members').focus();
    await page.keyboard.press('Enter');
    await page.getByText('Steel changed in 2 members.').waitFor();
    // What the list shows is of the server's own run.
    await expect.poll(() => verdictOf(page, 'C-05')).toBe(promised);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await page.getByText('2 members as before.').waitFor();
    await expect.poll(() => verdictOf(page, 'C-05')).toBe(before);
  });

  it('are changed by none where somebody changed one meanwhile, and nothing is lost', async () => {
    const { page } = await stage.openAs(engineer, { expected: (text) => text.includes('409') });
    await openCalculation(page);
    await box(page, 'C-07').check();
    await box(page, 'C-08').check();
    await page.getByRole('button', { name: 'Change them' }).click();
    await page.getByLabel('What changes').selectOption('Unbraced length Lb');
    await input(page, 'Lb').fill('11 ft');
    await expect.poll(() => apply(page, 'Change 2 members').isEnabled()).toBe(true);

    // The same person in another tab.
    const other = await page.context().newPage();
    await other.goto(page.url());
    await other.getByRole('rowheader', { name: 'C-08', exact: true }).getByRole('link').click();
    await other.locator('[data-line]').first().waitFor();
    const stored = other.waitForResponse((answer) => answer.request().method() === 'PUT');
    await input(other, 'place').fill('grid 9/Z');
    await stored;

    await apply(page, 'Change 2 members').click();
    await page.getByText(/Nothing was changed: others changed members meanwhile/).waitFor();
    await page.getByText('C-08 was changed by Ines Marlow.').waitFor();
    await expect.poll(() => apply(page, 'Change 2 members').isEnabled()).toBe(true);
    await apply(page, 'Change 2 members').click();
    await page.getByText('Unbraced length Lb changed in 2 members.').waitFor();
    await page.getByRole('rowheader', { name: 'C-08', exact: true }).getByRole('link').click();
    await page.locator('[data-line]').first().waitFor();
    expect(await input(page, 'place').inputValue()).toBe('grid 9/Z');
    expect(await input(page, 'Lb').inputValue()).toBe('11 ft');
  });

  it('refuse a value that one of them cannot take, until it is left out', async () => {
    const { page } = await stage.openAs(engineer);
    await openCalculation(page);
    await page.getByRole('checkbox', { name: 'Choose all members shown' }).check();
    await page.getByLabel('Search').fill('C-05');
    await page.getByText(/\d of them not shown/).waitFor();
    await page.getByRole('button', { name: 'Choose none' }).click();
    await box(page, 'C-05').check();
    await page.getByRole('button', { name: 'Change it' }).click();
    await page.getByLabel('What changes').selectOption('Length L');
    await input(page, 'length').fill('long');
    await page.locator('#input-length-problem').waitFor();
    await page.getByText('C-05 cannot take this value').waitFor();
    expect(await apply(page, 'Change 1 member').isDisabled()).toBe(true);
    await page.getByRole('button', { name: 'Leave out C-05' }).click();
    await page.getByRole('table', { name: 'Members' }).waitFor();
  });

  it('are not chosen by a reviewer', async () => {
    const { page } = await stage.openAs(reviewer);
    await openCalculation(page);
    expect(await page.getByRole('checkbox').count()).toBe(0);
  });
});
