import { describe, expect, it } from 'vitest';
import { engineer, openStage } from './stage.ts';

const stage = openStage();
const refused = (text: string) => /status of 401/.test(text);

describe('signing in', () => {
  it('refuses a wrong password in words and keeps the address', async () => {
    const { page } = await stage.open({ expected: refused });
    await page.goto('/');
    await page.getByLabel('E-mail address').fill('ines.marlow@harrow-pike.example');
    await page.getByLabel('Password', { exact: true }).fill('not the password');
    await page.getByRole('button', { name: 'Sign in', exact: true }).first().click();
    await page
      .getByRole('alert')
      .getByText('The e-mail address or the password is wrong')
      .waitFor();
    expect(await page.getByLabel('E-mail address').inputValue()).toBe(
      'ines.marlow@harrow-pike.example',
    );
  });

  it('says which field is missing beside it', async () => {
    const { page } = await stage.open();
    await page.goto('/');
    await page.getByRole('button', { name: 'Sign in', exact: true }).first().click();
    const email = page.getByLabel('E-mail address');
    expect(await email.getAttribute('aria-invalid')).toBe('true');
    const described = await email.getAttribute('aria-describedby');
    expect(await page.locator(`[id="${described}"]`).textContent()).toContain('wanted');
  });

  it('leads an engineer of the demo to the desk, and out again', async () => {
    const { page } = await stage.open();
    await page.goto('/');
    await page.getByRole('button', { name: `Sign in as ${engineer}` }).click();
    await page.getByRole('heading', { name: 'Waits for you' }).waitFor();
    expect(await page.getByRole('link', { name: 'TQ-CAL-012' }).count()).toBeGreaterThan(0);
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
  });

  it('asks at the address that was wanted, and goes on there', async () => {
    const { page } = await stage.open();
    await page.goto('/account');
    await page.getByRole('button', { name: `Sign in as ${engineer}` }).click();
    await page.getByLabel('Present password').waitFor();
    expect(new URL(page.url()).pathname).toBe('/account');
  });

  it('shows a page of its own where there is nothing', async () => {
    const { page } = await stage.openAs(engineer, { expected: (text) => /404/.test(text) });
    for (const path of [
      '/nothing',
      `/projects/${crypto.randomUUID()}`,
      `/calculations/${crypto.randomUUID()}`,
    ]) {
      await page.goto(path);
      await page.getByRole('heading', { name: /at this address/ }).waitFor();
      await page.getByRole('link', { name: 'To your desk' }).waitFor();
    }
  });
});
