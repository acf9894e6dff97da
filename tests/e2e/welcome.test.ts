import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';
import { openStage } from './stage.ts';

const stage = openStage();
const run = promisify(execFile);

describe('the one-time link of a new firm', () => {
  it('sets the first password, opens an empty desk, and opens nothing a second time', async () => {
    const { stdout } = await run(
      'node',
      ['--import', 'tsx', 'server/cli/firm-create.ts', 'Alder Yard', 'anna@alder-yard.example'],
      {
        env: { ...process.env, DATABASE_URL: stage.databaseUrl, PUBLIC_ORIGIN: stage.origin },
      },
    );
    const link = /http\S+\/welcome\/\S+/.exec(stdout)?.[0] ?? '';
    const { page } = await stage.open({ expected: (text) => /status of 404/.test(text) });
    await page.goto(link);
    await page.getByLabel('New password').fill('short');
    await page.getByLabel('The same once more').fill('another');
    await page.getByRole('button', { name: 'Set the password and go in' }).click();
    await page.getByText('The two are not the same').waitFor();
    await page.getByLabel('New password').fill('alder yard first');
    await page.getByLabel('The same once more').fill('alder yard first');
    await page.getByRole('button', { name: 'Set the password and go in' }).click();
    await page.getByText('You are in no project yet').waitFor();
    await page.getByText('Nothing waits for you').waitFor();

    await page.getByRole('button', { name: 'New project' }).click();
    await page.getByLabel('Number').fill('A-1');
    await page.getByLabel('Title').fill('Boat shed');
    await page.getByRole('button', { name: 'Open the project' }).click();
    await page.getByText('No calculation has been begun in this project.').waitFor();
    await page.getByText('No drawings yet.').waitFor();

    await page.goto(link);
    await page.getByText('This link opens nothing any more').waitFor();
  });

  it('lets the person change the password afterwards', async () => {
    const { page } = await stage.open({ expected: (text) => /status of 400/.test(text) });
    await page.goto('/account');
    await page.getByLabel('E-mail address').fill('anna@alder-yard.example');
    await page.getByLabel('Password', { exact: true }).fill('alder yard first');
    await page.getByRole('button', { name: 'Sign in', exact: true }).first().click();
    await page.getByLabel('Present password').fill('not this one');
    await page.getByLabel('New password').fill('alder yard second');
    await page.getByLabel('The same once more').fill('alder yard second');
    await page.getByRole('button', { name: 'Change the password' }).click();
    await page.locator('[data-problem]').waitFor();
    expect(await page.getByLabel('Present password').getAttribute('aria-invalid')).toBe('true');
    await page.getByLabel('Present password').fill('alder yard first');
    await page.getByRole('button', { name: 'Change the password' }).click();
    await page.getByText('Password changed').waitFor();
    expect(await page.getByLabel('Present password').inputValue()).toBe('');
  });
});
