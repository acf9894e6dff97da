import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { expectAccessible } from './axe.ts';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();

const held = (page: Page, place: string, hold: string) =>
  page
    .getByRole('group', { name: `Held at ${place}` })
    .getByRole('button', { name: hold, exact: true });

const pressed = async (page: Page, place: string) =>
  page
    .getByRole('group', { name: `Held at ${place}` })
    .locator('[aria-pressed=true]')
    .allInnerTexts();

const focusedId = (page: Page) => page.evaluate(() => document.activeElement?.id ?? '');

/** The inputs, where no sheet stands beside them. */
async function expectInputsAccessible(page: Page) {
  await page.getByRole('button', { name: 'Forces', exact: true }).click();
  await page.getByRole('button', { name: 'Paste a table' }).waitFor();
  await expectAccessible(page, 'inputs', 'aside[aria-label=Inputs]');
  await page.getByRole('button', { name: 'Sheet', exact: true }).click();
}

/** The same member from the server, with the forces of its first combination. */
const openAgain = (page: Page) => page.goto(`${page.url().split('?')[0]}?combination=c1`);

describe('a member as it is built', () => {
  it('keeps three points held and a point load over a reload, in order, by keyboard too', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-06');
    for (const name of ['Lcx', 'Lcy', 'Lcz', 'Lb']) await input(page, name).fill('');
    await page.getByRole('button', { name: 'held points' }).press('Enter');
    await expect.poll(() => focusedId(page)).toBe('input-restraints-0-at');
    await page.keyboard.type('12 ft');
    await held(page, '12 ft', 'centre').press('Space');
    await held(page, '12 ft', 'twist').press('Space');
    await page.getByRole('button', { name: 'Add a point' }).press('Enter');
    await expect.poll(() => focusedId(page)).toBe('input-restraints-1-at');
    await page.keyboard.type('4 ft');
    await page.getByText(/Point r2, what it holds/).waitFor();
    await held(page, '4 ft', 'top').click();
    await page.getByRole('button', { name: 'Add a point' }).click();
    await expect.poll(() => focusedId(page)).toBe('input-restraints-2-at');
    await page.keyboard.type('8 ft');
    await held(page, '8 ft', 'top').click();
    await held(page, '8 ft', 'bottom').click();

    await page.getByRole('button', { name: 'loads between the ends' }).click();
    await input(page, 'combinations[0].loads[0].kind').selectOption('point');
    await input(page, 'combinations[0].loads[0].W').fill('11 kip');
    await input(page, 'combinations[0].loads[0].at').fill('9 ft');
    const height = page.getByRole('group', { name: 'Load 1 acts at' });
    await height.getByRole('button', { name: 'top' }).click();
    await expect.poll(() => page.getByText(/shows the last valid inputs/).count()).toBe(0);

    const expectAll = async () => {
      const places = ['4 ft', '8 ft', '12 ft'];
      for (const [index, place] of places.entries()) {
        await expect.poll(() => input(page, `restraints[${index}].at`).inputValue()).toBe(place);
      }
      expect(await pressed(page, '4 ft')).toEqual(['top']);
      expect(await pressed(page, '8 ft')).toEqual(['top', 'bottom']);
      expect(await pressed(page, '12 ft')).toEqual(['centre', 'twist']);
      const load = 'combinations[0].loads[0]';
      expect(await input(page, `${load}.kind`).inputValue()).toBe('point');
      expect(await input(page, `${load}.W`).inputValue()).toBe('11 kip');
      expect(await input(page, `${load}.at`).inputValue()).toBe('9 ft');
      expect(await height.locator('[aria-pressed=true]').allInnerTexts()).toEqual(['top']);
    };
    await expectAll();
    // The longest stretches between points held sideways and against twist: 18 − 12 ft, 8 ft.
    const follows = (name: string) => input(page, name).getAttribute('placeholder');
    expect(Number.parseFloat((await follows('Lcy')) ?? '')).toBe(6);
    expect(Number.parseFloat((await follows('Lcz')) ?? '')).toBe(8);
    expect(Number.parseFloat((await follows('Lcx')) ?? '')).toBe(18);
    await expectInputsAccessible(page);
    await saved(page);
    await openAgain(page);
    await page.locator('[data-line]').first().waitFor();
    await expectAll();

    await input(page, 'Lcy').fill('9 ft');
    await page
      .getByText(/has to say why/)
      .first()
      .waitFor();
    await page.getByRole('button', { name: /^Source of Buckling L c y/ }).click();
    await page.getByLabel(/^Note/).fill('girt at 4 ft is removable');
    await page.getByRole('button', { name: 'Done' }).click();
    await expect.poll(() => page.getByText(/has to say why/).count()).toBe(0);
    await saved(page);

    await page.getByRole('button', { name: 'Delete the point at 8 ft' }).click();
    await expect.poll(() => page.getByRole('group', { name: /^Held at/ }).count()).toBe(2);
    await page.keyboard.press('Control+z');
    await expect.poll(() => page.getByRole('group', { name: /^Held at/ }).count()).toBe(3);
    await page.getByRole('button', { name: 'Remove held between the ends' }).click();
    await page.getByText(/Lcx.*is needed/).waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await expectAll();
    await saved(page);
  });

  it('asks for the moments over a point that holds a plane it bends in', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-05');
    await page.getByRole('button', { name: 'held points' }).click();
    await input(page, 'restraints[0].at').fill('7 ft');
    await held(page, '7 ft', 'in plane').click();
    const over = input(page, 'combinations[0].supports[r1].Mx');
    await over.fill('30 kip ft');
    await saved(page);
    await openAgain(page);
    await expect
      .poll(() => input(page, 'combinations[0].supports[0].Mx').inputValue())
      .toBe('30 kip ft');
    await input(page, 'restraints[0].at').fill('6 ft');
    await page.getByRole('textbox', { name: 'Major, at 6 ft' }).waitFor();
    await page.getByRole('button', { name: 'Delete the point at 6 ft' }).click();
    await expect.poll(() => page.getByText('Moments over the held points').count()).toBe(0);
    await page.getByRole('button', { name: 'Remove held between the ends' }).click();
    await saved(page);
  });

  it('takes a section by its sizes, with its outline, and calls it by them', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-09');
    await page.getByRole('button', { name: 'sizes of its own' }).click();
    await expect.poll(() => focusedId(page)).toBe('input-section-d');
    for (const [size, text] of Object.entries({ d: '14 in', bf: '10 in', tf: '1 in' })) {
      await input(page, `section.${size}`).fill(text);
    }
    await input(page, 'section.tw').fill('11 in');
    await page
      .getByText(/less than bf/)
      .first()
      .waitFor();
    await input(page, 'section.tw').fill('0.5 in');
    await page
      .locator('aside')
      .getByRole('img', { name: /Outline/ })
      .waitFor();
    await page.getByRole('heading', { name: /C-09 · Built-up I 14 in × 10 in/ }).waitFor();
    await expectInputsAccessible(page);
    await saved(page);
    await page.reload();
    await expect.poll(() => input(page, 'section.tw').inputValue()).toBe('0.5 in');
    await page.getByRole('link', { name: 'Members', exact: true }).click();
    await page.getByRole('row', { name: /C-09.*Built-up I 14 in/ }).waitFor();
    await page.getByRole('rowheader', { name: 'C-09', exact: true }).getByRole('link').click();
    await input(page, 'section').selectOption('tube');
    await input(page, 'section.Ht').fill('10 in');
    await input(page, 'section.B').fill('8 in');
    await input(page, 'section.t').fill('0.5 in');
    await page.getByText(/what the wall is/).waitFor();
    expect(await input(page, 'section.wall').getAttribute('aria-invalid')).toBe('true');
    await input(page, 'section.wall').selectOption('design');
    await page.getByRole('heading', { name: /C-09 · Tube 10 in × 8 in/ }).waitFor();
    await input(page, 'section').selectOption('from the tables');
    await expect.poll(() => input(page, 'section').inputValue()).toBe('W10×33');
    await saved(page);
  });

  it('gives the sway of the story where the basis takes it by B2, and keeps it', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-10');
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Do the stories sway?').selectOption('B2');
    await page.getByText('B2 belongs to first-order moments').waitFor();
    await page.getByLabel('Second-order moments').selectOption('amplified');
    await page.getByLabel(/^Second-order over first-order drift/).fill('0.8');
    await page.getByText('Second-order drift is not below first-order drift').waitFor();
    await page.getByLabel(/^Second-order over first-order drift/).fill('1.3');
    await page.getByLabel(/Stresses added at the points/).check();
    await saved(page);
    await page.reload();
    await expect.poll(() => page.getByLabel('Do the stories sway?').inputValue()).toBe('B2');
    expect(await page.getByLabel(/Stresses added at the points/).isChecked()).toBe(true);
    await page.goBack();
    await page.getByRole('button', { name: 'sway', exact: true }).click();
    await page.getByRole('button', { name: 'sway that bends about x' }).click();
    const sway = 'combinations[0].sway.x';
    await expect.poll(() => focusedId(page)).toBe('input-combinations-0-sway-x-MA');
    await page.keyboard.type('12 kip ft');
    await page.getByText(/sway about x, load P story/).waitFor();
    await input(page, `${sway}.Pstory`).fill('800 kip');
    await input(page, `${sway}.H`).fill('20 kip');
    await input(page, `${sway}.height`).fill('24 ft');
    await input(page, `${sway}.drift`).fill('0.4 in');
    await page.getByText(/sway about x, what moment frames carry/).waitFor();
    await input(page, `${sway}.frames`).selectOption('braced');
    await expect.poll(() => page.getByText(/what moment frames carry/).count()).toBe(0);
    await expectInputsAccessible(page);
    await saved(page);
    await openAgain(page);
    await expect.poll(() => input(page, `${sway}.drift`).inputValue()).toBe('0.4 in');
    expect(await input(page, `${sway}.frames`).inputValue()).toBe('braced');
    await page.getByRole('link', { name: 'Basis', exact: true }).click();
    await page.getByLabel('Do the stories sway?').selectOption('none');
    await page.getByLabel('Second-order moments').selectOption('exact');
    await saved(page);
  });

  it('has joints, net section, stiffeners, springs and shears under plain headings', async () => {
    const { page } = await stage.openAs(engineer);
    await openMember(page, 'C-08');
    await page.getByRole('button', { name: 'joints by alignment chart' }).click();
    await input(page, 'charts.x.sidesway').selectOption('inhibited');
    await input(page, 'charts.x.GA').fill('10');
    await input(page, 'charts.x.GB').fill('1');
    await page.getByRole('button', { name: 'a net section' }).click();
    await input(page, 'netSection.An').fill('18 in²');
    await input(page, 'netSection.U').fill('0.9');
    await page.getByRole('button', { name: 'web stiffeners' }).click();
    await input(page, 'stiffeners').fill('30 in');
    await page.getByRole('button', { name: 'shear forces', exact: true }).click();
    await input(page, 'combinations[0].Vx').fill('24 kip');
    await input(page, 'ends').selectOption('springs');
    await input(page, 'springs.xA').fill('9000 kip ft/rad');
    await expectInputsAccessible(page);
    await saved(page);
    await openAgain(page);
    const kept = {
      ...{ 'charts.x.GA': '10', 'netSection.U': '0.9', stiffeners: '30 in' },
      ...{ 'combinations[0].Vx': '24 kip', 'springs.xA': '9000 kip ft/rad' },
    };
    for (const [path, text] of Object.entries(kept)) {
      await expect.poll(() => input(page, path).inputValue(), { message: path }).toBe(text);
    }
    await page.getByRole('button', { name: 'Forces', exact: true }).click();
    expect(await page.getByLabel('Shear, major of', { exact: false }).first().inputValue()).toBe(
      '24 kip',
    );
    await page.getByRole('button', { name: 'Remove net section' }).click();
    await expect.poll(() => input(page, 'netSection.U').count()).toBe(0);
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect.poll(() => input(page, 'netSection.U').inputValue()).toBe('0.9');
  });
});
