import { describe, expect, it } from 'vitest';
import { engineer, line, openMember, openStage } from './stage.ts';

const stage = openStage();

/** Addresses that the operands of a line lead to. */
const operandsOf = (address: string) =>
  [...document.querySelectorAll(`[data-line="${address}"] [data-ref]`)].map(
    (element) => (element as HTMLElement).dataset.ref ?? '',
  );

describe('following a number home', () => {
  it('lights its operands in place and opens the ladder down to given values', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    await line(page, 'c1:H1/ratio').locator('.line-value').click();
    await page.getByRole('heading', { name: /Trace of line 3\./ }).waitFor();
    const operands = new Set(await page.evaluate(operandsOf, 'c1:H1/ratio'));
    expect(operands.size).toBeGreaterThanOrEqual(4);
    const lit = await page
      .locator('.sheet-line.is-lit')
      .evaluateAll((lines) => lines.map((element) => (element as HTMLElement).dataset.line ?? ''));
    expect(new Set(lit)).toEqual(operands);
    const underlined = await page
      .locator('.sheet-line.is-chosen [data-ref]')
      .first()
      .evaluate((element) => getComputedStyle(element).borderBottomStyle);
    expect(underlined).toBe('solid');
    const ladder = page.locator('[data-ladder]');
    const given = await ladder.locator('.rung.is-given').allInnerTexts();
    expect(given.join(' ')).toContain('hall-forces.csv');
    expect(given.join(' ')).toContain('S-201');
    expect(given.join(' ')).toContain('not confirmed');
    expect(await ladder.locator('.rung').count()).toBeGreaterThan(operands.size);
  });

  it('goes from an operand to its own line, and the list of uses leads back', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    await line(page, 'c1:H1/ratio').locator('[data-ref="E1/Pc"]').first().click();
    await page.locator('.sheet-line.is-chosen[data-line="E1/Pc"]').waitFor();
    const uses = page.locator('[data-used-by] .rung');
    expect(await uses.count()).toBeGreaterThan(0);
    await page.goBack();
    await expect.poll(() => new URL(page.url()).searchParams.get('line')).not.toBe('E1/Pc');
  });

  it('gives a line an address that can be shared', async () => {
    const { page, context } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    await line(page, 'c2:H1/ratio').count();
    await page.getByRole('button', { name: /1\.2D \+ L \+ W/ }).click();
    await line(page, 'c2:H1/ratio').click();
    await page.getByRole('button', { name: 'Copy link' }).click();
    const link = await page.evaluate(() => navigator.clipboard.readText());
    const other = await context.newPage();
    await other.goto(link);
    const chosen = other.locator('.sheet-line.is-chosen[data-line="c2:H1/ratio"]');
    await chosen.waitFor();
    await expect
      .poll(() => chosen.evaluate((element) => document.activeElement === element))
      .toBe(true);
    const { top, bottom } = await chosen.evaluate((element) => element.getBoundingClientRect());
    expect(top).toBeGreaterThan(0);
    expect(bottom).toBeLessThan(860);
  });

  it('copies a line as one line of text', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    await line(page, 'E1/Pc').click();
    await page.getByRole('button', { name: 'Copy line' }).click();
    await page.getByText(/copied as text/).waitFor();
    const text = await page.evaluate(() => navigator.clipboard.readText());
    expect(text).toMatch(/^3\.\d+ .+: Pc = .+ kip$/);
    expect(text).not.toContain('\n');
  });
});
