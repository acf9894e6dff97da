import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();
const conflict = (text: string) => /status of 409/.test(text);

describe('two changes of one member', () => {
  it('are put together field by field; where both changed one, the person chooses', async () => {
    const mine = await stage.openAs(engineer, { expected: conflict });
    const theirs = await stage.openAs(engineer);
    await openMember(mine.page, 'C-07');
    await openMember(theirs.page, 'C-07');
    await input(theirs.page, 'Lb').fill('10 ft');
    await input(theirs.page, 'place').fill('grid 9/Z');
    await saved(theirs.page);
    await input(mine.page, 'Lb').fill('15 ft');
    await input(mine.page, 'Lcx').fill('21 ft');
    const dialog = mine.page.getByRole('dialog', { name: /was changed in the meantime/ });
    await dialog.waitFor();
    const clashes = dialog.getByRole('group');
    expect(await clashes.allTextContents()).toHaveLength(1);
    expect(await clashes.textContent()).toMatch(/15 ft[\s\S]*10 ft/);
    const save = dialog.getByRole('button', { name: /still to choose|Save this/ });
    expect(await save.isDisabled()).toBe(true);
    await dialog.getByRole('radio').first().check();
    await dialog.getByRole('button', { name: 'Save this' }).click();
    await dialog.waitFor({ state: 'detached' });
    await saved(mine.page);
    await mine.page.reload();
    await expect.poll(() => input(mine.page, 'Lb').inputValue()).toBe('15 ft');
    expect(await input(mine.page, 'Lcx').inputValue()).toBe('21 ft');
    expect(await input(mine.page, 'place').inputValue()).toBe('grid 9/Z');
  });
});
