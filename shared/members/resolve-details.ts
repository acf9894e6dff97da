import type { GivenValue } from '../calc/quantity.ts';
import type { ReadQuantity } from './given-values.ts';
import type { MemberInput } from './input.ts';
import type { ResolvedMember } from './resolved.ts';

type Details = Pick<ResolvedMember, 'springs' | 'charts' | 'netSection' | 'stiffeners'>;

/** What of the member serves single clauses: end springs, joints, net section, stiffeners. */
export function resolveDetails(
  m: MemberInput,
  problem: (path: string, message: string) => void,
  quantity: ReadQuantity,
): Details {
  const above = (
    path: string,
    given: Parameters<ReadQuantity>[1],
    dimension: Parameters<ReadQuantity>[2],
    zero = false,
  ): GivenValue | null => {
    const found = quantity(path, given, dimension);
    if (found && (zero ? found.value < 0 : found.value <= 0))
      problem(path, `is ${found.text}; it must be ${zero ? 'zero or above' : 'above zero'}`);
    return found;
  };
  const chart = (axis: 'x' | 'y') => {
    const given = m.charts?.[axis];
    if (!given) return null;
    const GA = above(`charts.${axis}.GA`, given.GA, 'none', true);
    const GB = above(`charts.${axis}.GB`, given.GB, 'none', true);
    return GA && GB ? { sidesway: given.sidesway, GA, GB } : null;
  };
  return {
    springs: springsOf(m, above),
    charts: { x: chart('x'), y: chart('y') },
    netSection: netSectionOf(m, problem, above),
    stiffeners: above('stiffeners', m.stiffeners, 'length'),
  };
}

type Above = (
  path: string,
  given: Parameters<ReadQuantity>[1],
  dimension: Parameters<ReadQuantity>[2],
  zero?: boolean,
) => GivenValue | null;

function springsOf(m: MemberInput, above: Above): ResolvedMember['springs'] {
  if (!m.springs) return null;
  const found = (['xA', 'xB', 'yA', 'yB'] as const).flatMap((end) => {
    const stiffness = above(`springs.${end}`, m.springs?.[end], 'rotationalStiffness', true);
    return stiffness ? [[end, stiffness] as const] : [];
  });
  return Object.fromEntries(found);
}

function netSectionOf(
  m: MemberInput,
  problem: (path: string, message: string) => void,
  above: Above,
): ResolvedMember['netSection'] {
  const net = m.netSection;
  if (!net) return null;
  if ('Ae' in net) {
    const Ae = above('netSection.Ae', net.Ae, 'area');
    return Ae ? { Ae } : null;
  }
  const An = above('netSection.An', net.An, 'area');
  const U = above('netSection.U', net.U, 'none');
  if (U && U.value > 1) problem('netSection.U', `is ${U.text}; the shear lag factor is at most 1`);
  return An && U ? { An, U } : null;
}
