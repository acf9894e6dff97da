import type { GivenValue } from '../calc/quantity.ts';
import type { DimensionName } from '../units/dimension.ts';
import type { Given } from './given-values.ts';
import type { CombinationInput } from './input.ts';
import type { ResolvedSway, SwayDirection } from './resolved.ts';
import type { SwayDirectionInput } from './sway-input.ts';

type Read = (path: string, given: Given | undefined, d: DimensionName) => GivenValue | null;

/** Sway of a force set (App. 8.1.3); null where it gives none. */
export function resolveSway(
  sway: CombinationInput['sway'],
  path: string,
  problem: (path: string, message: string) => void,
  read: Read,
): ResolvedSway | null {
  if (sway === undefined) return null;
  const direction = (axis: 'x' | 'y'): SwayDirection | null => {
    const given = sway[axis];
    return given ? readDirection(given, `${path}.sway.${axis}`, problem, read) : null;
  };
  return {
    P: read(`${path}.sway.P`, sway.P, 'force'),
    x: direction('x'),
    y: direction('y'),
  };
}

function readDirection(
  given: SwayDirectionInput,
  at: string,
  problem: (path: string, message: string) => void,
  read: Read,
): SwayDirection | null {
  const positive = (field: 'PeStory' | 'H' | 'height' | 'drift', dimension: DimensionName) => {
    const found = read(`${at}.${field}`, given[field], dimension);
    if (found && found.value <= 0)
      problem(`${at}.${field}`, `is ${found.text}; it must be above zero`);
    return found;
  };
  const MA = read(`${at}.MA`, given.MA, 'moment');
  const MB = read(`${at}.MB`, given.MB, 'moment');
  const Pstory = read(`${at}.Pstory`, given.Pstory, 'force');
  if (Pstory && Pstory.value < 0)
    problem(`${at}.Pstory`, `is ${Pstory.text}; the load of the story is positive downwards`);
  const PeStory = positive('PeStory', 'force');
  if (!Pstory) return null;
  if (PeStory) return { MA, MB, Pstory, PeStory, stiffness: null };
  const H = positive('H', 'force');
  const height = positive('height', 'length');
  const drift = positive('drift', 'deflection');
  for (const field of ['H', 'height', 'drift'] as const)
    if (given[field] === undefined)
      problem(
        `${at}.${field}`,
        'is needed where the elastic critical load of the story (PeStory) is not given: A-8-7 uses the story shear H, its height and its first-order drift',
      );
  if (!H || !height || !drift) return null;
  const Pmf = read(`${at}.Pmf`, given.Pmf, 'force');
  if (!Pmf && !given.RM)
    problem(
      `${at}.Pmf`,
      'is needed for R_M (A-8-8), or say with RM that the story is "braced" or that the "lower bound" of 0.85 is taken',
    );
  if (Pmf && (Pmf.value < 0 || Pmf.value > Pstory.value))
    problem(`${at}.Pmf`, `is ${Pmf.text}; it must lie between zero and the load of the story`);
  return {
    MA,
    MB,
    Pstory,
    PeStory: null,
    stiffness: { H, height, drift, RM: Pmf ?? given.RM ?? 'lower bound' },
  };
}
