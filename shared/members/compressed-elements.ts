import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  type b4CompressionFormulas,
  isSlender,
  type LimitOperands,
  slenderLimit,
} from '../standards/aisc360-22/b4-compression.ts';
import { coefficientKc } from '../standards/aisc360-22/b4-kc.ts';
import { type CompressedElement, e7Formulas } from '../standards/aisc360-22/e7.ts';
import type {
  BoxSection,
  ChannelSection,
  FlangeOfI,
  ISection,
  MonoISection,
  RectHssSection,
  SectionQuantities,
} from './section-quantities.ts';

type Row = keyof typeof b4CompressionFormulas;
type Unclassified = Omit<CompressedElement, 'lambdar' | 'slender'>;

const classified = (
  r: Recorder,
  row: Row,
  e: Unclassified,
  lambdar: Quantity,
): CompressedElement => ({
  ...e,
  lambdar,
  slender: isSlender(r, row, e.name, e.words, e.lambda, lambdar),
});

const FLANGE = { words: 'flange', plural: 'flanges', role: 'flange', constants: 'other' } as const;
const WEB = { name: 'web', words: 'web', plural: 'web', role: 'web', count: 1 } as const;

/** An unstiffened width of half a flange. */
const halfWidth = (
  r: Recorder,
  name: string,
  bf: Quantity,
  more: { title?: string; symbol?: string } = {},
): Quantity => r.formula(e7Formulas.flangeWidth, `E7/${name}/b`, { bf }, more);

/** The web of a shape whose table gives h/tw. */
const webOf = (
  r: Recorder,
  s: { readonly lambdaw: Quantity; readonly tw: Quantity },
  title?: string,
): Unclassified => ({
  ...WEB,
  constants: 'stiffened',
  lambda: s.lambdaw,
  t: s.tw,
  width: () =>
    r.formula(
      e7Formulas.webDepth,
      'E7/web/h',
      { lambdaw: s.lambdaw, tw: s.tw },
      { ...(title && { title }) },
    ),
});

function ofI(r: Recorder, steel: LimitOperands, s: ISection): readonly CompressedElement[] {
  const rolled = s.made === 'rolled';
  const row = rolled ? 'flange' : 'builtUpFlange';
  const limits = rolled ? steel : { ...steel, kc: coefficientKc(r, 'B4/compression', s.lambdaw) };
  const flange = classified(
    r,
    row,
    {
      ...FLANGE,
      name: 'flange',
      count: 4,
      lambda: s.lambdaf,
      t: s.tf,
      width: () => halfWidth(r, 'flange', s.bf),
    },
    slenderLimit(r, row, 'flange', limits),
  );
  const web = webOf(r, s, rolled ? undefined : 'Clear depth of the web');
  return [classified(r, 'web', web, slenderLimit(r, 'web', 'web', steel)), flange];
}

function ofMonoI(r: Recorder, steel: LimitOperands, s: MonoISection): readonly CompressedElement[] {
  const limits = { ...steel, kc: coefficientKc(r, 'B4/compression', s.lambdaw) };
  const lambdar = slenderLimit(r, 'builtUpFlange', 'flange', limits);
  const flange = (side: 'top' | 'bottom', { b, t, lambda }: FlangeOfI) => {
    const name = `${side}-flange`;
    const words = `${side} flange`;
    return classified(
      r,
      'builtUpFlange',
      {
        ...{ name, words, plural: words, role: 'flange', constants: 'other', count: 2, lambda, t },
        width: () =>
          halfWidth(r, name, b, {
            title: `Half of the width of the ${words}`,
            symbol: `b${side}`,
          }),
        effective: `be${side}`,
      },
      lambdar,
    );
  };
  const flanges = [flange('top', s.top), flange('bottom', s.bottom)];
  const web = {
    ...WEB,
    ...({ constants: 'stiffened', lambda: s.lambdaw, t: s.tw, width: () => s.h } as const),
  };
  const webLimit = slenderLimit(r, 'otherStiffened', 'web', steel, {
    title: 'Slender limit of the web in compression',
    symbol: 'lambdarwc',
  });
  return [classified(r, 'otherStiffened', web, webLimit), ...flanges];
}

