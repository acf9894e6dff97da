import { expect, test } from 'vitest';
import manifest from '../../package.json' with { type: 'json' };
import lock from '../../package-lock.json' with { type: 'json' };

// Two copies would set the same formula in two ways: the screen and the PDF must not differ.
test('the lock file holds one katex, of the version in package.json', () => {
  const copies = Object.entries(lock.packages).filter(([path]) =>
    /(^|\/)node_modules\/katex$/.test(path),
  );
  expect(copies.map(([path]) => path)).toEqual(['node_modules/katex']);
  expect(copies[0]?.[1].version).toBe(manifest.dependencies.katex);
});
