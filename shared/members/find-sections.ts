import type { MemberRecord, Summary } from '../calc/record.ts';
import type { Shape } from '../sections/table.ts';
import type { ParsedInput, Problem } from './resolved.ts';
import { runMember } from './run.ts';

/** A shape with what a whole run of the member with it says. */
export interface RunSection {
  readonly designation: string;
  readonly summary: Summary;
  /** Whether the run says that the steel is not made as such a section. */
  readonly otherSteel: boolean;
}

/** How far a search has come. */
export interface SectionSearch {
  readonly tried: number;
  readonly of: number;
  /** Those that satisfy every check under every combination, the lightest first. */
  readonly found: readonly RunSection[];
  /** Of those NOT OK the nearest, once everything was tried and nothing found. */
  readonly nearest: RunSection | null;
  /** Why one was not checked or its input was refused, the last such reason; null: none was. */
  readonly obstacle: string | null;
  readonly unchecked: number;
}

/** What the table shows of a run. */
export const runSectionOf = (record: MemberRecord): RunSection => ({
  designation: record.section,
  summary: record.summary,
  otherSteel: record.lines.some(({ key }) => key === 'steel/product'),
});

/**
 * Tries shapes in their order, which is that of weight, until `wanted` of them satisfy every check
 * under every combination (verdict OK) and the next one is heavier. Yields after each shape.
 * `inputWith` gives the input of one member with a designation in place of its section.
 *
 * A shape that fails under one combination alone fails under all together, so that the combination
 * which failed the shape before is run first and alone; what is found has been run as a whole.
 */
export function* findSections(
  shapes: readonly Shape[],
  wanted: number,
  inputWith: (designation: string) => ParsedInput,
): Generator<SectionSearch, void> {
  const found: RunSection[] = [];
  let closest: { readonly designation: string; readonly ratio: number } | null = null;
  let obstacle: string | null = null;
  let unchecked = 0;
  let first: string | null = null;
  let heaviest = 0;
  for (const [index, { designation, weight }] of shapes.entries()) {
    if (found.length >= wanted && weight > heaviest) return;
    const tried = tryShape(inputWith(designation), first);
    if ('problem' in tried) {
      obstacle = tried.problem.message;
      unchecked += 1;
    } else {
      const { verdict, ratio, governing } = tried.run.summary;
      if (verdict === 'OK') {
        found.push(tried.run);
        heaviest = weight;
      } else {
        first = governing?.combination ?? first;
        if (verdict !== 'NOT OK') {
          obstacle = governing?.title ?? obstacle;
          unchecked += 1;
        } else if (ratio !== null && (closest === null || ratio < closest.ratio))
          closest = { designation, ratio };
      }
    }
    const last = index + 1 === shapes.length;
    yield {
      ...{ tried: index + 1, of: shapes.length, found: [...found], obstacle, unchecked },
      nearest: last && found.length === 0 && closest ? whole(inputWith(closest.designation)) : null,
    };
  }
}

/** The run under one combination where the shape fails there already, else the whole run. */
function tryShape(
  parsed: ParsedInput,
  first: string | null,
): { readonly run: RunSection } | { readonly problem: Problem } {
  if (!parsed.ok) return { problem: parsed.problems[0] as Problem };
  const [member] = parsed.input.members;
  if (!member) throw new Error('the input has no member');
  const alone = member.combinations.filter(({ id }) => id === first);
  if (alone.length > 0 && member.combinations.length > 1) {
    const run = runSectionOf(runMember(parsed.input, { ...member, combinations: alone }));
    if (run.summary.verdict !== 'OK') return { run };
  }
  return { run: runSectionOf(runMember(parsed.input, member)) };
}

/** The whole run, or null where the input is refused. */
function whole(parsed: ParsedInput): RunSection | null {
  const tried = tryShape(parsed, null);
  return 'run' in tried ? tried.run : null;
}
