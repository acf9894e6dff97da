import type { z } from 'zod';
import { quantityReader, stateOf } from './given-values.ts';
import { inputSchema } from './input.ts';
import { repeated } from './repeated.ts';
import { resolveMember } from './resolve-member.ts';
import type { ParsedInput, Problem } from './resolved.ts';
import { withStandIns } from './stand-ins.ts';

const pathText = (path: readonly PropertyKey[]): string =>
  path.reduce<string>(
    (at, p) =>
      typeof p === 'number' ? `${at}[${p}]` : at === '' ? String(p) : `${at}.${String(p)}`,
    '',
  );

/** Of a field with several forms and no words of its own: what is wrong in the form it has chosen. */
function furthest(issue: z.core.$ZodIssue): readonly z.core.$ZodIssue[] {
  if (issue.code !== 'invalid_union' || issue.message !== 'Invalid input') return [issue];
  const chosen = issue.errors
    .map((branch) => branch.flatMap(furthest))
    .find((branch) => branch.length > 0 && branch.every(({ path }) => path.length > 0));
  return chosen?.map((i) => ({ ...i, path: [...issue.path, ...i.path] })) ?? [issue];
}

/** Reads INPUT.json: its shape, its quantities, and what the members need; all problems at once. */
export function parseInput(json: unknown): ParsedInput {
  const shape = inputSchema.safeParse(json);
  if (!shape.success) {
    const { issues } = shape.error;
    const missing = issues
      .flatMap(furthest)
      .map((i) => ({ path: pathText(i.path), message: i.message }));
    return { ok: false, problems: [...missing, ...problemsBeside(json, issues)] };
  }
  const problems: Problem[] = [];
  const input = shape.data;
  const { analysis } = input;
  if (analysis.secondOrder === 'from-analysis' && analysis.includesMemberEffect === undefined)
    problems.push({
      path: 'analysis.includesMemberEffect',
      message:
        'is needed with moments from an analysis: whether the effect of the axial force between the ends (P-δ) is in them',
    });
  if ((typeof analysis.sway === 'string' ? analysis.sway : analysis.sway.value) === 'B2') {
    if (analysis.secondOrder !== 'amplified')
      problems.push({
        path: 'analysis.secondOrder',
        message:
          'must be "amplified" where sway is by B2: the multiplier belongs to first-order moments; moments of a second-order analysis hold the sway already',
      });
  } else
    input.members.forEach((m, i) => {
      m.combinations.forEach((c, j) => {
        if (c.sway)
          problems.push({
            path: `members[${i}].combinations[${j}].sway`,
            message: 'is given, but the basis says that the ends do not translate',
          });
      });
    });
  const sway =
    typeof analysis.sway === 'string'
      ? {
          value: analysis.sway,
          source: { kind: 'typed' as const, note: 'Basis of the calculation' },
          confirmed: true,
        }
      : stateOf(analysis.sway);
  const driftRatio = quantityReader((path, message) =>
    problems.push({ path: `analysis.${path}`, message }),
  )('driftRatio', analysis.driftRatio, 'none');
  if (driftRatio && driftRatio.value < 1)
    problems.push({
      path: 'analysis.driftRatio',
      message: `is ${driftRatio.text}; second-order drift is not below first-order drift`,
    });
  const members = input.members.map((m, i) => resolveMember(m, i, input, problems));
  repeated(
    input.members.map((m) => m.mark),
    (i) => `members[${i}].mark`,
    'mark',
    problems,
  );
  repeated(
    members.map((m) => m.id),
    (i) => `members[${i}].id`,
    'id',
    problems,
  );
  if (problems.length > 0) return { ok: false, problems };
  return {
    ok: true,
    input: {
      source: input,
      design: input.design,
      units: input.units,
      constants: input.constants ?? input.units,
      analysis: {
        method: analysis.method,
        secondOrder: analysis.secondOrder,
        sway: sway.value,
        // Says something of moments from an analysis only; elsewhere it must not move the hash.
        includesMemberEffect:
          analysis.secondOrder === 'from-analysis' && analysis.includesMemberEffect === true,
      },
      sway,
      driftRatio,
      provisions: new Set(analysis.provisions ?? []),
      members,
    },
  };
}

/** What is wrong with the rest of an input while some fields are not given yet. */
function problemsBeside(json: unknown, issues: readonly z.core.$ZodIssue[]): Problem[] {
  const completed = withStandIns(json, issues);
  if (!completed) return [];
  const parsed = parseInput(completed.json);
  if (parsed.ok) return [];
  const filled = completed.paths.map(pathText);
  return parsed.problems.filter(({ path }) => !filled.includes(path));
}
