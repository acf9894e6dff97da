import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { PROPERTY_NAMES, type PropertyName, W_TABLE, type WShape } from '../sections/table.ts';
import { SPECIFICATION } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { parseQuantity } from '../units/parse.ts';
import { MODULI } from './material.ts';
import type { ResolvedCombination, ResolvedInput, ResolvedMember } from './resolved.ts';

export interface SteelQuantities {
  readonly E: Quantity;
  readonly G: Quantity;
  readonly Fy: Quantity;
}

export type SectionQuantities = Readonly<Record<PropertyName, Quantity>>;

export interface MemberQuantities {
  readonly L: Quantity;
  readonly Lcx: Quantity | null;
  readonly Lcy: Quantity | null;
  readonly Lcz: Quantity | null;
  readonly Lb: Quantity | null;
}

const PROPERTY_TITLES: Record<PropertyName, string> = {
  A: 'Gross area',
  d: 'Depth',
  bf: 'Flange width',
  tw: 'Web thickness',
  tf: 'Flange thickness',
  kdes: 'Outer face to web toe of fillet',
  lambdaf: 'Flange width-to-thickness ratio',
  lambdaw: 'Web width-to-thickness ratio',
  Ix: 'Second moment of area, major axis',
  Sx: 'Elastic modulus, major axis',
  Zx: 'Plastic modulus, major axis',
  rx: 'Radius of gyration, major axis',
  Iy: 'Second moment of area, minor axis',
  Sy: 'Elastic modulus, minor axis',
  Zy: 'Plastic modulus, minor axis',
  ry: 'Radius of gyration, minor axis',
  J: 'Torsional constant',
  Cw: 'Warping constant',
  rts: 'Effective radius of gyration',
  ho: 'Distance between flange centroids',
};

const METHOD_WORDS = {
  direct: 'direct analysis method',
  'effective-length': 'effective length method',
  'first-order': 'first-order analysis method',
} as const;

/** What each method asks of the analysis behind the forces; taken as given, not checked here. */
const METHOD_LIMITS = {
  direct: [
    'C2',
    'The initial imperfections (C2.2) and the reduced stiffness (C2.3) are taken to be in the analysis that gave the forces; this is not checked here.',
  ],
  'effective-length': [
    'App. 7.2',
    'The method is limited to second-order drift of at most 1.5 times the first-order one, with notional loads in the analysis; this is taken as given, not checked here.',
  ],
  'first-order': [
    'App. 7.3',
    'The method is limited to second-order drift of at most 1.5 times the first-order one, with its additional lateral loads in the analysis; this is taken as given, not checked here. Its limit of the axial force stands under each combination.',
  ],
} as const;

const hasEndMoments = ({ moments }: ResolvedCombination): boolean =>
  [moments.x, moments.y].some(({ A, B }) => A.value !== 0 || B.value !== 0);

/** Basis, restraints and lengths as given. Axis x is the major, y the minor axis. */
export function givenLines(
  r: Recorder,
  member: ResolvedMember,
  input: ResolvedInput,
): MemberQuantities {
  const { analysis } = input;
  r.section('given', 'Member as given');
  const basis = { kind: 'typed', note: 'Basis of the calculation' } as const;
  r.statement('given/method', `${METHOD_WORDS[analysis.method]}, ${input.design}`, basis, true, {
    title: 'Method of analysis',
    clause: clause('C1'),
  });
  r.statement(
    'given/secondOrder',
    {
      'from-analysis': analysis.includesMemberEffect
        ? 'taken from the analysis, which includes the effect of the axial force between the ends'
        : 'taken from the analysis, which leaves out the effect of the axial force between the ends',
      amplified: 'first-order moments amplified by Appendix 8',
      exact: 'exact elastic solution from first-order end moments',
    }[analysis.secondOrder],
    basis,
    true,
    { title: 'Second-order moments' },
  );
  const { sway } = input;
  r.statement('given/sway', 'none: the ends do not translate', sway.source, sway.confirmed, {
    title: 'Sway',
    clause: clause('App. 8.1'),
  });
  const [limitsClause, limits] = METHOD_LIMITS[analysis.method];
  r.notice('given/limits', 'note', 'method-limits', limits, {
    title: 'What the method asks of the analysis',
    clause: clause(limitsClause),
  });
  if (input.design === 'ASD' && analysis.secondOrder === 'from-analysis')
    r.notice(
      'given/level',
      'note',
      'asd-load-level',
      'Forces are at the ASD load level: where the analysis ran at 1.6 times the loads, its results are already divided by 1.6.',
      { title: 'Load level of the forces', clause: clause('C2.1') },
    );
  const { section, ends } = member;
  r.statement('given/section', section.value, section.source, section.confirmed, {
    title: 'Section',
  });
  r.statement(
    'given/ends',
    {
      held: 'held in both planes and against twist',
      free: 'one end free',
      sway: 'free to sway',
      springs: 'held by rotational springs',
    }[ends.value],
    ends.source,
    ends.confirmed,
    { title: 'Ends' },
  );
  if (member.combinations.some(hasEndMoments))
    r.statement(
      'given/sense',
      member.endMomentSign === 'bending'
        ? 'bending: equal signs bend the member in single curvature'
        : 'joint: equal signs turn both ends the same way, reverse curvature',
      { kind: 'typed' },
      true,
      { title: 'Sense of the end moments' },
    );
  const length = (symbol: 'Lcx' | 'Lcy' | 'Lcz' | 'Lb', title: string): Quantity | null => {
    const given = member[symbol];
    return given ? r.given(`given/${symbol}`, symbol, 'length', given, { title }) : null;
  };
  const lengths = {
    L: r.given('given/L', 'L', 'length', member.length, { title: 'Length of the member' }),
    Lcx: length('Lcx', 'Buckling length about the major axis'),
    Lcy: length('Lcy', 'Buckling length about the minor axis'),
    Lcz: length('Lcz', 'Torsional buckling length'),
    Lb: length('Lb', 'Laterally unbraced length'),
  };
  if (member.Lb?.value === 0 && member.Lb.source.kind === 'typed' && !member.Lb.source.note)
    r.notice(
      'given/continuous',
      'caution',
      'continuous-without-reason',
      'An unbraced length of zero says that the compression flange is held continuously. What holds it is not stated.',
      { title: 'Continuous lateral support', clause: clause('F2.2') },
    );
  return lengths;
}

