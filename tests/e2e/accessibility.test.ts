import { describe, expect, it } from 'vitest';
import { expectAccessible } from './axe.ts';
import { engineer, openMember, openStage, reviewer } from './stage.ts';

const stage = openStage();

describe('each screen is accessible (axe, WCAG 2.2 AA)', () => {
  it('sign-in', async () => {
    const { page } = await stage.open();
    await page.goto('/');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await expectAccessible(page, 'sign-in');
  });

  it('desk, project, calculation, basis, report, account, gallery and a missing page', async () => {
    const { page } = await stage.openAs(engineer);
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
    await page.getByRole('checkbox', { name: 'Choose C-05' }).check();
    await page.getByRole('button', { name: 'Change it' }).click();
    await page.getByLabel('What changes').selectOption('Sources and state of values');
    await expectAccessible(page, 'several members, changed');
    await page.getByRole('button', { name: 'Back to the list' }).click();
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Building code').waitFor();
    await expectAccessible(page, 'basis');
    await page.getByRole('link', { name: 'Report', exact: true }).click();
    await page.getByRole('heading', { name: 'Summary of results' }).waitFor();
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

  it('the library, what a search finds, and a clause', async () => {
    const { page } = await stage.openAs(engineer);
    await page.goto('/library');
    await page.getByLabel('Find a formula').waitFor();
    await expectAccessible(page, 'library');
    await page.getByLabel('Find a formula').fill('E3-');
    await page.locator('[data-formula]').first().waitFor();
    await expectAccessible(page, 'formulas found');
    await page.goto('/library/aisc360-22/E3#aisc360-22%2FE3-2');
    await page.locator('[data-published]').first().waitFor();
    await page.getByText(/values that follow from this clause/).click();
    await expectAccessible(page, 'clause');
  });

  it('a sheet with a trace', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-09');
    await page.locator('[data-line="E1/Pc"] .line-value').click();
    await page.getByRole('heading', { name: /Trace of line/ }).waitFor();
    await expectAccessible(page, 'member and trace');
  });

  it('the inputs beside a sheet, with a source, sections, parts, refused inputs and forces', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-07');
    await page.getByRole('button', { name: 'Forces', exact: true }).click();
    await page.getByRole('button', { name: 'Paste a table' }).waitFor();
    await expectAccessible(page, 'forces');
    await page.getByRole('button', { name: /Source of Unbraced/ }).click();
    await page.getByText('On what grounds').waitFor();
    await expectAccessible(page, 'source', '[role=dialog]');
    await page.keyboard.press('Escape');
    await page.locator('#input-section').fill('w14');
    await page.locator('[role=option]').first().waitFor();
    await expectAccessible(page, 'sections', '[role=dialog]');
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: 'held points' }).click();
    await page.getByRole('button', { name: 'loads between the ends' }).click();
    await page.getByText(/what it holds/).waitFor();
    await expectAccessible(page, 'parts of a member', 'aside[aria-label=Inputs]');
    await page.getByRole('button', { name: 'Remove held between the ends' }).click();
    await page.getByRole('button', { name: 'Remove loads between the ends' }).click();
    await page.getByText(/The sheet shows the last valid inputs/).waitFor();
    await expectAccessible(page, 'refused input');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('button', { name: 'Paste a table' }).click();
    await page.getByLabel(/Paste the table here/).fill('Name\tP (kip)\nA\t1,0\n');
    await page.getByText('want correcting afterwards').waitFor();
    await expectAccessible(page, 'paste', 'dialog');
  });

  it('the section finder', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-05');
    await page.getByRole('button', { name: 'Find a section' }).click();
    await page.getByText(/tried, the lightest first/).waitFor({ timeout: 60_000 });
    await page.getByRole('button', { name: /^Take/ }).first().click();
    await page.getByText(/C-05 is .* now/).waitFor();
    await expectAccessible(page, 'section finder');
  });

  it('the member page of a reviewer, who may only read, with every section folded', async () => {
    const { page } = await stage.openAs(reviewer);
    await openMember(page, 'C-09');
    await page.locator('[data-line]:visible').first().focus();
    await page.keyboard.press('Shift+F');
    await expect.poll(() => page.locator('[data-section][aria-expanded=true]').count()).toBe(0);
    await expectAccessible(page, 'member to read');
  });
});

describe('at 1024, 1280 and 1600 px', () => {
  it('no page is wider than its window', async () => {
    const { page } = await stage.openAs(engineer);
    const expectFits = async (what: string) => {
      for (const width of [1024, 1280, 1600]) {
        await page.setViewportSize({ width, height: 860 });
        const over = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
        expect(over, `${what} at ${width} px`).toBeLessThanOrEqual(0);
      }
    };
    await expectFits('desk');
    await openMember(page, 'C-05');
    await expectFits('member');
    await page.locator('[data-line="c1:H1/ratio"]').click();
    await page.getByRole('heading', { name: /Trace of line/ }).waitFor();
    await expectFits('trace');
    await page.getByRole('button', { name: 'Forces', exact: true }).click();
    await expectFits('forces');
    await page.getByRole('link', { name: 'Members', exact: true }).click();
    await page.getByRole('table', { name: 'Members' }).waitFor();
    await expectFits('calculation');
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Building code').waitFor();
    await expectFits('basis');
    await page.goto('/library/aisc360-22/H1.1');
    await page.locator('[data-published]').first().waitFor();
    await expectFits('clause');
    await page.goto('/library?q=moment');
    await page.locator('[data-formula]').first().waitFor();
    await expectFits('library');
  });
});
