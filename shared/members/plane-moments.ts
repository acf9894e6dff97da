import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { c2Formulas } from '../standards/aisc360-22/c2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { endMomentFormulas } from '../standards/elastic-theory/end-moments.ts';
import { type AxialState, type Axis, type BayMoments, bayMoments, WORD } from './bay-moments.ts';
import { placeName } from './geometry.ts';
import type { MemberQuantities } from './member-quantities.ts';
import { loadLines, loadsOfBay } from './plane-actions.ts';
import type { ResolvedCombination, ResolvedInput, ResolvedMember } from './resolved.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';
import { springsOf, sprungMoments } from './sprung-moments.ts';

/** Required moments of one plane, bay by bay. */
export interface PlaneMoments {
  readonly axis: Axis;
  readonly state: 'none' | 'done' | 'failed' | 'outside scope';
  readonly bays: readonly BayMoments[];
  /** The analysis gives a largest moment for the member, so the diagram is not known. */
  readonly givenMax: boolean;
}

/** Whether a combination bends the member in a plane. */
export const bends = (c: ResolvedCombination, axis: Axis): boolean => {
  const { A, B, max } = c.moments[axis];
  const sway = c.sway?.[axis];
  return (
    [A, B, max, sway?.MA, sway?.MB].some((m) => (m?.value ?? 0) !== 0) ||
    c.supports.some((s) => ((axis === 'x' ? s.Mx : s.My)?.value ?? 0) !== 0) ||
    c.loads.some((load) => load.axis === axis)
  );
};

export interface PlaneContext {
  readonly input: ResolvedInput;
  readonly member: ResolvedMember;
  readonly q: MemberQuantities;
  readonly steel: SteelQuantities;
  readonly section: SectionQuantities;
  readonly alpha: Quantity | null;
  readonly start: () => Quantity;
}

/**
 * Required moments of one plane under one combination; `axial` is null without compression, `P` the
 * axial force with its sign.
 */
export function planeMoments(
  r: Recorder,
  m: PlaneContext,
  c: ResolvedCombination,
  axis: Axis,
  { axial, P }: { readonly axial: AxialState | null; readonly P: Quantity },
  sway: BayMomentsSway,
): PlaneMoments {
  const given = c.moments[axis];
  const plane = (state: PlaneMoments['state'], bays: readonly BayMoments[] = []): PlaneMoments => ({
    ...{ axis, state, bays },
    givenMax: given.max !== null,
  });
  if (!bends(c, axis)) return plane('none');
  const { input, member, q } = m;
  const bays = q.bays[axis];
  const at = `theory/${axis}`;
  const word = WORD[axis];
  r.section(at, `Required moment, ${word} axis`, clause('App. 8'));
  const outside = (code: string, text: string, title: string): PlaneMoments => {
    r.notice(`${at}/outside`, 'outside scope', code, text, { title, clause: clause('App. 8.1.2') });
    return plane('outside scope');
  };
  const moment = (end: 'A' | 'B') =>
    r.given(`given/M${axis}${end}`, `M${axis}${end}`, 'moment', given[end], {
      title: `Moment at end ${end}, ${word} axis`,
    });
  const [MA, MBgiven] = [moment('A'), moment('B')];
  const single = bays.length === 1;
  const MB =
    !single && member.endMomentSign === 'joint'
      ? r.formula(
          endMomentFormulas.bendingSense,
          `${at}/MB`,
          { MBjoint: MBgiven },
          { symbol: `M${axis}Bb` },
        )
      : MBgiven;
  const largest = given.max
    ? r.formula(
        endMomentFormulas.size,
        `${at}/absMax`,
        {
          M: r.given(`given/M${axis}Max`, `M${axis}Max`, 'moment', given.max, {
            title: `Largest moment, ${word} axis`,
          }),
        },
        { title: 'Size of the given largest moment', symbol: `absM${axis}Max` },
      )
    : null;
  const loads = loadLines(r, c, axis);
  const supports = supportMoments(r, m, c, axis);

  const Lc = axis === 'x' ? member.Lcx : member.Lcy;
  if (member.restraints === null && Lc !== null && Lc.value < member.length.value)
    return outside(
      'held-within-bending-plane',
      `The buckling length about the ${word} axis is shorter than the member, which bends in that plane: it is continuous over the points that hold it. Moments there are not given, so the second-order moment is not computed. Say what is held where as restraints, with the moments over them. Where the buckling length is shorter because the ends are held against rotation, give the length of the member: the end moments carry that restraint.`,
      `Held within the plane of ${word}-axis bending`,
    );
  if (supports.missing.length > 0)
    return outside(
      'support-moments-missing',
      `The member bends about the ${word} axis and runs over ${supports.missing.join(', ')}, held in that plane. The moment there is not given, so the bays between are not computed.`,
      `Moments over held points, ${word} axis`,
    );
  const twisting = loads.filter(({ load }) => axis === 'y' && load.height !== 'centre');
  if (twisting.length > 0)
    return outside(
      'load-off-shear-centre',
      `A load that bends the minor axis acts at a flange (${twisting.map(({ load }) => load.id.replace('load', 'load ')).join(', ')}): it twists the member. Torsion (H3) is outside the scope.`,
      'Load off the shear centre',
    );
  const { secondOrder, includesMemberEffect } = input.analysis;
  if (largest && secondOrder !== 'from-analysis')
    return outside(
      'transverse-load',
      'A largest moment is given beside the end moments, so the member carries load between its ends. Give the loads themselves, or second-order moments from an analysis: a largest moment alone cannot be amplified.',
      'Load between the ends',
    );
  if (
    axial &&
    largest &&
    !includesMemberEffect &&
    loads.length === 0 &&
    largest.value > Math.max(Math.abs(MA.value), Math.abs(MB.value))
  )
    return outside(
      'transverse-load',
      'The given largest moment exceeds both end moments, so the member carries load between its ends. The analysis leaves out the effect of the axial force between the ends, and without the load it cannot be added here: give the loads, or moments from an analysis that includes it.',
      'Load between the ends',
    );
  const swayed = sway();
  if (swayed && !single)
    return outside(
      'sway-of-continuous-member',
      `The member sways about the ${word} axis and is held in that plane between its ends: one story has one bay.`,
      `Sway of a member held between its ends, ${word} axis`,
    );

  let rigidity: Quantity | null = null;
  const rigidityOf = (): Quantity =>
    (rigidity ??= flexuralRigidity(r, m, axis, axial?.taub ?? null));
  const springs = springsOf(member, axis, input.units);
  if (springs) {
    const [bay] = bays;
    const turned = MA.value !== 0 || MBgiven.value !== 0;
    if (!bay || !single || turned || loads.length === 0 || !m.alpha)
      return outside(
        'springs-with-end-moments',
        `The ends turn against springs about the ${word} axis. Their moments follow from loads between the ends of a member that is not held between them: moments given at the ends, or over held points, cannot be taken beside them.`,
        `End springs, ${word} axis`,
      );
    const acting = loadsOfBay(r, bay, loads, { ...m, L: q.L, places: q.places });
    // Loads over the ends bend nothing.
    if (acting.length === 0) return plane('none');
    const found = sprungMoments(r, axis, {
      ...{ bay, springs, alpha: m.alpha, Pr: P, loads: acting },
      // The springs take their share by the stiffness of the analysis, compressed or not.
      EIstar: axial || input.analysis.method !== 'direct' ? rigidityOf() : unstressed(r, m, axis),
    });
    return typeof found === 'string' ? plane(found) : plane('done', [found]);
  }
  const ofPlace = (place: (typeof bays)[number]['from']): Quantity =>
    place === 'A' ? MA : place === 'B' ? MB : (supports.moments.get(place.id) as Quantity);
  const results = bays.map((bay) => {
    const rb = single ? r : r.within(`bay${bay.id}`);
    if (!single)
      rb.section(
        at,
        `Bay ${bay.id}, ${placeName(bay.from)} to ${placeName(bay.to)}, ${word} axis`,
        clause('App. 8'),
      );
    return bayMoments(rb, {
      ...{ axis, bay, input, largest, axial, EIstar: rigidityOf, sway: swayed },
      ...{ MA: ofPlace(bay.from), MB: ofPlace(bay.to) },
      sense: single ? member.endMomentSign : 'bending',
      loads: loadsOfBay(rb, bay, loads, { ...m, L: q.L, places: q.places }),
    });
  });
  const states = results.map((b) => b.state);
  return plane(
    states.includes('failed')
      ? 'failed'
      : states.includes('outside scope')
        ? 'outside scope'
        : states.includes('done')
          ? 'done'
          : 'none',
    results,
  );
}