function ofChannel(
  r: Recorder,
  steel: LimitOperands,
  s: ChannelSection,
): readonly CompressedElement[] {
  const flange = classified(
    r,
    'flange',
    // B4.1: the full width of a channel's flange.
    { ...FLANGE, name: 'flange', count: 2, lambda: s.lambdaf, t: s.tf, width: () => s.bf },
    slenderLimit(r, 'flange', 'flange', steel),
  );
  return [classified(r, 'web', webOf(r, s), slenderLimit(r, 'web', 'web', steel)), flange];
}

/** Walls by the axis they serve in major-axis flexure: two flange walls, two web walls. */
const wallWords = (role: 'web' | 'flange', plate: 'wall' | 'plate') =>
  ({ name: role, words: `${role} ${plate}`, plural: `${role} ${plate}s`, role, count: 2 }) as const;

function ofRectHss(
  r: Recorder,
  steel: LimitOperands,
  s: RectHssSection,
): readonly CompressedElement[] {
  const { t } = s;
  const lambdar = slenderLimit(r, 'wall', 'wall', steel);
  const width = (name: string, lambda: Quantity, symbol: 'b' | 'h') => () =>
    r.formula(e7Formulas.wallWidth, `E7/${name}/${symbol}`, { lambda, t }, { symbol });
  const wall = { constants: 'wall', t } as const;
  if (s.square)
    return [
      classified(
        r,
        'wall',
        {
          ...wall,
          ...({ name: 'wall', words: 'wall', plural: 'walls', role: 'flange', count: 4 } as const),
          lambda: s.lambdab,
          width: width('wall', s.lambdab, 'b'),
        },
        lambdar,
      ),
    ];
  const flange = {
    ...{ ...wall, ...wallWords('flange', 'wall'), lambda: s.lambdab },
    width: width('flange', s.lambdab, 'b'),
  };
  const web = {
    ...{ ...wall, ...wallWords('web', 'wall'), lambda: s.lambdah },
    width: width('web', s.lambdah, 'h'),
  };
  const classes = [flange, web].map((e) => classified(r, 'wall', e, lambdar));
  return classes.reverse();
}

function ofBox(r: Recorder, steel: LimitOperands, s: BoxSection): readonly CompressedElement[] {
  const lambdar = slenderLimit(r, 'otherStiffened', 'plate', steel, {
    title: 'Slender limit of the plates in compression',
  });
  const plate = { constants: 'stiffened' } as const;
  const flange = {
    ...{ ...plate, ...wallWords('flange', 'plate'), lambda: s.lambdab, t: s.tf },
    width: () => s.b,
  };
  const web = {
    ...{ ...plate, ...wallWords('web', 'plate'), lambda: s.lambdah, t: s.tw },
    width: () => s.h,
  };
  const classes = [flange, web].map((e) => classified(r, 'otherStiffened', e, lambdar));
  return classes.reverse();
}

/**
 * B4.1, Table B4.1a: the elements of a section with their classes, webs first. Rows 1 and 5 for
 * rolled I-shapes and channels, 2 for flanges of built-up I-shapes, 6 for HSS, 8 for box plates and
 * webs of singly symmetric I-shapes.
 */
export function compressedElements(
  r: Recorder,
  steel: LimitOperands,
  s: Exclude<SectionQuantities, { kind: 'round' }>,
): readonly CompressedElement[] {
  switch (s.kind) {
    case 'i':
      return ofI(r, steel, s);
    case 'mono-i':
      return ofMonoI(r, steel, s);
    case 'channel':
      return ofChannel(r, steel, s);
    case 'rect-hss':
      return ofRectHss(r, steel, s);
    case 'box':
      return ofBox(r, steel, s);
  }
}
