import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { ResolvedCombination, ResolvedInput, ResolvedMember } from './resolved.ts';

export interface GivenLengths {
  readonly L: Quantity;
  readonly Lcx: Quantity | null;
  readonly Lcy: Quantity | null;
  readonly Lcz: Quantity | null;
  readonly Lb: Quantity | null;
}

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
): GivenLengths {
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
  const swayWords =
    sway.value === 'none'
      ? 'none: the ends do not translate'
      : 'the stories sway: moments from lateral translation are multiplied by B2';
  r.statement('given/sway', swayWords, sway.source, sway.confirmed, {
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
      springs: 'held against movement and twist, turning against rotational springs',
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
  const instead = member.restraints ? ', in place of that from the restraints' : '';
  const length = (symbol: 'Lcx' | 'Lcy' | 'Lcz' | 'Lb', words: string): Quantity | null => {
    const given = member[symbol];
    const title = `${words}${instead}`;
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
