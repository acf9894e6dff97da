import { closeLines } from '../calc/closure.ts';
import { ENGINE_VERSION } from '../calc/engine.ts';
import type { Line } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import type { CalculationRecord, MemberRecord } from '../calc/record.ts';
import { createRecorder, NotComputable, type Recorder } from '../calc/recorder.ts';
import { secondOrderRatio } from '../standards/aisc360-22/c2.ts';
import { tensionSlenderness } from '../standards/aisc360-22/d2.ts';
import { methodConstant } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { UNIT_SETS } from '../units/unit-set.ts';
import type { Axis } from './bay-moments.ts';
import { noRun, runCombination } from './combination.ts';
import { completenessOf } from './completeness.ts';
import { compressionStrength } from './compression.ts';
import { fixedStrength, majorStrengths, withStatedLength } from './major-strengths.ts';
import { type GivenLengths, givenLines } from './member-lines.ts';
import { memberQuantities } from './member-quantities.ts';
import type { CombinationRun, MemberStrengths } from './member-strengths.ts';
import { minorStrength } from './minor-flexure.ts';
import { bends } from './plane-moments.ts';
import type { ResolvedCombination, ResolvedInput, ResolvedMember } from './resolved.ts';
import { type Places, restraintLines } from './restraint-lines.ts';
import { sectionLines } from './section-lines.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';
import { shearStrength } from './shear.ts';
import { shearKnown } from './shear-demand.ts';
import { steelLines } from './steel-lines.ts';
import { combinationSummary, memberSummary, recordSummary } from './summary.ts';
import { type NetSection, tensionStrength } from './tension.ts';

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
    member.combinations.map((c) => [c.id, strengths ? runCombination(strengths, c) : noRun(c)]),
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
  const byCombination = new Map<string | null, Line[]>([[null, []]]);
  for (const { id } of member.combinations) byCombination.set(id, []);
  closed.forEach((line, i) => {
    byCombination.get(placed[i]?.combination ?? null)?.push(line);
  });
  const lines = byCombination.get(null) ?? [];
  const combinations = member.combinations.map((c) => {
    const own = byCombination.get(c.id) ?? [];
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
  r: Recorder,
): MemberStrengths | null {
  const given = givenLines(r, member, input);
  const places = restraintLines(r, member);
  if (!member.shape) {
    r.notice(
      'B4/outside',
      'outside scope',
      'other-shape',
      `${member.section.value} is a shape of a family that is outside the scope; nothing is checked.`,
      { title: 'Shape outside the scope', clause: clause('B4') },
    );
    return null;
  }
  if (member.ends.value !== 'held' && !sprung(input, member)) {
    const words = {
      free: 'One end is free (a cantilever)',
      sway: 'The ends sway',
      springs:
        'The ends turn against springs, which the exact solution knows where their stiffness is given',
    }[member.ends.value];
    r.notice(
      'C2/outside',
      'outside scope',
      `ends-${member.ends.value}`,
      `${words}. Only members held at both ends, in both planes and against twist, are within the scope; nothing is checked.`,
      {
        title: 'Ends outside the scope',
        clause: clause(member.ends.value === 'sway' ? 'App. 8.1.3' : 'App. 7.2'),
      },
    );
    return null;
  }
  const steel = steelLines(r, member.steel, input.constants);
  const section = sectionLines(r, member.shape, member.steel);
  try {
    return strengthsOf(input, member, r, { given, places, steel, section });
  } catch (error) {
    if (!(error instanceof NotComputable)) throw error;
    return null;
  }
}

function strengthsOf(
  input: ResolvedInput,
  member: ResolvedMember,
  r: Recorder,
  parts: {
    readonly given: GivenLengths;
    readonly places: Places;
    readonly steel: SteelQuantities;
    readonly section: SectionQuantities;
  },
): MemberStrengths {
  const { steel, section } = parts;
  const { combinations } = member;
  const { design } = input;
  // Lateral translation may turn tension into compression and the other way round.
  const swayed = (c: ResolvedCombination) => (c.sway?.P?.value ?? 0) !== 0;
  const compressed = combinations.some((c) => c.P.value > 0 || swayed(c));
  const pulled = combinations.some((c) => c.P.value < 0 || swayed(c));
  const bent = (axis: Axis) => combinations.some((c) => bends(c, axis));
  const sheared = (axis: Axis) =>
    combinations.some((c) => (bends(c, axis) || c.shears[axis]) && shearKnown(c, axis));
  const q = memberQuantities(r, member, parts.given, parts.places, section, compressed);
  const { Lcx, Lcy, Lcz } = q;

  r.section('factors', `Factors, ${design}`);
  const usesAlpha =
    compressed ||
    input.analysis.sway === 'B2' ||
    input.provisions.has('H1.2-Cb') ||
    member.springs !== null;
  const alpha = usesAlpha ? methodConstant(r, 'loadLevel', design) : null;
  const phic = compressed ? methodConstant(r, 'compression', design) : null;
  const phib = bent('x') || bent('y') ? methodConstant(r, 'flexure', design) : null;
  if (input.driftRatio) driftRatioLine(r, input, input.driftRatio);
  const offset = q.offset && ({ axis: 'y', distance: q.offset } as const);
  const compression =
    phic && Lcx && Lcy && Lcz
      ? compressionStrength(
          r,
          design,
          steel,
          section,
          { Lcx, Lcy, Lcz, offset },
          phic,
          input.analysis.method !== 'effective-length',
        )
      : null;
  const net = pulled ? netSectionLines(r, member) : null;
  const tension = pulled ? tensionStrength(r, design, steel, section, net) : null;
  if (tension) tensionSlenderness(r, q.L, [section.rx, section.ry]);
  const Lb = q.Lb ?? (member.restraints ? q.L : null);
  const plain = bent('x') && Lb && phib ? majorStrengths(r, steel, section, Lb, phib) : null;
  const major = plain && member.restraints === null ? withStatedLength(r, plain, Lb) : plain;
  const Cb =
    major && member.Cb !== 'auto'
      ? r.given('given/Cb', 'Cb', 'none', member.Cb, {
          title: 'Modification factor as given',
          clause: clause('F1'),
        })
      : null;
  const Mcy = bent('y') && phib ? minorStrength(r, design, steel, section, phib) : null;
  const a = member.stiffeners
    ? r.given('given/a', 'a', 'length', member.stiffeners, {
        title: 'Clear distance between transverse stiffeners',
      })
    : null;
  const shear = (axis: Axis) =>
    sheared(axis) ? shearStrength(r, design, steel, section, axis, a ? { a } : {}) : null;
  return {
    ...{ input, member, q, steel, section, alpha, compression, tension, Mcy, Cb },
    major: major && fixedStrength(r, design, major, Cb),
    shear: { x: shear('x'), y: shear('y') },
  };
}

/** Ends that turn against springs whose stiffness is given: the exact solution knows them. */
const sprung = (input: ResolvedInput, { ends, springs }: ResolvedMember): boolean =>
  ends.value === 'springs' &&
  springs !== null &&
  input.analysis.secondOrder === 'exact' &&
  input.analysis.sway === 'none';

/** Second-order over first-order drift against the limit of the method. */
function driftRatioLine(r: Recorder, input: ResolvedInput, given: GivenValue): void {
  const ratio = r.given('given/driftRatio', 'driftRatio', 'none', given, {
    title: 'Second-order over first-order drift of the structure',
  });
  secondOrderRatio(r, input.analysis.method, ratio);
}

function netSectionLines(r: Recorder, { netSection }: ResolvedMember): NetSection | null {
  if (!netSection) return null;
  if ('Ae' in netSection)
    return {
      Ae: r.given('given/Ae', 'Ae', 'area', netSection.Ae, { title: 'Effective net area' }),
    };
  return {
    An: r.given('given/An', 'An', 'area', netSection.An, { title: 'Net area' }),
    U: r.given('given/U', 'U', 'none', netSection.U, { title: 'Shear lag factor' }),
  };
}
