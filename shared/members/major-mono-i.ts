import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  builtUpFlangeClass,
  compressedWebRatio,
  monoWebClass,
} from '../standards/aisc360-22/b4-flexure.ts';
import { coefficientKc } from '../standards/aisc360-22/b4-kc.ts';
import { stressFL, stressFLFull } from '../standards/aisc360-22/f4.ts';
import { flangeShare } from '../standards/aisc360-22/f13.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { compactOrNoncompactWeb, slenderWeb } from './major-flanged.ts';
import type { MajorSection } from './major-section.ts';
import type { MonoISection, SteelQuantities } from './section-quantities.ts';

/**
 * F4 or F5 for a singly symmetric I-shape with its `compressed` flange, by the class of its web;
 * null after an outside-scope notice, beyond the proportions of F13.2.
 */
export function majorMonoI(
  r: Recorder,
  steel: SteelQuantities,
  s: MonoISection,
  compressed: 'top' | 'bottom',
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  const { E, Fy } = steel;
  const { Zx, Sx, Iy, J, ho, tw, h, lambdaw } = s;
  const [flangeC, flangeT] = compressed === 'top' ? [s.top, s.bottom] : [s.bottom, s.top];
  const { hc, hp } = flangeC;
  r.section('F13', `Proportions, ${compressed} flange in compression`, clause('F13.2'));
  const IycIy = flangeShare(r, { Iyc: flangeC.Iyf, Iy });
  if (!IycIy) return null;
  r.section('B4/x', 'Width-to-thickness ratios, major-axis flexure', clause('B4.1'));
  if (hc.value <= 0) {
    r.choice(
      'B4/x/web/elastic',
      [{ left: hc, relation: '<=', right: 0, outcome: 'the web is in tension only' }],
      '',
      { title: 'Place of the centroid', clause: clause('B4.1', 'Table B4.1b, 16') },
    );
    r.notice(
      'F4/outside',
      'outside scope',
      'web-not-compressed',
      'The centroid lies in the compression flange: no part of the web is in compression, and hc of F4 and F5 has no meaning. Major-axis flexure is not checked.',
      { title: 'Web without compression', clause: clause('F4') },
    );
    return null;
  }
  const lambdahc = compressedWebRatio(r, { hc, tw });
  const web = monoWebClass(r, steel, { Zx, Sx, hc, hp, lambdahc });
  const slender = web.class === 'slender';
  const moduli = { Sxc: flangeC.S, Sxt: flangeT.S };
  const FL = slender ? stressFLFull(r, 'B4/x', Fy) : stressFL(r, 'B4/x', { Fy, ...moduli });
  const kc = coefficientKc(r, 'B4/x', lambdaw);
  const flange = builtUpFlangeClass(r, steel, flangeC.lambda, kc, FL);
  const chapter = slender ? 'F5' : 'F4';
  r.section(chapter, 'Major-axis flexural strength', clause(chapter));
  const q = {
    ...{ E, Fy, Zx, Sx, ...moduli, J, ho, tw, hc, h, IycIy },
    ...{ bfc: flangeC.b, tfc: flangeC.t, lambdaf: flangeC.lambda, lambdahc, lambdaw },
  };
  const classes = { flange, web };
  return slender
    ? slenderWeb(r, q, classes, kc, longest, phib)
    : compactOrNoncompactWeb(r, q, classes, FL, kc, longest, phib);
}
