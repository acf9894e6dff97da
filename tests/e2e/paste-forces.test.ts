import { describe, expect, it } from 'vitest';
import { engineer, openMember, openStage, saved } from './stage.ts';

const stage = openStage();

const table = [
  'Load combination\tPu\tMx A\tMx B\tMy A\tMy B\tRemark',
  '\tkip\tkip-ft\tkip-ft\tkip-ft\tkip-ft\t',
  '1.2D + 1.6L\t210\t98\t-61.5\t8\t8\tfrom the frame',
  '1.2D + L + W\t1,180\t120\tn/a\t\t\t',
  '0.9D + W\t90 kN\t44\t12\t\t\t',
].join('\n');

describe('pasting combinations from a spreadsheet', () => {
  it('shows what was understood, names problems by row and column, and loses nothing', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    await page.getByRole('button', { name: 'Forces', exact: true }).click();
    const forces = page.getByRole('region', { name: 'Forces' });
    await forces.getByRole('textbox').first().focus();
    await page.evaluate((text) => navigator.clipboard.writeText(text), table);
    await page.keyboard.press('Control+v');
    const dialog = page.getByRole('dialog', { name: 'A table of forces' });
    await dialog.waitFor();
    expect(await dialog.getByLabel('Column Pu is').inputValue()).toBe('P');
    expect(await dialog.getByLabel('Column Mx B is').inputValue()).toBe('MxB');
    expect(await dialog.getByLabel('Column Remark is').inputValue()).toBe('leave');
    const problems = await dialog.getByRole('status').textContent();
    expect(problems).toMatch(/Row 4, Pu: "1,180" has a comma/);
    expect(problems).toMatch(/Row 4, Mx B: "n\/a" does not start with a number/);
    await dialog.getByLabel(/The file it comes from/).fill('frame.xlsx');
    await dialog.getByLabel(/in place of the 2 present rows/).check();
    await dialog.getByRole('button', { name: 'Take over 3 combinations' }).click();
    const cell = (label: string) => forces.getByLabel(label, { exact: true });
    expect(await cell('Axial of 1.2D + 1.6L').inputValue()).toBe('210 kip');
    expect(await cell('Major, end B of 1.2D + 1.6L').inputValue()).toBe('-61.5 kip ft');
    expect(await cell('Major, end B of 1.2D + L + W').inputValue()).toBe('n/a');
    expect(await cell('Axial of 0.9D + W').inputValue()).toBe('90 kN');
    await page.getByText(/2 inputs want correcting/).waitFor();
    await cell('Axial of 1.2D + L + W').fill('1180 kip');
    await cell('Major, end B of 1.2D + L + W').fill('20 kip ft');
    await expect.poll(() => page.getByText(/correcting/).count()).toBe(0);
    await forces
      .getByRole('button', { name: /Source of the forces of 1\.2D \+ 1\.6L: frame\.xlsx, row 3/ })
      .waitFor();
    await saved(page);
    await forces.getByRole('button', { name: 'Sheet of 1.2D + 1.6L' }).click();
    await page.getByText('file frame.xlsx, row 3').first().waitFor();
  });
});
