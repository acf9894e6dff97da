import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.2, design wall thickness of HSS; B4.1b(d), flat widths of their walls.
export const b4WallFormulas = {
  reduced: formula({
    id: 'B4.2-t',
    clause: 'B4.2',
    title: 'Design wall thickness',
    symbol: 't',
    dimension: 'length',
    expression: '0.93*tnom',
    operands: { tnom: 'length' },
  }),
  whole: formula({
    id: 'B4.2-t-whole',
    clause: 'B4.2',
    title: 'Design wall thickness',
    symbol: 't',
    dimension: 'length',
    expression: 'tnom',
    operands: { tnom: 'length' },
  }),
  flat: formula({
    id: 'B4.1b-flat',
    clause: 'B4.1b',
    title: 'Flat width of a wall, corner radius not known',
    symbol: 'b',
    dimension: 'length',
    expression: 'Bout-3*t',
    operands: { Bout: 'length', t: 'length' },
  }),
  slenderness: formula({
    id: 'B4.1b-bt',
    clause: 'B4.1b',
    title: 'Width-to-thickness ratio of a wall',
    symbol: 'lambda',
    dimension: 'none',
    expression: 'b/t',
    operands: { b: 'length', t: 'length' },
  }),
};

const WHOLE_WALL = 'ASTM A1085/A1085M';

/** B4.2: 0.93 of the nominal thickness, all of it for ASTM A1085/A1085M. */
export function designWall(r: Recorder, tnom: Quantity, steel: string): Quantity {
  const whole = r.choice(
    'B4/wall',
    [
      {
        left: steel,
        relation: 'is',
        right: WHOLE_WALL,
        outcome: 'the nominal thickness is the design wall thickness',
      },
    ],
    'the design wall thickness is 0.93 of the nominal one',
    { title: 'Design wall thickness', clause: clause('B4.2') },
  );
  const formulas = b4WallFormulas;
  return r.formula(whole === 0 ? formulas.whole : formulas.reduced, 'section/t', { tnom });
}

/** B4.1b(d): b/t of a wall from its flat width, or from its outside width where the radius is not known. */
export function wallSlenderness(
  r: Recorder,
  wall: 'b' | 'h',
  q: { readonly flat: Quantity | null; readonly outside: Quantity; readonly t: Quantity },
): Quantity {
  const title = wall === 'b' ? 'shorter wall' : 'longer wall';
  const b =
    q.flat ??
    r.formula(
      b4WallFormulas.flat,
      `section/${wall}`,
      { Bout: q.outside, t: q.t },
      { symbol: wall, title: `Flat width of the ${title}, corner radius not known` },
    );
  return r.formula(
    b4WallFormulas.slenderness,
    `section/lambda${wall}`,
    { b, t: q.t },
    { symbol: `lambda${wall}`, title: `Width-to-thickness ratio of the ${title}` },
  );
}
