import { describe, expect, it } from 'vitest';
import type { LineOf } from '#shared/calc/line.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { checkCheck } from './check.ts';
import { checkChoice } from './choice.ts';
import type { LineContext } from './line-context.ts';

const source = { kind: 'typed' } as const;

/** A record of a check and a choice of two lengths, as the recorder writes them. */
function lines(left: number, right: number) {
  const r = createRecorder('');
  const [l, u] = [left, right].map((value, i) =>
    r.given(
      ['given/l', 'given/u'][i] as string,
      'L',
      'length',
      { value, text: `${value} mm`, source, confirmed: true },
      { title: 'L' },
    ),
  );
  if (!l || !u) throw new Error('two lengths');
  r.check('check', l, u, { title: 'Check' });
  r.choice('choice', [{ left: l, relation: '<=', right: u, outcome: 'so' }], 'not so', {
    title: 'Choice',
  });
  const context = {
    valued: (ref: string) => r.lines.find(({ key }) => key === ref) ?? null,
  } as unknown as LineContext;
  const [check, choice] = r.lines.slice(2) as [LineOf<'check'>, LineOf<'choice'>];
  return { check, choice, context };
}

describe('equal values in a check and a choice', () => {
  const { check, choice, context } = lines(3657.6 * (1 + 1e-13), 3657.6);
  it('have the ratio 1 and are equal', () => {
    expect([...checkCheck(check, context)]).toEqual([]);
    expect([...checkChoice(choice, context)]).toEqual([]);
  });
  it('any other ratio is a fault', () => {
    const [reason] = checkCheck({ ...check, ratio: 1 + 1e-13 }, context);
    expect(reason).toContain('its lines give 1');
  });
  it('an order between them is a fault', () => {
    const tried = choice.tried.map((c) => ({ ...c, holds: false }));
    expect([...checkChoice({ ...choice, tried }, context)].join()).toContain('is false');
  });
});

it('values that 12 digits tell apart are not equal', () => {
  const { check, choice, context } = lines(3657.60000001, 3657.6);
  expect([...checkCheck(check, context)]).toEqual([]);
  expect([...checkChoice(choice, context)]).toEqual([]);
  expect([...checkCheck({ ...check, ratio: 1, verdict: 'OK' }, context)]).not.toEqual([]);
  const tried = choice.tried.map((c) => ({ ...c, holds: true }));
  expect([...checkChoice({ ...choice, tried }, context)]).not.toEqual([]);
});
