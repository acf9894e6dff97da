import { expect, test } from 'vitest';
import manifest from '../../package.json' with { type: 'json' };

const exact = /^\d+\.\d+\.\d+(-[\w.]+)?$/;

test.each(['dependencies', 'devDependencies'] as const)('%s are exact versions', (kind) => {
  const loose = Object.entries(manifest[kind]).filter(([, version]) => !exact.test(version));
  expect(Object.keys(manifest[kind])).not.toHaveLength(0);
  expect(loose).toEqual([]);
});

test.each(['^1.2.3', '~1.2.3', '1.2', '*', 'latest', '>=1.2.3', '1.2.3 || 2.0.0'])(
  '%s counts as loose',
  (version) => expect(version).not.toMatch(exact),
);
