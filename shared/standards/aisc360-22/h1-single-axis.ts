import type { LineOf } from '../../calc/line.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { type Flexure, interaction, separateChecks } from './h1.ts';
import { clause, formula } from './writer.ts';

// H1.3 doubly symmetric rolled compact members in compression and flexure about the major axis: an
// optional check in the plane of bending and out of it, in place of H1.1.
export const h1SingleAxisFormulas = {
  minorShare: formula({
    id: 'H1.3-Mry/Mcy',
    clause: 'H1.3',
    title: 'Use of the minor-axis flexural strength',
    symbol: 'MryMcy',
    dimension: 'none',
    expression: 'Mry/Mcy',
    operands: { Mry: 'moment', Mcy: 'moment' },
    prints: 'display',
  }),
  outOfPlane: formula({
    id: 'H1-3',
    clause: 'H1.3',
    equation: 'H1-3',
    title: 'Interaction out of the plane of bending',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/Pc*(1.5-0.5*Pr/Pc)+(Mrx/(Cb*Mcx))^2',
    operands: { Pr: 'force', Pc: 'force', Mrx: 'moment', Cb: 'none', Mcx: 'moment' },
    prints: 'display',
    ratio: true,
    validity:
      'for rolled compact doubly symmetric members bent about the major axis, where Lcz ≤ Lcy and Mry/Mcy < 0.05',
  }),
};

/** A width-to-thickness ratio with its compact limit in flexure (Table B4.1b). */
interface Element {
  readonly lambda: Quantity;
  readonly lambdap: Quantity;
}

export interface SingleAxis {
  readonly shape: 'a doubly symmetric rolled I-shape' | 'another shape';
  readonly flange: Element;
  readonly web: Element;
  readonly Lcy: Quantity;
  readonly Lcz: Quantity;
  /** Required compressive strength, positive. */
  readonly Pr: Quantity;
  /** Available compressive strength: the governing one, in the plane of bending, and out of it. */
  readonly Pc: Quantity;
  readonly Pcx: Quantity;
  readonly Pcy: Quantity;
  /** Required major-axis moment with the available strength of H1.1 (with Cb). */
  readonly x: Flexure;
  /** Available major-axis strength in yielding, φb Mp or Mp/Ωb. */
  readonly yielding: Quantity;
  /** Available major-axis strength in lateral-torsional buckling with Cb = 1. */
  readonly Mcx1: Quantity;
  readonly Cb: Quantity;
  /** Minor-axis moment with its available strength; null without a moment. */
  readonly y: Flexure | null;
}

/**
 * H1.3 where its conditions hold: both checks, the strengths by themselves (H1-3 falls again for
 * Pr beyond 1.5 Pcy), and the utilisation by H1.1 for comparison, without a check. null where a
 * condition doesn't hold: H1.1 then decides, and nothing of it is written yet.
 */
export function singleAxisChecks(r: Recorder, q: SingleAxis): LineOf<'check'>[] | null {
  if (!applies(r, q)) return null;
  const { Pr, Pc, Pcx, Pcy, x, yielding, Mcx1, Cb, y } = q;
  const at = 'H1.3/in-plane';
  const inPlane = interaction(r, at, { Pr, Pc: Pcx }, { Mr: x.Mr, Mc: yielding }, y, 'H1.3');
  const outOfPlane = r.formula(h1SingleAxisFormulas.outOfPlane, 'H1.3/out-of-plane/ratio', {
    ...{ Pr, Pc: Pcy, Mrx: x.Mr, Cb, Mcx: Mcx1 },
  });
  const ordinary = interaction(r, 'H1', { Pr, Pc }, x, y);
  if (!inPlane || !ordinary) throw new Error('H1.3: compression with flexure has an interaction');
  const checks = [
    r.check(at, inPlane.ratio, 1, {
      title: 'Flexure and compression in the plane of bending',
      clause: clause('H1.3', inPlane.equation),
    }),
    r.check('H1.3/out-of-plane', outOfPlane, 1, {
      title: 'Flexure and compression out of the plane of bending',
      clause: clause('H1.3', 'H1-3'),
    }),
    ...separateChecks(r, { Pr, Pc }, x, y),
  ];
  const larger = inPlane.ratio.value < outOfPlane.value ? outOfPlane : inPlane.ratio;
  r.comparison(
    'H1.3/comparison',
    larger,
    ordinary.ratio,
    'The utilisation by H1.3, which decides here, is {difference} the one by H1.1.',
    { title: 'H1.3 and H1.1', clause: clause('H1.3') },
  );
  return checks;
}

/** Every condition of H1.3 as a line. */
function applies(r: Recorder, q: SingleAxis): boolean {
  const { shape, flange, web, Lcy, Lcz, Pr, y } = q;
  const suits = r.choice(
    'H1.3/shape',
    [
      {
        left: shape,
        relation: 'is',
        right: 'a doubly symmetric rolled I-shape',
        outcome: 'the section is one of H1.3',
      },
    ],
    'H1.3 does not apply to the section',
    { title: 'Sections of H1.3', clause: clause('H1.3') },
  );
  if (suits < 0) return false;
  const share =
    y &&
    r.formula(h1SingleAxisFormulas.minorShare, 'H1.3/MryMcy', {
      ...{ Mry: y.Mr, Mcy: y.Mc },
    });
  const outcome = 'H1.3 does not apply: H1.1 decides';
  const above = (left: Quantity, right: Quantity) => ({
    ...{ left, relation: '>' as const, right, outcome },
  });
  const excluded = r.choice(
    'H1.3/applies',
    [
      { left: Pr, relation: '<=', right: 0, outcome },
      above(flange.lambda, flange.lambdap),
      above(web.lambda, web.lambdap),
      above(Lcz, Lcy),
      ...(share ? [{ left: share, relation: '>=' as const, right: 0.05, outcome }] : []),
    ],
    'H1.3 applies',
    {
      title: 'Conditions of H1.3',
      clause: clause('H1.3'),
      because: y ? '' : 'There is no minor-axis moment.',
    },
  );
  return excluded < 0;
}
