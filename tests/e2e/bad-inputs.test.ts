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
  it.each(bad)(
    '%s "%s" is refused beside its field, and the last sheet stays',
    async (path, typed, reason) => {
      const { page } = await stage.openAs(engineer);
      await openMember(page, 'C-07');
      const field = input(page, path);
      const before = await field.inputValue();
      const lines = await page.locator('[data-line]').count();
      await field.fill(typed);
      await page
        .getByText('The sheet shows the last valid inputs; 1 input wants correcting.')
        .waitFor();
      expect(await field.getAttribute('aria-invalid')).toBe('true');
      const described = await field.getAttribute('aria-describedby');
      expect(await page.locator(`[id="${described}"]`).textContent()).toMatch(reason);
      expect(await page.locator('[data-line]').count()).toBe(lines);
      await saved(page);
      await page.reload();
      await expect.poll(() => field.inputValue()).toBe(typed);
      await page.getByText(/No sheet yet: 1 input wants correcting/).waitFor();
      await field.fill(before);
      await expect.poll(() => page.locator('[data-line]').count()).toBe(lines);
      await saved(page);
      expect(await page.locator('body').textContent()).not.toMatch(/NaN|Infinity|undefined/);
    },
  );

  it('an unknown section is refused with how one is written', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    await input(page, 'section').fill('W99X1');
    await page.getByText(/No W shape is called/).waitFor();
    await page.keyboard.press('Escape');
    await page
      .getByText(/is not in the table of W shapes.*write it like W12X79/)
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
    ['P < 0', 'combinations[0].P', '-40 kip', 'NOT CHECKED', 'H1.2'],
    ['αPr at or above Pe1', 'combinations[0].P', '4000 kip', 'FAILED', 'A-8-5'],
    ['an end free', 'ends', 'free', 'NOT CHECKED', ''],
    ['held within a plane that bends', 'Lcx', '11 ft', 'NOT CHECKED', 'App. 8'],
  ])(
    '%s gives a verdict in words with its clause, never a number',
    async (_, path, typed, verdict, clause) => {
      const { page } = await stage.openAs(engineer);
      await openMember(page, 'C-05');
      const field = input(page, path);
      const before = await field.inputValue();
      if (path === 'ends') await field.selectOption(typed);
      else await field.fill(typed);
      await page.locator(`.sheet-verdict[data-verdict="${verdict}"]`).waitFor();
      expect(await page.locator('.verdict-ratio').count()).toBe(0);
      expect(await page.locator('.verdict-governs').textContent()).toContain(clause);
      if (path === 'ends') await field.selectOption(before);
      else await field.fill(before);
      await page.locator('.sheet-verdict[data-verdict="OK"]').waitFor();
      await saved(page);
    },
  );
});