/** Largest moment from lateral translation with B2, asked for once the plane's lines begin. */
export type BayMomentsSway = () => { readonly B2: Quantity; readonly Mlt: Quantity } | null;

function flexuralRigidity(
  r: Recorder,
  { steel, section }: PlaneContext,
  axis: Axis,
  taub: AxialState['taub'],
): Quantity {
  const { E } = steel;
  const I = axis === 'x' ? section.Ix : section.Iy;
  const named = { symbol: `EIstar${axis}` };
  return taub && taub !== 'failed'
    ? r.formula(c2Formulas.reducedRigidity, `C2/${axis}/EI`, { taub, E, I }, named)
    : r.formula(c2Formulas.nominalRigidity, `C2/${axis}/EI`, { E, I }, named);
}

/** C2.3(a), (b): 0.8EI of the direct analysis with τb = 1, for a member without compression. */
const unstressed = (r: Recorder, m: PlaneContext, axis: Axis): Quantity =>
  flexuralRigidity(r, m, axis, r.formula(c2Formulas.taubFull, `C2/${axis}/taub`, {}));

/** Given moments over the points that divide the plane into bays; `missing` names those without. */
function supportMoments(
  r: Recorder,
  { q }: PlaneContext,
  c: ResolvedCombination,
  axis: Axis,
): { readonly moments: ReadonlyMap<string, Quantity>; readonly missing: readonly string[] } {
  const moments = new Map<string, Quantity>();
  const missing: string[] = [];
  for (const { to } of q.bays[axis]) {
    if (typeof to === 'string') continue;
    const given = c.supports.find((s) => s.restraint === to.id);
    const M = axis === 'x' ? given?.Mx : given?.My;
    if (M)
      moments.set(
        to.id,
        r.given(`given/${to.id}/M${axis}`, 'Msup', 'moment', M, {
          title: `Moment over restraint ${to.id}, ${WORD[axis]} axis`,
        }),
      );
    else missing.push(`restraint ${to.id}`);
  }
  return { moments, missing };
}
