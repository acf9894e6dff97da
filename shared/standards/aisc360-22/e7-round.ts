import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// E7.2 slender round HSS. E7-6 (Ae = Ag) has the limit of Table B4.1a, 9, up to which E3 applies.
export const e7RoundFormulas = {
  limit: formula({
    id: 'E7.2-limit',
    clause: 'E7.2',
    title: 'Slenderness of the wall from which the standard has no rule',
    symbol: 'lambdaend',
    dimension: 'none',
    expression: '0.45*E/Fy',
    operands: { E: 'stress', Fy: 'stress' },
  }),
  area: formula({
    id: 'E7-7',
    clause: 'E7.2',
    equation: 'E7-7',
    title: 'Effective area, slender wall',
    symbol: 'Aetrial',
    dimension: 'area',
    expression: '(0.038*E/(Fy*lambda)+2/3)*Ag',
    operands: { E: 'stress', Fy: 'stress', lambda: 'none', Ag: 'area' },
    validity: 'where 0.11E/Fy < D/t < 0.45E/Fy',
  }),
};

/** E7.2: whether D/t stays below 0.45 E/Fy; an outside-scope notice where it does not. */
export function roundWithinRules(
  r: Recorder,
  steel: { readonly E: Quantity; readonly Fy: Quantity },
  lambdad: Quantity,
): boolean {
  const { E, Fy } = steel;
  const limit = r.formula(e7RoundFormulas.limit, 'E7/wall/limit', { E, Fy });
  const taken = r.choice(
    'E7/wall/range',
    [{ left: lambdad, relation: '<', right: limit, outcome: 'E7-7 applies' }],
    'the standard has no rule for this wall',
    { title: 'Slender wall of a round section', clause: clause('E7.2') },
  );
  if (taken === 0) return true;
  r.notice(
    'E7/outside',
    'outside scope',
    'round-wall-beyond-rules',
    'D/t of the wall is not below 0.45 E/Fy, where E7.2 ends: the standard gives no compressive strength.',
    { title: 'Round wall beyond E7.2', clause: clause('E7.2') },
  );
  return false;
}

/**
 * E7-7, not more than Ag: just above its limit E7-7 gives 1.2 % more than the whole section. It does
 * not depend on Fn, so the same area serves Pn and Pns.
 */
export function roundEffectiveArea(
  r: Recorder,
  steel: { readonly E: Quantity; readonly Fy: Quantity },
  lambdad: Quantity,
  Ag: Quantity,
): Quantity {
  const { E, Fy } = steel;
  const trial = r.formula(e7RoundFormulas.area, 'E7/wall/Ae', { E, Fy, lambda: lambdad, Ag });
  return r.governing('E7/Ae', 'min', [trial, Ag], {
    title: 'Effective area, not more than the whole',
    symbol: 'Ae',
    clause: clause('E7.2', 'E7-7'),
  });
}
