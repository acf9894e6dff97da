import { describe, expect, it } from 'vitest';
import { engineer, input, openMember, openStage, saved } from './stage.ts';

const stage = openStage();
const cut = (text: string) => /ERR_INTERNET_DISCONNECTED|Failed to load/.test(text);

describe('input that no server has yet', () => {
  it('is kept over a lost connection and a reload, and saved when the server answers', async () => {
    const { page, context } = await stage.openAs(engineer, { expected: cut });
    await openMember(page, 'C-07');
    await page.route('**/api/**', (route) =>
      route.request().method() === 'PUT' ? route.abort('internetdisconnected') : route.continue(),
    );
    await input(page, 'place').fill('grid 4/C');
    await page.getByRole('button', { name: 'not saved, try now' }).waitFor();
    await page.reload();
    await expect.poll(() => input(page, 'place').inputValue()).toBe('grid 4/C');
    await page.getByText(/that was not saved yet was brought back/).waitFor();
    await page.getByRole('button', { name: 'not saved, try now' }).waitFor();
    await page.unroute('**/api/**');
    await saved(page);
    const other = await context.newPage();
    await other.goto(page.url());
    await expect.poll(() => input(other, 'place').inputValue()).toBe('grid 4/C');
  });
});
