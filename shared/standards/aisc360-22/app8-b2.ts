import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { type StabilityMethod, secondOrderRatio } from './c2.ts';
import { clause, formula } from './writer.ts';

// Appendix 8.1.1 and 8.1.3: lateral translation of a story, one story and direction at a time.
const RM = { clause: 'App. 8.1.3', symbol: 'RM', dimension: 'none' } as const;
const RM_TITLE = 'Effect of member curvature on the story';

export const app8B2Formulas = {
  RM: formula({
    ...{ ...RM, id: 'A-8-8', equation: 'A-8-8', title: RM_TITLE },
    expression: '1-0.15*(Pmf/Pstory)',
    operands: { Pmf: 'force', Pstory: 'force' },
    prints: 'display',
  }),
  RMbraced: formula({
    ...{ ...RM, id: 'App.8-RM-braced', title: `${RM_TITLE}, no moment frames` },
    ...{ expression: '1', operands: {} },
  }),
  RMleast: formula({
    ...{ ...RM, id: 'App.8-RM-least', title: `${RM_TITLE}, lower bound` },
    ...{ expression: '0.85', operands: {} },
  }),
  storyStrength: formula({
    id: 'A-8-7',
    clause: 'App. 8.1.3',
    equation: 'A-8-7',
    title: 'Elastic critical strength of the story',
    symbol: 'Pestory',
    dimension: 'force',
    expression: 'RM*Hstory*Lstory/DeltaH',
    operands: { RM: 'none', Hstory: 'force', Lstory: 'length', DeltaH: 'deflection' },
  }),
  share: formula({
    id: 'App.8-story-share',
    clause: 'App. 8.1.3',
    title: 'Story load over its elastic critical strength',
    symbol: 'storyShare',
    dimension: 'none',
    expression: 'alpha*Pstory/Pestory',
    operands: { alpha: 'none', Pstory: 'force', Pestory: 'force' },
    prints: 'display',
  }),
  B2: formula({
    id: 'A-8-6',
    clause: 'App. 8.1.3',
    equation: 'A-8-6',
    title: 'Story multiplier before its lower limit',
    symbol: 'B2trial',
    dimension: 'none',
    expression: '1/(1-alpha*Pstory/Pestory)',
    operands: { alpha: 'none', Pstory: 'force', Pestory: 'force' },
    prints: 'display',
    validity: 'where αPstory < Pe,story',
  }),
  B2least: formula({
    id: 'A-8-6-least',
    clause: 'App. 8.1.3',
    equation: 'A-8-6',
    title: 'Story multiplier at its lower limit',
    symbol: 'B2',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
  requiredAxial: formula({
    id: 'A-8-2',
    clause: 'App. 8.1.1',
    equation: 'A-8-2',
    title: 'Required axial strength with lateral translation',
    symbol: 'Pr',
    dimension: 'force',
    expression: 'Pnt+B2*Plt',
    operands: { Pnt: 'force', B2: 'none', Plt: 'force' },
    prints: 'display',
  }),
  requiredMoment: formula({
    id: 'A-8-1-sway',
    clause: 'App. 8.1.1',
    equation: 'A-8-1',
    title: 'Amplified moment with lateral translation',
    symbol: 'Mr',
    dimension: 'moment',
    expression: 'B1*abs(Mnt)+B2*abs(Mlt)',
    operands: { B1: 'none', Mnt: 'moment', B2: 'none', Mlt: 'moment' },
    prints: 'display',
  }),
};

/** Pe,story as given, or by A-8-7 from the story's shear, height and first-order drift, all sizes. */
export type StoryStrength =
  | { readonly Pestory: Quantity }
  | {
      /** 'braced': no moment frames; 'lower bound': 0.85; else A-8-8 with the load on moment frames. */
      readonly RM: 'braced' | 'lower bound' | { readonly Pmf: Quantity };
      readonly H: Quantity;
      readonly L: Quantity;
      /** Under H, with the stiffness of the analysis: reduced in the direct analysis method. */
      readonly DeltaH: Quantity;
    };

export interface Story {
  readonly alpha: Quantity;
  /** Vertical load on the story at the level of the design method, leaning columns included. */
  readonly Pstory: Quantity;
  readonly strength: StoryStrength;
  readonly method: StabilityMethod;
}

/** A-8-8, the lower bound or 1; null with a failed notice where frames carry more than the story. */
function curvatureEffect(
  r: Recorder,
  at: string,
  RM: 'braced' | 'lower bound' | { readonly Pmf: Quantity },
  Pstory: Quantity,
): Quantity | null {
  if (RM === 'braced') return r.formula(app8B2Formulas.RMbraced, `${at}/RM`, {});
  if (RM === 'lower bound') return r.formula(app8B2Formulas.RMleast, `${at}/RM`, {});
  const title = 'Load on the columns of moment frames';
  const above = r.choice(
    `${at}/RM/limit`,
    [{ left: RM.Pmf, relation: '>', right: Pstory, outcome: 'it exceeds the load on the story' }],
    'it is part of the load on the story',
    { title, clause: clause('App. 8.1.3', 'A-8-8') },
  );
  if (above !== 0) return r.formula(app8B2Formulas.RM, `${at}/RM`, { Pmf: RM.Pmf, Pstory });
  r.notice(
    `${at}/RM/failed`,
    'failed',
    'frame-load-above-story-load',
    'The columns of the moment frames carry more than the story: one of the two loads is wrong.',
    { title, clause: clause('App. 8.1.3', 'A-8-8') },
  );
  return null;
}

/**
 * B2 of A-8-6, not less than 1, under `at` (`App8/x`). 'failed' at or above the critical strength of
 * the story; 'outside scope' where the method of the analysis doesn't allow so large a multiplier.
 * In the first-order method B2 only measures the drift (App. 7.3.1) and multiplies nothing.
 */
export function multiplierB2(
  r: Recorder,
  at: string,
  { alpha, Pstory, strength, method }: Story,
): Quantity | 'failed' | 'outside scope' {
  const Pestory = 'Pestory' in strength ? strength.Pestory : storyStrength(r, at, strength, Pstory);
  if (!Pestory) return 'failed';
  const load = { alpha, Pstory, Pestory };
  const share = r.formula(app8B2Formulas.share, `${at}/B2/share`, load);
  const title = 'Story load against its critical strength';
  const unstable = r.choice(
    `${at}/B2/stable`,
    [{ left: share, relation: '>=', right: 1, outcome: 'the story is unstable' }],
    'a second-order drift exists',
    { title, clause: clause('App. 8.1.3', 'A-8-6') },
  );
  if (unstable === 0) {
    r.notice(
      `${at}/B2/unstable`,
      'failed',
      'story-at-critical-strength',
      'The vertical load on the story at the LRFD load level reaches or exceeds its elastic critical strength. No finite second-order drift exists: stiffen the story.',
      { title: 'Story unstable', clause: clause('App. 8.1.3', 'A-8-6') },
    );
    return 'failed';
  }
  const trial = r.formula(app8B2Formulas.B2, `${at}/B2/trial`, load);
  const taken = r.choice(
    `${at}/B2/limit`,
    [{ left: trial, relation: '>=', right: 1, outcome: 'the multiplier stands as computed' }],
    'the multiplier is 1',
    { title: 'Lower limit of the story multiplier', clause: clause('App. 8.1.3', 'A-8-6') },
  );
  const B2 = taken === 0 ? trial : r.formula(app8B2Formulas.B2least, `${at}/B2`, {});
  return secondOrderRatio(r, method, B2, `${at}/B2/ratio`) ? B2 : 'outside scope';
}

function storyStrength(
  r: Recorder,
  at: string,
  { RM, H, L, DeltaH }: Exclude<StoryStrength, { readonly Pestory: Quantity }>,
  Pstory: Quantity,
): Quantity | null {
  const factor = curvatureEffect(r, at, RM, Pstory);
  return (
    factor &&
    r.formula(app8B2Formulas.storyStrength, `${at}/Pestory`, {
      RM: factor,
      ...{ Hstory: H, Lstory: L, DeltaH },
    })
  );
}

/** A-8-2: Pr = Pnt + B2 Plt, both signed, compression positive; the result may be tension. */
export const requiredAxial = (
  r: Recorder,
  Pnt: Quantity,
  Plt: Quantity,
  B2: Quantity,
  at = 'App8',
): Quantity => r.formula(app8B2Formulas.requiredAxial, `${at}/Pr`, { Pnt, B2, Plt });

/**
 * A-8-1: Mr = B1 |Mnt| + B2 |Mlt| with the largest moments along the member of the two first-order
 * analyses, as if at one place: their sizes add, whatever their signs.
 */
export const requiredMoment = (
  r: Recorder,
  axis: 'x' | 'y',
  B1: Quantity,
  Mnt: Quantity,
  B2: Quantity,
  Mlt: Quantity,
): Quantity =>
  r.formula(
    app8B2Formulas.requiredMoment,
    `App8/${axis}/Mr`,
    { B1, Mnt, B2, Mlt },
    {
      title: `Amplified moment with lateral translation, ${axis === 'x' ? 'major' : 'minor'} axis`,
    },
  );
