import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();

const bad: readonly (readonly [path: string, typed: string, reason: RegExp])[] = [
  ['Lb', '-3 ft', /must be zero or above/i],
  ['Lcx', '0 ft', /must be above zero/i],
  ['length', '22', /needs a unit/i],
  ['Lcy', '22 kip', /is a force; a length is wanted/i],
  ['Lcz', '1e400 ft', /too large/i],
  ['length', '', /is needed/i],
  ['Cb', '9', /not above 5/i],
  ['mark', '<script>', /may hold letters/i],
  ['combinations[0].P', 'lots', /does not start with a number/i],
  ['combinations[0].MxA', '118 kip', /a moment is wanted/i],
];

describe('bad inputs', () => {
  it('are refused beside their field with the reason, and the last sheet stays', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    const lines = await page.locator('[data-line]').count();
    for (const [path, typed, reason] of bad) {
      const field = input(page, path);
      const before = await field.inputValue();
      await field.fill(typed);
      const wants = typed === '' ? 'is still needed' : 'wants correcting';
      await page.getByText(`The sheet shows the last valid inputs; 1 input ${wants}.`).waitFor();
      expect(await field.getAttribute('aria-invalid'), path).toBe('true');
      const described = await field.getAttribute('aria-describedby');
      expect(await page.locator(`[id="${described}"]`).textContent(), path).toMatch(reason);
      expect(await page.locator('[data-line]').count(), path).toBe(lines);
      await field.fill(before);
      await expect.poll(() => page.getByText(/shows the last valid inputs/).count()).toBe(0);
    }
    await saved(page);
    expect(await page.locator('main').textContent()).not.toMatch(/NaN|Infinity|undefined/);
  });

  it('are kept as typed over a reload', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    const field = input(page, 'Lcy');
    await field.fill('22 kip');
    await saved(page);
    await page.reload();
    await expect.poll(() => field.inputValue()).toBe('22 kip');
    await page.getByText(/No sheet yet: 1 input wants correcting/).waitFor();
    await page.getByRole('button', { name: 'Buckling Lcy' }).click();
    expect(await field.evaluate((element) => document.activeElement === element)).toBe(true);
    await field.fill('22 ft');
    await page.locator('[data-line]').first().waitFor();
    await saved(page);
  });

  it('an unknown section is refused with how one is written', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    await input(page, 'section').fill('W99X1');
    await page.getByText(/No shape of the tables is called/).waitFor();
    await page.keyboard.press('Escape');
    await page
      .getByText(/is in none of the tables of W, .*write it like W12X79/)
      .first()
      .waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await saved(page);
  });

  it('forces of the other load level are refused in an ASD calculation', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Design', { exact: true }).selectOption('ASD');
    await saved(page);
    await page.goBack();
    await page
      .getByText(/is an LRFD combination in a calculation by ASD/)
      .first()
      .waitFor();
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Design', { exact: true }).selectOption('LRFD');
    await saved(page);
  });

  it.each([
    ['P < 0', 'C-05', 'combinations[0].P', '-40 kip', 'NOT CHECKED', 'D2'],
    ['αPr at or above Pe1', 'C-10', 'combinations[0].P', '170 kip', 'FAILED', 'A-8-5'],
    ['an end free', 'C-05', 'ends', 'free', 'NOT CHECKED', ''],
    ['held within a plane that bends', 'C-05', 'Lcx', '11 ft', 'NOT CHECKED', 'App. 8'],
  ])(
    '%s gives a verdict in words with its clause, never a number',
    async (_, mark, path, typed, verdict, clause) => {
      const { page } = await stage.openAs(engineer);
      await openMember(page, mark);
      const field = input(page, path);
      if (path === 'ends') await field.selectOption(typed);
      else await field.fill(typed);
      await page.locator(`.sheet-verdict[data-verdict="${verdict}"]`).waitFor();
      expect(await page.locator('.verdict-ratio').count()).toBe(0);
      expect(await page.locator('.verdict-governs').textContent()).toContain(clause);
      await page.getByRole('button', { name: 'Undo' }).click();
      await saved(page);
    },
  );
});
