import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { multiplierB2, type StoryStrength } from '../standards/aisc360-22/app8-b2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { endMomentFormulas } from '../standards/elastic-theory/end-moments.ts';
import { type Axis, WORD } from './bay-moments.ts';
import type { ResolvedInput, SwayDirection } from './resolved.ts';

/** B2 of the story that sways when the member bends about an axis; a word where there is none. */
export function storyMultiplier(
  r: Recorder,
  input: ResolvedInput,
  axis: Axis,
  alpha: Quantity,
  direction: SwayDirection,
): Quantity | 'failed' | 'outside scope' {
  const at = `App8/${axis}`;
  const word = WORD[axis];
  r.section(`${at}/B2`, `Sway of the story, ${word}-axis bending`, clause('App. 8.1.3'));
  const given = (
    name: string,
    symbol: string,
    dimension: Quantity['dimension'],
    value: SwayDirection['Pstory'],
    title: string,
  ) => r.given(`given/sway/${axis}/${name}`, symbol, dimension, value, { title });
  const Pstory = given('Pstory', 'Pstory', 'force', direction.Pstory, 'Vertical load on the story');
  const strength = (): StoryStrength => {
    const { PeStory, stiffness } = direction;
    if (PeStory)
      return {
        Pestory: given(
          'PeStory',
          'Pestory',
          'force',
          PeStory,
          'Elastic critical strength of the story',
        ),
      };
    if (!stiffness) throw new Error('a story has its critical strength or its stiffness');
    const { H, height, drift, RM } = stiffness;
    return {
      H: given('H', 'Hstory', 'force', H, 'Story shear of the drift'),
      L: given('height', 'Lstory', 'length', height, 'Height of the story'),
      DeltaH: given(
        'drift',
        'DeltaH',
        'deflection',
        drift,
        'First-order story drift under that shear',
      ),
      RM:
        typeof RM === 'string'
          ? RM
          : { Pmf: given('Pmf', 'Pmf', 'force', RM, 'Load on the columns of moment frames') },
    };
  };
  return multiplierB2(r, at, {
    ...{ alpha, Pstory, strength: strength() },
    method: input.analysis.method,
  });
}

/** The larger of the end moments from lateral translation, as a size; null where both are none. */
export function translationMoment(
  r: Recorder,
  axis: Axis,
  direction: SwayDirection,
): Quantity | null {
  const word = WORD[axis];
  const sizes = (['A', 'B'] as const).flatMap((end) => {
    const given = direction[`M${end}`];
    if (!given || given.value === 0) return [];
    const M = r.given(`given/sway/${axis}/M${end}`, 'Mlt', 'moment', given, {
      title: `Moment from lateral translation at end ${end}, ${word} axis`,
    });
    const title = `Its size at end ${end}`;
    return [
      r.formula(endMomentFormulas.size, `App8/${axis}/Mlt/${end}`, { M }, { symbol: 'Mlt', title }),
    ];
  });
  const [first] = sizes;
  if (!first) return null;
  return r.governing(`App8/${axis}/Mlt`, 'max', sizes, {
    title: `Largest moment from lateral translation, ${word} axis`,
    symbol: 'Mlt',
    clause: clause('App. 8.1.1', 'A-8-1'),
  });
}
