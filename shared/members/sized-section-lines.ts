import type { GivenValue, Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import type { SectionSizes, Wall } from '../sections/sizes.ts';
import { designWall, wallSlenderness } from '../standards/aisc360-22/b4-wall.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { platesBox } from '../standards/section-properties/plates-box.ts';
import { platesI } from '../standards/section-properties/plates-i.ts';
import { platesMonoI } from '../standards/section-properties/plates-mono-i.ts';
import { rectangularTube, roundTube } from '../standards/section-properties/tube.ts';
import type { ResolvedSteel } from './material.ts';
import type { SectionQuantities } from './section-quantities.ts';

/** The sizes as given and every property by its formula; welds and fillets left out. */
export function sizedSectionLines(
  r: Recorder,
  sizes: SectionSizes,
  steel: ResolvedSteel,
): SectionQuantities {
  const given = (symbol: string, title: string, size: GivenValue): Quantity =>
    r.given(`section/${symbol}`, symbol, 'length', size, { title });
  switch (sizes.shape) {
    case 'i': {
      const q = {
        d: given('d', 'Depth', sizes.d),
        bf: given('bf', 'Flange width', sizes.bf),
        tf: given('tf', 'Flange thickness', sizes.tf),
        tw: given('tw', 'Web thickness', sizes.tw),
      };
      return { kind: 'i', made: 'built-up', ...q, ...platesI(r, q) };
    }
    case 'mono-i': {
      const q = {
        d: given('d', 'Depth', sizes.d),
        bftop: given('bftop', 'Width of the top flange', sizes.bfTop),
        tftop: given('tftop', 'Thickness of the top flange', sizes.tfTop),
        bfbot: given('bfbot', 'Width of the bottom flange', sizes.bfBottom),
        tfbot: given('tfbot', 'Thickness of the bottom flange', sizes.tfBottom),
        tw: given('tw', 'Web thickness', sizes.tw),
      };
      return { kind: 'mono-i', made: 'built-up', d: q.d, tw: q.tw, ...platesMonoI(r, q) };
    }
    case 'box': {
      const q = {
        B: given('B', 'Outside width', sizes.B),
        d: given('d', 'Outside depth', sizes.d),
        tf: given('tf', 'Flange thickness', sizes.tf),
        tw: given('tw', 'Web thickness', sizes.tw),
      };
      const square = sizes.B.value === sizes.d.value && sizes.tf.value === sizes.tw.value;
      const { tf, tw, d } = q;
      return { kind: 'box', square, tf, tw, d, ...platesBox(r, q) };
    }
    case 'tube': {
      const B = given('B', 'Outside width', sizes.B);
      const Ht = given('Ht', 'Outside height', sizes.Ht);
      const t = wallThickness(r, sizes, steel);
      const Ro = sizes.Ro && given('Ro', 'Outside corner radius', sizes.Ro);
      if (!Ro)
        r.notice(
          'section/corner',
          'note',
          'corner-radius-not-known',
          'The corner radius is not given: 2t outside for the properties, and flat widths of the outside size less 3t.',
          { title: 'Corner radius', clause: clause('B4.1b') },
        );
      const { flats, ...properties } = rectangularTube(r, { B, Ht, t }, Ro);
      const known = Ro ? flats : null;
      const lambdab = wallSlenderness(r, 'b', { flat: known?.b ?? null, outside: B, t });
      const lambdah = wallSlenderness(r, 'h', { flat: known?.h ?? null, outside: Ht, t });
      const square = B.value === Ht.value;
      return { kind: 'rect-hss', square, B, Ht, t, lambdab, lambdah, ...properties };
    }
    case 'round': {
      const D = given('D', 'Outside diameter', sizes.D);
      const t = wallThickness(r, sizes, steel);
      return { kind: 'round', D, t, ...roundTube(r, { D, t }) };
    }
  }
}

/** The design wall thickness as given, or by B4.2 from the nominal one and the steel. */
function wallThickness(
  r: Recorder,
  { t, wall }: { readonly t: GivenValue; readonly wall: Wall },
  steel: ResolvedSteel,
): Quantity {
  if (wall === 'design')
    return r.given('section/t', 't', 'length', t, { title: 'Design wall thickness' });
  const tnom = r.given('section/tnom', 'tnom', 'length', t, { title: 'Nominal wall thickness' });
  return designWall(r, tnom, steel.kind === 'grade' ? steel.steel.title : steel.name);
}
