import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  lowerTensileStrength,
  tensileRupture,
  tensileYielding,
} from '../standards/aisc360-22/d2.ts';
import { d3Formulas } from '../standards/aisc360-22/d3.ts';
import type { Design } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';

/** What the connections leave of the section: the effective net area, or the net area with U. */
export type NetSection =
  | { readonly Ae: Quantity }
  | { readonly An: Quantity; readonly U: Quantity };

export interface TensionStrength {
  /** Available strength in yielding of the gross section. */
  readonly yielding: Quantity;
  /** Available strength in rupture; null where it can't be told. */
  readonly rupture: Quantity | null;
  /** The lower of both; null where rupture can't be told: then yielding alone may be checked. */
  readonly Pc: Quantity | null;
}

/**
 * D2 by design method, forces positive in tension. Without the net section or Fu a notice puts
 * rupture outside the scope; a net section larger than the gross one is a failed notice.
 */
export function tensionStrength(
  r: Recorder,
  design: Design,
  steel: SteelQuantities,
  section: SectionQuantities,
  net: NetSection | null,
): TensionStrength {
  r.section('D2', 'Tensile strength', clause('D2'));
  const yielding = tensileYielding(r, design, steel.Fy, section.A);
  const Ae = net && effectiveNetArea(r, section.A, net);
  const missing = steel.Fu === null ? (net ? 'Fu' : 'Fu and the net section') : 'the net section';
  if (!net || !steel.Fu)
    r.notice(
      'D2/rupture/outside',
      'outside scope',
      'net-section-not-given',
      `Rupture of the net section is not checked, because ${missing} ${missing.includes(' and ') ? 'are' : 'is'} not given. A member without holes whose every element is connected has the gross area as net area and U = 1.`,
      { title: 'Tensile rupture', clause: clause('D2', 'D2-2') },
    );
  if (!steel.Fu || !Ae) return { yielding, rupture: null, Pc: null };
  const rupture = tensileRupture(r, design, steel.Fu, Ae);
  return { yielding, rupture, Pc: lowerTensileStrength(r, yielding, rupture) };
}

/** D3-1 or the given Ae; null with a failed notice where it exceeds the gross area, or U exceeds 1. */
function effectiveNetArea(r: Recorder, Ag: Quantity, net: NetSection): Quantity | null {
  const area = 'Ae' in net ? net.Ae : net.An;
  const taken = r.choice(
    'D3/net',
    [
      {
        left: area,
        relation: '>',
        right: Ag,
        outcome: 'the net section is not one of this section',
      },
      ...('U' in net
        ? [
            {
              left: net.U,
              relation: '>' as const,
              right: 1,
              outcome: 'the net section is not one of this section',
            },
          ]
        : []),
    ],
    'the net section is one of this section',
    { title: 'Net section against gross section', clause: clause('D3') },
  );
  if (taken >= 0) {
    r.notice(
      'D3/failed',
      'failed',
      'net-section-above-gross',
      'The net section given is larger than the gross section, or the shear lag factor is larger than 1. Rupture has no value.',
      { title: 'Net section', clause: clause('D3') },
    );
    return null;
  }
  return 'Ae' in net ? net.Ae : r.formula(d3Formulas.effectiveNetArea, 'D3/Ae', { ...net });
}
