import { describe, expect, it } from 'vitest';
import { expectReach, nothingSeen, proveRandomMembers } from './prove-random.ts';

/*
 * Closure and verification of 200 random members over everything that a member may have; the other
 * 200 are in a file of their own, beside it. Structural: no expected values.
 */
describe('200 random members', () => {
  const seen = nothingSeen();
  it.each([0, 1, 2, 3])('close and verify, part %i', { timeout: 240_000 }, (part) => {
    const before = seen.lines;
    proveRandomMembers(512 + part, 50, seen);
    expect(seen.lines).toBeGreaterThan(before);
  });
  it('reach every chapter and every verdict', () => expectReach(seen));
});
