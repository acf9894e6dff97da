import type { MemberDraft } from '#shared/contracts/members.ts';
import {
  NO_LIMITS,
  type SearchFamily,
  type SizeLimits,
  searchFamilyOf,
} from '#shared/members/section-candidates.ts';
import { findShape } from '#shared/sections/table.ts';
import { parseQuantity } from '#shared/units/parse.ts';

export type LimitName = keyof SizeLimits;

/** What is searched, as typed. */
export interface FinderCriteria {
  readonly family: SearchFamily;
  readonly limits: Readonly<Record<LimitName, string>>;
}

/** Sections of the member's own kind, of any size; W shapes where it has no rolled section yet. */
export function firstCriteria({ section, sizes }: MemberDraft): FinderCriteria {
  const shape = sizes ? null : findShape(section.text);
  return {
    family: shape ? searchFamilyOf(shape) : 'W',
    limits: { minDepth: '', maxDepth: '', minWidth: '', maxWidth: '' },
  };
}

/** The limits in mm, or why some of them cannot be read. */
export function readLimits(limits: FinderCriteria['limits']): {
  readonly limits: SizeLimits;
  readonly problems: Readonly<Partial<Record<LimitName, string>>>;
} {
  const read = { ...NO_LIMITS } as Record<LimitName, number | null>;
  const problems: Partial<Record<LimitName, string>> = {};
  for (const name of Object.keys(limits) as LimitName[]) {
    const text = limits[name].trim();
    if (text === '') continue;
    const parsed = parseQuantity(text, 'length');
    if (!parsed.ok) problems[name] = parsed.reason;
    else if (parsed.quantity.value <= 0) problems[name] = 'is above zero';
    else read[name] = parsed.quantity.value;
  }
  for (const [least, most] of [
    ['minDepth', 'maxDepth'],
    ['minWidth', 'maxWidth'],
  ] as const) {
    const [from, to] = [read[least], read[most]];
    if (from !== null && to !== null && from > to) problems[most] = 'is less than the least';
  }
  return { limits: read, problems };
}
