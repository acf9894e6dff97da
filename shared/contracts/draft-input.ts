import type { BasisDraft } from './calculations.ts';
import {
  asked,
  chartInputOf,
  given,
  loadInputOf,
  netSectionInputOf,
  restraintInputOf,
  sizesInputOf,
  sourceInputOf,
  springsInputOf,
  supportInputOf,
  swayInputOf,
} from './draft-input-parts.ts';
import type { DraftRestraint } from './draft-parts.ts';
import {
  actionNames,
  actionOf,
  type DraftCombination,
  type DraftSteel,
  inSprings,
  type MemberDraft,
} from './members.ts';

/** A member's draft under the id that its record keeps. */
export interface DraftOfMember {
  readonly id: string;
  readonly draft: MemberDraft;
}

/**
 * The forms of a calculation as the command line's INPUT.json, valid or not: quantities stay as
 * typed, empty ones are left out. `shared/members` decides whether it is an input.
 */
export function inputOf(basis: BasisDraft, members: readonly DraftOfMember[]) {
  const { standard, design, units, constants, analysis } = basis;
  const { method, secondOrder, includesMemberEffect, sway, swaySource } = analysis;
  const { driftRatio = '', driftSource = '', provisions = [] } = analysis;
  return {
    format: 1,
    ...{ standard, design, units, constants },
    analysis: {
      ...{ method, secondOrder },
      sway: noted(sway, swaySource),
      ...(includesMemberEffect === null ? {} : { includesMemberEffect }),
      ...(driftRatio.trim() === '' ? {} : { driftRatio: noted(driftRatio.trim(), driftSource) }),
      ...(provisions.length === 0 ? {} : { provisions }),
    },
    members: members.map(({ id, draft }) => memberInputOf(id, draft)),
  };
}

/** A statement of the basis: confirmed where the engineer says what it is known from. */
function noted(value: string, source: string) {
  const note = source.trim();
  return note ? { value, source: { kind: 'typed', note }, confirmed: true } : value;
}

function memberInputOf(id: string, draft: MemberDraft) {
  const { mark, endMomentSign, restraints, springs, charts, netSection, stiffeners } = draft;
  return {
    ...{ id, mark },
    ...(draft.sizes ? { section: sizesInputOf(draft.sizes) } : given('section', draft.section)),
    material: draft.ownSteel ? steelInputOf(draft.ownSteel) : draft.material,
    ...given('length', draft.length),
    ...given('ends', draft.ends),
    ...given('Lcx', draft.Lcx),
    ...given('Lcy', draft.Lcy),
    ...given('Lcz', draft.Lcz),
    ...given('Lb', draft.Lb),
    ...given('Cb', draft.Cb),
    ...(endMomentSign === '' ? {} : { endMomentSign }),
    ...(restraints ? { restraints: restraints.map(restraintInputOf) } : {}),
    ...(springs && inSprings(draft) ? { springs: springsInputOf(springs) } : {}),
    ...(charts ? { charts: chartsInputOf(charts) } : {}),
    ...(netSection ? { netSection: netSectionInputOf(netSection) } : {}),
    ...(stiffeners ? asked('stiffeners', stiffeners) : {}),
    combinations: draft.combinations.map((row) => combinationInputOf(row, restraints ?? [])),
  };
}

const chartsInputOf = ({ x, y }: NonNullable<MemberDraft['charts']>) => ({
  ...(x ? { x: chartInputOf(x) } : {}),
  ...(y ? { y: chartInputOf(y) } : {}),
});

const combinationInputOf = (row: DraftCombination, restraints: readonly DraftRestraint[]) => ({
  ...{ id: row.id, name: row.name },
  ...(row.design ? { design: row.design } : {}),
  ...analysedWithOf(row),
  ...Object.assign({}, ...actionNames.map((action) => given(action, actionOf(row, action)))),
  ...(row.loads?.length ? { loads: row.loads.map(loadInputOf) } : {}),
  ...(row.supports?.length ? { supports: row.supports.map(supportInputOf(restraints)) } : {}),
  ...(row.sway ? { sway: swayInputOf(row.sway) } : {}),
});

/** Names are compared without spaces. */
function analysedWithOf({ analysedWith = '' }: DraftCombination) {
  const name = analysedWith.replace(/\s+/g, '');
  return name === '' ? {} : { analysedWith: name };
}

const steelInputOf = ({ name, Fy, Fu, source, confirmed }: DraftSteel) => ({
  ...{ name, Fy, confirmed },
  ...(Fu.trim() === '' ? {} : { Fu }),
  ...(source ? { source: sourceInputOf(source) } : {}),
});
