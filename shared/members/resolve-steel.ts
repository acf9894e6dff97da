import type { GivenValue } from '../calc/quantity.ts';
import { type ReadQuantity, TYPED } from './given-values.ts';
import type { MemberInput } from './input.ts';
import { findSteel } from './material.ts';
import type { ResolvedMember } from './resolved.ts';

/** A steel by its grade, or one of the user's own with the source of its yield stress. */
export function resolveSteel(
  m: MemberInput,
  problem: (path: string, message: string) => void,
  quantity: ReadQuantity,
): ResolvedMember['steel'] {
  const fallback: GivenValue = { value: 1, text: '1 MPa', source: TYPED, confirmed: false };
  if (typeof m.material === 'string') {
    const steel = findSteel(m.material);
    if (steel) return { kind: 'grade', steel };
    problem(
      'material',
      `"${m.material}" is not a steel known here; choose A992, A572 Gr. 50, A36, A913 Gr. 65, A913 Gr. 70, or give your own with name, Fy and source`,
    );
    return { kind: 'own', name: m.material, Fy: fallback };
  }
  if (m.material.source === undefined)
    problem(
      'material.source',
      'is needed: a steel of your own states where its yield stress is from',
    );
  const Fy = quantity('material.Fy', m.material.Fy, 'stress');
  const Fu = quantity('material.Fu', m.material.Fu, 'stress');
  if (Fu && Fu.value <= 0) problem('material.Fu', `is ${Fu.text}; it must be above zero`);
  if (Fy && Fy.value <= 0) problem('material.Fy', `is ${Fy.text}; it must be above zero`);
  const own = {
    ...(Fy ?? fallback),
    source: m.material.source ?? TYPED,
    confirmed: m.material.confirmed ?? false,
  };
  return { kind: 'own', name: m.material.name, Fy: own };
}
