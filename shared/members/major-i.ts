import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  builtUpFlangeClass,
  type ClassWithLimits,
  clearDepth,
  majorFlexureClass,
  rolledFlangeClass,
  webClass,
} from '../standards/aisc360-22/b4-flexure.ts';
import { coefficientKc } from '../standards/aisc360-22/b4-kc.ts';
import {
  type ChannelWarping,
  F2_LTB,
  ltbLimitsF2,
  ltbStrengthF2,
  plasticMomentMajor,
} from '../standards/aisc360-22/f2.ts';
import { flangeLocalBucklingMajor } from '../standards/aisc360-22/f3.ts';
import { stressFLFull } from '../standards/aisc360-22/f4.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { compactOrNoncompactWeb, slenderWeb } from './major-flanged.ts';
import type { MajorSection } from './major-section.ts';
import type { ChannelSection, ISection, SteelQuantities } from './section-quantities.ts';

/** F2, F3, F4 or F5 for a doubly symmetric I-shape, by the class of its web. */
export function majorI(
  r: Recorder,
  steel: SteelQuantities,
  s: ISection,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  const { E, Fy } = steel;
  r.section('B4/x', 'Width-to-thickness ratios, major-axis flexure', clause('B4.1'));
  const builtUp =
    s.made === 'built-up'
      ? { kc: coefficientKc(r, 'B4/x', s.lambdaw), FL: stressFLFull(r, 'B4/x', Fy) }
      : null;
  const flange = builtUp
    ? builtUpFlangeClass(r, steel, s.lambdaf, builtUp.kc, builtUp.FL)
    : rolledFlangeClass(r, steel, s.lambdaf);
  const web = webClass(r, steel, s.lambdaw);
  if (web.class === 'compact') {
    const kc = builtUp?.kc ?? null;
    return compactWeb(r, steel, s, null, { flange, web, kc }, longest, phib);
  }
  const chapter = web.class === 'noncompact' ? 'F4' : 'F5';
  r.section(chapter, 'Major-axis flexural strength', clause(chapter));
  const hc = clearDepth(r, chapter, s);
  const q = {
    ...{ E, Fy, Zx: s.Zx, Sx: s.Sx, Sxc: s.Sx, Sxt: s.Sx, J: s.J, ho: s.ho },
    ...{ bfc: s.bf, tfc: s.tf, tw: s.tw, hc, h: hc, IycIy: null },
    ...{ lambdaf: s.lambdaf, lambdahc: s.lambdaw, lambdaw: s.lambdaw },
  };
  const classes = { flange, web };
  return web.class === 'noncompact'
    ? compactOrNoncompactWeb(
        r,
        q,
        classes,
        builtUp?.FL ?? stressFLFull(r, 'F4', Fy),
        builtUp?.kc ?? null,
        longest,
        phib,
      )
    : slenderWeb(r, q, classes, builtUp?.kc ?? null, longest, phib);
}

/** F2 for a channel with compact elements; outside scope otherwise. */
export function majorChannel(
  r: Recorder,
  steel: SteelQuantities,
  s: ChannelSection,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  r.section('B4/x', 'Width-to-thickness ratios, major-axis flexure', clause('B4.1'));
  const { flange, web } = majorFlexureClass(r, steel, s.lambdaf, s.lambdaw);
  if (flange.class !== 'compact' || web.class !== 'compact') {
    r.notice(
      'F2/outside',
      'outside scope',
      'channel-not-compact',
      'The flanges or the web of the channel are not compact in flexure: Chapter F has no rule for such a channel bent about its major axis. Major-axis flexure is not checked.',
      { title: 'Channel that is not compact', clause: clause('F2') },
    );
    return null;
  }
  const of = { flange, web, kc: null };
  return compactWeb(r, steel, s, { Iy: s.Iy, Cw: s.Cw }, of, longest, phib);
}

/** F2 and F3: compact web. `kc` where the flange's class has written it already. */
function compactWeb(
  r: Recorder,
  steel: SteelQuantities,
  s: ISection | ChannelSection,
  warping: ChannelWarping,
  of: {
    readonly flange: ClassWithLimits;
    readonly web: ClassWithLimits;
    readonly kc: Quantity | null;
  },
  longest: Quantity | null,
  phib: Quantity,
): MajorSection {
  const { E, Fy } = steel;
  const { flange, web, kc } = of;
  const { lambdaf, lambdaw } = s;
  const chapter = flange.class === 'compact' ? 'F2' : 'F3';
  r.section('F2', 'Major-axis flexural strength', clause(chapter));
  const q = { E, Fy, Sx: s.Sx, Zx: s.Zx, ry: s.ry, rts: s.rts, J: s.J, ho: s.ho };
  const Mp = plasticMomentMajor(r, q);
  const limits = ltbLimitsF2(r, q, warping, longest);
  const FLB = flangeLocalBucklingMajor(r, { E, Fy, Sx: s.Sx, Mp, lambdaf, lambdaw, kc }, flange);
  return {
    Mp,
    phib,
    clause: chapter,
    key: 'F2/Mn',
    yielding: Mp,
    others: FLB ? [FLB] : [],
    ltb: {
      words: F2_LTB,
      limits,
      strength: (w, segment) => ltbStrengthF2(w, q, limits, Mp, segment),
    },
    elements: {
      flange: { lambda: lambdaf, lambdap: flange.lambdap },
      web: { lambda: lambdaw, lambdap: web.lambdap },
    },
  };
}
