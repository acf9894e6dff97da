import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();

describe('undo in the form as a whole', () => {
  it('goes back over fields, sources and rows, and forth again', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    const sheet = () => page.locator('.verdict-ratio').textContent();
    const first = await sheet();
    await input(page, 'Lb').fill('10 ft');
    await input(page, 'Lcy').fill('12 ft');
    await page.getByRole('button', { name: /^Source of Buckling L c y/ }).click();
    await page.getByRole('checkbox', { name: 'Confirmed' }).check();
    await page.getByRole('button', { name: 'Done' }).click();
    await page.getByRole('button', { name: 'Add', exact: true }).click();
    await expect.poll(() => page.getByRole('button', { name: /without a name/ }).count()).toBe(1);

    await page.keyboard.press('Control+z');
    await expect.poll(() => page.getByRole('button', { name: /without a name/ }).count()).toBe(0);
    await page.keyboard.press('Control+z');
    await page.getByRole('button', { name: /^Source of Buckling L c y.* not confirmed/ }).waitFor();
    await page.keyboard.press('Control+z');
    await expect.poll(() => input(page, 'Lcy').inputValue()).toBe('22 ft');
    await page.keyboard.press('Control+z');
    await expect.poll(() => input(page, 'Lb').inputValue()).toBe('22 ft');
    await expect.poll(sheet).toBe(first);
    await page.keyboard.press('Control+Shift+z');
    await expect.poll(() => input(page, 'Lb').inputValue()).toBe('10 ft');
    await expect.poll(sheet).not.toBe(first);
    await page.getByRole('button', { name: 'Undo' }).click();
    await saved(page);
    await page.reload();
    await expect.poll(() => input(page, 'Lb').inputValue()).toBe('22 ft');
  });
});
