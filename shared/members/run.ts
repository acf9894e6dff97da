import { closeLines } from '../calc/closure.ts';
import { ENGINE_VERSION } from '../calc/engine.ts';
import type { Line } from '../calc/line.ts';
import type { CalculationRecord, MemberRecord } from '../calc/record.ts';
import { createRecorder, NotComputable } from '../calc/recorder.ts';
import { methodConstant } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { UNIT_SETS } from '../units/unit-set.ts';
import { type CombinationRun, type MemberStrengths, runCombination } from './combination.ts';
import { completenessOf } from './completeness.ts';
import { compressionStrength } from './compression.ts';
import { availableMajor, majorStrength, minorStrength } from './flexure.ts';
import { givenLines, sectionLines, steelLines } from './member-lines.ts';
import type { ResolvedInput, ResolvedMember } from './resolved.ts';
import { bends } from './second-order.ts';
import { combinationSummary, memberSummary, recordSummary } from './summary.ts';

/**
 * Runs the book over a calculation's inputs. The record has no hashes: those are put on by
 * `sealRecord`, where records are made to be kept.
 */
export function runCalculation(input: ResolvedInput): CalculationRecord {
  const members = input.members.map((m) => runMember(input, m));
  return {
    format: 1,
    program: { name: 'Stanchion', engine: ENGINE_VERSION },
    standard: 'aisc360-22',
    design: input.design,
    units: input.units,
    analysis: input.analysis,
    members,
    summary: recordSummary(members),
    input: input.source,
    resultHash: null,
    snapshotHash: null,
  };
}

/** One member with all its combinations, digits fixed. */
export function runMember(input: ResolvedInput, member: ResolvedMember): MemberRecord {
  const r = createRecorder('');
  const strengths = memberStrengths(input, member, r);
  const runs = new Map<string, CombinationRun>(
    member.combinations.map((c) => [
      c.id,
      strengths
        ? runCombination(strengths, c)
        : {
            lines: [],
            checks: [],
            planes: { x: null, y: null },
            compressed: c.P.value > 0,
            tension: c.P.value < 0,
          },
    ]),
  );
  const placed = [
    ...r.lines.map((line) => ({ address: line.key, combination: null, line })),
    ...member.combinations.flatMap(({ id }) =>
      (runs.get(id)?.lines ?? []).map((line) => ({
        address: `${id}:${line.key}`,
        combination: id,
        line,
      })),
    ),
  ];
  const closed = closeLines(placed, UNIT_SETS[input.units]);
  const linesOf = (combination: string | null): Line[] =>
    closed.filter((_, i) => placed[i]?.combination === combination);
  const lines = linesOf(null);
  const combinations = member.combinations.map((c) => {
    const own = linesOf(c.id);
    return { id: c.id, name: c.name, lines: own, summary: combinationSummary(c, lines, own) };
  });
  const unconfirmed = closed.filter(
    (l) => (l.kind === 'given' || l.kind === 'statement') && !l.confirmed,
  ).length;
  return {
    id: member.id,
    mark: member.mark,
    section: member.section.value,
    material: member.steel.kind === 'grade' ? member.steel.steel.key : member.steel.name,
    lines,
    combinations,
    completeness: completenessOf(runs, combinations, lines),
    summary: memberSummary(combinations),
    unconfirmed,
  };
}

/** Member lines; null where nothing can be checked, with the notice that says why. */
function memberStrengths(
  input: ResolvedInput,
  member: ResolvedMember,
  r: ReturnType<typeof createRecorder>,
): MemberStrengths | null {
  const q = givenLines(r, member, input);
  if (!member.shape) {
    r.notice(
      'B4/outside',
      'outside scope',
      'other-shape',
      `${member.section.value} is not a rolled W shape. Other shapes are outside the scope of this version; nothing is checked.`,
      {
        title: 'Shape outside the scope',
        clause: clause('B4'),
      },
    );
    return null;
  }
  if (member.ends.value !== 'held') {
    const words = {
      free: 'One end is free (a cantilever)',
      sway: 'The ends sway',
      springs: 'The ends are held by springs',
    }[member.ends.value];
    r.notice(
      'C2/outside',
      'outside scope',
      `ends-${member.ends.value}`,
      `${words}. Only members held at both ends, in both planes and against twist, are within the scope of this version; nothing is checked.`,
      {
        title: 'Ends outside the scope',
        clause: clause(member.ends.value === 'sway' ? 'App. 8.1.3' : 'App. 7.2'),
      },
    );
    return null;
  }
  const steel = steelLines(r, member, input.constants);
  const section = sectionLines(r, member.shape);
  const { combinations } = member;
  const { Lcx, Lcy, Lcz, Lb } = q;
  try {
    const compressed = combinations.some((c) => c.P.value > 0);
    const [bentX, bentY] = [
      combinations.some((c) => bends(c, 'x')),
      combinations.some((c) => bends(c, 'y')),
    ];
    r.section('factors', `Factors, ${input.design}`);
    const alpha = compressed ? methodConstant(r, 'loadLevel', input.design) : null;
    const phic = compressed ? methodConstant(r, 'compression', input.design) : null;
    const phib = bentX || bentY ? methodConstant(r, 'flexure', input.design) : null;
    const compression =
      phic && Lcx && Lcy && Lcz
        ? compressionStrength(
            r,
            input.design,
            steel,
            { kind: 'i', made: 'rolled', ...section },
            { Lcx, Lcy, Lcz, offset: null },
            phic,
            input.analysis.method !== 'effective-length',
          )
        : null;
    const major = bentX && Lb && phib ? majorStrength(r, steel, section, Lb, phib) : null;
    const Cb =
      major && member.Cb !== 'auto'
        ? r.given('given/Cb', 'Cb', 'none', member.Cb, {
            title: 'Modification factor as given',
            clause: clause('F1'),
          })
        : null;
    const fixed =
      major && (Cb || major.limits.Lr === null) ? availableMajor(r, input.design, major, Cb) : null;
    const Mcy = bentY && phib ? minorStrength(r, input.design, steel, section, phib) : null;
    return { input, member, q, steel, section, alpha, compression, major, Mcx: fixed, Mcy, Cb };
  } catch (error) {
    if (!(error instanceof NotComputable)) throw error;
    return null;
  }
}
