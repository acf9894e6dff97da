import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();

describe('forces of an analysis with another section', () => {
  it('count as not confirmed until the analysis is said to be run again', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    const left = page.getByText(/These forces were analysed with W12×79, the member is W14×90 now/);
    const caution = page.getByText(/These forces were analysed with W12X79/);
    expect(await left.count()).toBe(0);

    await input(page, 'section').fill('W14X90');
    await page.keyboard.press('Enter');
    await left.waitFor();
    await expect.poll(() => caution.count()).toBeGreaterThan(0);

    await page.getByRole('button', { name: 'Analysed again with W14×90' }).click();
    await expect.poll(() => left.count()).toBe(0);
    await expect.poll(() => caution.count()).toBe(0);
    await saved(page);
  });
});
