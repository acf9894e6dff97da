import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

const values = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/**
 * The whole page, or only the part that changed since it was looked at as a whole. The time goes
 * with the elements of the page, also those outside the part: a sheet has ten thousand. So what
 * stands beside a sheet is looked at where none is shown, and of what passes nothing is reported
 * (`resultTypes`; without frames one run in the page does, which is the legacy mode).
 */
export async function expectAccessible(page: Page, what: string, part?: string) {
  const builder = new AxeBuilder({ page }).setLegacyMode(true);
  const { violations } = await (part ? builder.include(part) : builder)
    .options({ runOnly: { type: 'tag', values }, resultTypes: ['violations'] })
    .analyze();
  const found = violations.map(
    ({ id, nodes }) =>
      `${what}: ${id} at ${nodes.map(({ target }) => target.join(' ')).join(', ')}`,
  );
  expect(found).toEqual([]);
}
