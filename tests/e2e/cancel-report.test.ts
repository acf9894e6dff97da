import { describe, expect, it } from 'vitest';
import { engineer, openStage } from './stage.ts';

const stage = openStage();

describe('a report that takes long', () => {
  it('says how long it has been at work, and can be cancelled', async () => {
    const { page } = await stage.openAs(engineer);
    await page.route('**/report.pdf', async (route) => {
      await new Promise((later) => setTimeout(later, 4_000));
      await route.abort().catch(() => undefined);
    });
    await page.getByRole('link', { name: 'TQ-CAL-012' }).first().click();
    await page.getByRole('button', { name: 'Report as PDF' }).click();
    await page.getByText(/Making the file, [2-9] s/).waitFor();
    await page.getByRole('button', { name: 'Cancel' }).click();
    await page.getByRole('button', { name: 'Report as PDF' }).waitFor();
    expect(await page.getByRole('dialog').count()).toBe(0);
  });
});
