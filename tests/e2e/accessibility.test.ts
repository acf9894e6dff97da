import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { engineer, openMember, openStage, reviewer } from './stage.ts';

const stage = openStage();
const widths = [1280];

const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

async function expectAccessible(page: Page, what: string) {
  const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
  const found = violations.map(
    ({ id, nodes }) =>
      `${what}: ${id} at ${nodes.map(({ target }) => target.join(' ')).join(', ')}`,
  );
  expect(found).toEqual([]);
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(overflow, `${what} is wider than its window`).toBeLessThanOrEqual(0);
}

describe.each(widths)('at %i px', (width) => {
  it('the sign-in page is accessible', async () => {
    const { page } = await stage.open({ width });
    await page.goto('/');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await expectAccessible(page, 'sign-in');
  });

  it('desk, project, calculation, basis, report, account, gallery and a missing page are', async () => {
    const { page } = await stage.openAs(engineer, { width });
    await expectAccessible(page, 'desk');
    await page.getByRole('button', { name: 'New project' }).click();
    await expectAccessible(page, 'new project');
    await page.getByRole('button', { name: 'Cancel' }).click();
    const projects = page.getByRole('table', { name: 'Projects', exact: true });
    await projects.getByRole('link').first().click();
    await page.getByRole('heading', { name: 'Drawings' }).waitFor();
    await expectAccessible(page, 'project');
    await page.getByRole('button', { name: 'Add a drawing' }).click();
    await expectAccessible(page, 'project with a drawing being added');
    await page.getByRole('link', { name: 'TQ-CAL-012' }).click();
    await page.getByRole('table', { name: 'Members' }).waitFor();
    await expectAccessible(page, 'calculation');
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Building code').waitFor();
    await expectAccessible(page, 'basis');
    await page.getByRole('link', { name: 'Report', exact: true }).click();
    await page.getByRole('heading', { name: 'Results' }).waitFor();
    await expectAccessible(page, 'report');
    await page.goto('/account');
    await page.getByLabel('Present password').waitFor();
    await expectAccessible(page, 'account');
    await page.goto('/gallery');
    await page.getByText('One line of every kind').waitFor();
    await expectAccessible(page, 'gallery');
    await page.goto('/nowhere');
    await page.getByText('No page at this address').waitFor();
    await expectAccessible(page, 'missing page');
  });

  it('the member page is, with a trace, a source, refused inputs, sections and forces', async () => {
    const { page } = await stage.openAs(engineer, { width });
    await openMember(page, 'C-07');
    await expectAccessible(page, 'member');
    await page.locator('[data-line="c1:H1/ratio"]').click();
    await page.getByRole('heading', { name: /Trace of line/ }).waitFor();
    await expectAccessible(page, 'trace');
    await page.getByRole('button', { name: /Source of Unbraced/ }).click();
    await page.getByText('On what grounds').waitFor();
    await expectAccessible(page, 'source');
    await page.keyboard.press('Escape');
    await page.locator('#input-section').fill('w14');
    await page.getByRole('option').first().waitFor();
    await expectAccessible(page, 'sections');
    await page.keyboard.press('Escape');
    await page.getByText(/The sheet shows the last valid inputs/).waitFor();
    await expectAccessible(page, 'refused input');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('button', { name: 'Forces', exact: true }).click();
    await expectAccessible(page, 'forces');
    await page.getByRole('button', { name: 'Paste a table' }).click();
    await page.getByLabel(/Paste the table here/).fill('Name\tP (kip)\nA\t1,0\n');
    await page.getByText('want correcting afterwards').waitFor();
    await expectAccessible(page, 'paste');
  });

  it('the pages of a reviewer, who may only read, are', async () => {
    const { page } = await stage.openAs(reviewer, { width });
    await openMember(page, 'C-07');
    await expectAccessible(page, 'member to read');
  });
});
