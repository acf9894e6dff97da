import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { engineer, input, openStage, saved } from './stage.ts';

/*
 * Example H.1B, W-shape subject to combined compression and bending about both axes, LRFD:
 * Companion to the AISC Steel Construction Manual, Volume 1: Design Examples, Version 16.0,
 * American Institute of Steel Construction, 2023, pages H-4 to H-5. The interaction by H1-1a is
 * printed there as 0.929.
 */
const lengths = '14 ft';
const forces = {
  P: '400 kip',
  MxA: '250 kip ft',
  MxB: '250 kip ft',
  MyA: '80 kip ft',
  MyB: '80 kip ft',
};
const example = {
  ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units: 'us' },
  analysis: {
    method: 'direct',
    secondOrder: 'from-analysis',
    includesMemberEffect: true,
    sway: 'none',
  },
  members: [
    {
      ...{
        mark: 'H.1B',
        section: 'W14X99',
        material: 'A992',
        ends: 'held',
        endMomentSign: 'bending',
      },
      ...{ length: lengths, Lcx: lengths, Lcy: lengths, Lcz: lengths, Lb: lengths, Cb: 1 },
      combinations: [{ name: 'required', ...forces }],
    },
  ],
};

const stage = openStage();
const run = promisify(execFile);
let folder: string;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'stanchion-example-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function hashByCommandLine(file: string): Promise<string> {
  const { stdout } = await run('npm', ['run', '--silent', 'calc', '--', file], {
    maxBuffer: 64 * 1024 * 1024,
  });
  return (JSON.parse(stdout) as { resultHash: string }).resultHash;
}

describe('Example H.1B typed into the browser', () => {
  it('gives the published ratio and the hash of the command line, also from its own INPUT.json', async () => {
    const { page } = await stage.openAs(engineer);
    await page
      .getByRole('table', { name: 'Projects', exact: true })
      .getByRole('link')
      .first()
      .click();
    await page.getByRole('button', { name: 'New calculation' }).click();
    await page.getByLabel('Number').fill('TQ-CAL-900');
    await page.getByLabel('Title').fill('Published example');
    await page.getByRole('button', { name: 'Begin the calculation' }).click();
    await page.getByLabel('Method').selectOption('direct');
    await page.getByLabel('Second-order moments').selectOption('from-analysis');
    await page.getByLabel(/own second-order effect/).selectOption('yes');
    await saved(page);
    await page.getByRole('link', { name: 'Members', exact: true }).click();
    await page.getByRole('button', { name: 'Add a member' }).click();
    await page.getByText(/No sheet yet/).waitFor();

    await input(page, 'mark').fill('H.1B');
    await input(page, 'section').fill('14x99');
    await page.getByRole('option', { name: 'W14×99' }).click();
    await input(page, 'material').selectOption('A992');
    for (const name of ['length', 'Lcx', 'Lcy', 'Lcz', 'Lb']) await input(page, name).fill(lengths);
    await input(page, 'Cb').fill('1');
    await input(page, 'combinations[0].name').fill('required');
    for (const [name, value] of Object.entries(forces)) {
      await input(page, `combinations[0].${name}`).fill(value);
    }
    await input(page, 'endMomentSign').selectOption('bending');
    await page.locator('.sheet-verdict[data-verdict="OK"]').waitFor();
    // The sheet stood before the last of these inputs was typed.
    await expect.poll(() => page.locator('.verdict-ratio').textContent()).toBe('0.929');
    await saved(page);

    await page.getByRole('link', { name: 'Report', exact: true }).click();
    const typed = await page
      .locator('dt', { hasText: 'Results, SHA-256' })
      .locator('xpath=following-sibling::dd')
      .textContent();
    expect(typed).toMatch(/^[0-9a-f]{64}$/);

    const file = join(folder, 'INPUT.json');
    await writeFile(file, JSON.stringify(example));
    expect(await hashByCommandLine(file)).toBe(typed);

    const [fromPage] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('button', { name: 'INPUT.json' }).click(),
    ]);
    const own = join(folder, 'own.json');
    await fromPage.saveAs(own);
    expect(await hashByCommandLine(own)).toBe(typed);

    const [report] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('button', { name: 'Report as PDF' }).click(),
    ]);
    const pdf = join(folder, 'report.pdf');
    await report.saveAs(pdf);
    expect((await readFile(pdf)).subarray(0, 5).toString()).toBe('%PDF-');
  });
});
