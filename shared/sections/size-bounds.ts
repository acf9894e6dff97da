import type { GivenValue } from '../calc/quantity.ts';
import type { SectionSizes } from './sizes.ts';

/** What is wrong with sizes that are each above zero: the size and a sentence for its field. */
export interface SizeProblem {
  readonly size: string;
  readonly message: string;
}

/** Whether the plates and walls fit together; none: they do. */
export function sizeProblems(s: SectionSizes): readonly SizeProblem[] {
  const found: SizeProblem[] = [];
  const want = (holds: boolean, size: string, given: GivenValue, words: string) => {
    if (!holds) found.push({ size, message: `is ${given.text}; ${words}` });
  };
  switch (s.shape) {
    case 'i':
      want(2 * s.tf.value < s.d.value, 'tf', s.tf, `two of it must be less than d = ${s.d.text}`);
      want(s.tw.value < s.bf.value, 'tw', s.tw, `it must be less than bf = ${s.bf.text}`);
      break;
    case 'mono-i':
      want(
        s.tfTop.value + s.tfBottom.value < s.d.value,
        'tfTop',
        s.tfTop,
        `with tfBottom = ${s.tfBottom.text} it must be less than d = ${s.d.text}`,
      );
      for (const [size, bf] of [
        ['bfTop', s.bfTop],
        ['bfBottom', s.bfBottom],
      ] as const)
        want(s.tw.value < bf.value, size, bf, `it must exceed tw = ${s.tw.text}`);
      want(
        s.bfTop.value !== s.bfBottom.value || s.tfTop.value !== s.tfBottom.value,
        'bfTop',
        s.bfTop,
        'both flanges are the same; give the shape "i"',
      );
      break;
    case 'box':
      want(2 * s.tf.value < s.d.value, 'tf', s.tf, `two of it must be less than d = ${s.d.text}`);
      want(2 * s.tw.value < s.B.value, 'tw', s.tw, `two of it must be less than B = ${s.B.text}`);
      break;
    case 'tube':
      want(
        s.Ht.value >= s.B.value,
        'Ht',
        s.Ht,
        `it must not be less than B = ${s.B.text}: x is the major axis`,
      );
      if (s.Ro) {
        want(s.Ro.value >= s.t.value, 'Ro', s.Ro, `it must not be less than t = ${s.t.text}`);
        want(2 * s.Ro.value < s.B.value, 'Ro', s.Ro, `two of it must be less than B = ${s.B.text}`);
      } else
        want(
          4 * s.t.value < s.B.value,
          't',
          s.t,
          `with an outside corner radius of 2t, four of it must be less than B = ${s.B.text}; give the radius Ro`,
        );
      want(2 * s.t.value < s.B.value, 't', s.t, `two of it must be less than B = ${s.B.text}`);
      break;
    case 'round':
      want(2 * s.t.value < s.D.value, 't', s.t, `two of it must be less than D = ${s.D.text}`);
  }
  return found;
}
