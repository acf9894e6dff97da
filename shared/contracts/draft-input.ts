import type { BasisDraft } from './calculations.ts';
import {
  actionNames,
  type DraftCombination,
  type DraftQuantity,
  type DraftSource,
  type DraftSteel,
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
  const note = swaySource.trim();
  return {
    format: 1,
    ...{ standard, design, units, constants },
    analysis: {
      ...{ method, secondOrder },
      sway: note ? { value: sway, source: { kind: 'typed', note }, confirmed: true } : sway,
      ...(includesMemberEffect === null ? {} : { includesMemberEffect }),
    },
    members: members.map(({ id, draft }) => memberInputOf(id, draft)),
  };
}

function memberInputOf(id: string, draft: MemberDraft) {
  const { mark, endMomentSign } = draft;
  return {
    ...{ id, mark },
    ...given('section', draft.section),
    material: draft.ownSteel ? steelInputOf(draft.ownSteel) : draft.material,
    ...given('length', draft.length),
    ...given('ends', draft.ends),
    ...given('Lcx', draft.Lcx),
    ...given('Lcy', draft.Lcy),
    ...given('Lcz', draft.Lcz),
    ...given('Lb', draft.Lb),
    ...given('Cb', draft.Cb),
    ...(endMomentSign === '' ? {} : { endMomentSign }),
    combinations: draft.combinations.map(combinationInputOf),
  };
}

const combinationInputOf = (row: DraftCombination) => ({
  ...{ id: row.id, name: row.name },
  ...(row.design ? { design: row.design } : {}),
  ...(row.analysedWith?.trim() ? { analysedWith: row.analysedWith.trim() } : {}),
  ...Object.assign({}, ...actionNames.map((action) => given(action, row[action]))),
});

const steelInputOf = ({ name, Fy, Fu, source, confirmed }: DraftSteel) => ({
  ...{ name, Fy, confirmed },
  ...(Fu.trim() === '' ? {} : { Fu }),
  ...(source ? { source: sourceInputOf(source) } : {}),
});

const given = (name: string, { text, source, confirmed }: DraftQuantity) =>
  text.trim() === ''
    ? {}
    : {
        [name]: {
          value: text.trim(),
          source: sourceInputOf(source ?? { kind: 'typed' }),
          confirmed,
        },
      };

function sourceInputOf(source: DraftSource) {
  if (source.kind !== 'file') return source;
  const { row, ...file } = source;
  return /^\d+$/.test(row ?? '') ? { ...file, row: Number(row) } : file;
}