const baseValue = (published: string, dimension: 'stress'): number => {
  const parsed = parseQuantity(published, dimension);
  if (!parsed.ok) throw new Error(`${published}: ${parsed.reason}`);
  return parsed.quantity.value;
};

/** In MPa: A514 and A709 Grade HPS 100W [690], the strongest that A3.1 lists. */
const HIGHEST_YIELD_STRESS = 690;

/** Constants of the steel: of its grade from the table, or as given; E and G of the standard. */
export function steelLines(
  r: Recorder,
  member: ResolvedMember,
  constants: 'us' | 'si',
): SteelQuantities {
  r.section('steel', 'Steel');
  const { steel } = member;
  const stress = (
    key: string,
    symbol: string,
    title: string,
    published: string,
    table: string,
    row: string,
    source: string,
  ) =>
    r.lookup(
      `steel/${key}`,
      symbol,
      'stress',
      {
        value: baseValue(published, 'stress'),
        published,
        table,
        row,
        column: symbol,
        tableSource: source,
      },
      { title },
    );
  const Fy =
    steel.kind === 'grade'
      ? stress(
          'Fy',
          'Fy',
          `Yield stress, ${steel.steel.title}`,
          steel.steel[constants].Fy,
          'Steels by grade',
          steel.steel.key,
          steel.steel.title,
        )
      : r.given('steel/Fy', 'Fy', 'stress', steel.Fy, { title: `Yield stress, ${steel.name}` });
  if (steel.kind === 'own' && Fy.value > HIGHEST_YIELD_STRESS)
    r.notice(
      'steel/unusual',
      'caution',
      'yield-stress-above-listed',
      'The yield stress exceeds 100 ksi (690 MPa), more than any steel that A3.1 lists has: see the number and its unit.',
      { title: 'Yield stress above those of the standard', clause: clause('A3.1') },
    );
  const standard = (symbol: 'E' | 'G', title: string) =>
    stress(
      symbol,
      symbol,
      title,
      MODULI[constants][symbol],
      'Symbols',
      constants === 'us' ? 'US customary' : 'SI',
      SPECIFICATION,
    );
  return { Fy, E: standard('E', 'Modulus of elasticity'), G: standard('G', 'Shear modulus') };
}

/** Every property of the shape that the checks use, as published. */
export function sectionLines(r: Recorder, shape: WShape): SectionQuantities {
  r.section('section', `Section ${shape.designation.replace(/X/g, '×')}`);
  return Object.fromEntries(
    PROPERTY_NAMES.map((name) => {
      const { value, dimension, published, column } = shape.properties[name];
      const found = {
        value,
        published,
        table: 'W shapes',
        row: shape.designation,
        column,
        tableSource: `${W_TABLE.title}, ${W_TABLE.publisher}`,
      };
      return [
        name,
        r.lookup(`section/${name}`, name, dimension, found, { title: PROPERTY_TITLES[name] }),
      ];
    }),
  ) as Record<PropertyName, Quantity>;
}
