import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, BayAxial, BayLoad, BayResult } from './bay.ts';
import { endMoments } from './end-moments.ts';
import { heldLoad, springFormulas } from './end-spring-formulas.ts';
import { axialParameter, solvedBay } from './second-order-bay.ts';
import { firstOrderBay } from './statics.ts';
import { clause } from './writer.ts';

/** A bay whose ends turn against springs: the joints' resistance to rotation. */
export interface SprungBay extends Pick<Bay, 'axis' | 'L1' | 'loads'> {
  /** Rotational stiffness at end A and at end B, zero for a pin. */
  readonly kA: Quantity;
  readonly kB: Quantity;
}

export interface SprungResult {
  /** The bay with the end moments that the springs take, in the bending sense. */
  readonly bay: Bay;
  readonly result: BayResult;
  /** Elastic critical load with these springs; between Pe1 and 4 Pe1. */
  readonly Pcr: Quantity;
}

/**
 * Moments of a bay with rotational springs at its ends and loads between them, under compression, no
 * axial force or tension; at least one load. The axial force may exceed Pe1 of pinned ends, not Pcr of the sprung ones:
 * at or above it, 'failed' with the notice that says so. 'outside scope' as `secondOrderBay`.
 */
export function sprungBay(
  r: Recorder,
  at: string,
  given: SprungBay,
  axial: BayAxial,
): SprungResult | 'failed' | 'outside scope' {
  const { L1, loads, axis } = given;
  const { alpha, Pr, EIstar } = axial;
  const spring = (end: 'A' | 'B', k: Quantity) =>
    r.formula(
      springFormulas.relative,
      `${at}/spring${end}`,
      { k, L1, EIstar },
      { title: `Relative stiffness of the spring at end ${end}`, symbol: `kap${end}` },
    );
  const [kapA, kapB] = [spring('A', given.kA), spring('B', given.kB)];
  const Pcr = criticalLoad(r, at, { kapA, kapB, L1, EIstar });
  if (!belowCritical(r, at, alpha, Pr, Pcr)) return 'failed';

  const chi = r.formula(springFormulas.parameter, `${at}/chi`, { alpha, Pr, L1, EIstar });
  const sums = loadSums(r, at, loads, { chi, L1, EIstar });
  const F = r.formula(springFormulas.stiffness, `${at}/F`, { kapA, kapB, chi });
  const thA = r.formula(springFormulas.rotation, `${at}/springs/thA`, {
    ...sums,
    kapB,
    chi,
    L1,
    EIstar,
    F,
  });
  const MA = r.formula(springFormulas.momentA, `${at}/springs/MA`, { k: given.kA, thA });
  const VA = r.formula(springFormulas.shearA, `${at}/springs/VA`, {
    thA,
    kapA,
    chi,
    EIstar,
    L1,
    etaL: sums.etaL,
  });
  const MB = r.formula(springFormulas.momentB, `${at}/springs/MB`, {
    MA,
    VA,
    chi,
    L1,
    mL: sums.mL,
  });
  const bay: Bay = { axis, L1, loads, ends: endMoments(r, at, axis, { MA, MB, sense: 'bending' }) };
  if (Pr.value === 0) return { bay, result: firstOrderBay(r, at, bay), Pcr };
  const solution = axialParameter(r, at, bay, axial);
  if (!solution) return 'outside scope';
  return { bay, result: solvedBay(r, at, bay, axial, solution, VA), Pcr };
}

/** Lowest critical load: its angle lies between π (both pinned) and 2π (both fixed). */
function criticalLoad(
  r: Recorder,
  at: string,
  q: { kapA: Quantity; kapB: Quantity; L1: Quantity; EIstar: Quantity },
): Quantity {
  const bcr = r.root(
    springFormulas.criticalAngle,
    `${at}/critical`,
    { symbol: 'bcr', dimension: 'angle', bracket: [Math.PI * (1 - 1e-9), 2 * Math.PI] },
    { kapA: q.kapA, kapB: q.kapB },
  );
  return r.formula(springFormulas.criticalLoad, `${at}/Pcr`, {
    bcr,
    EIstar: q.EIstar,
    L1: q.L1,
  });
}

function belowCritical(
  r: Recorder,
  at: string,
  alpha: Quantity,
  Pr: Quantity,
  Pcr: Quantity,
): boolean {
  if (Pr.value <= 0) return true;
  const share = r.formula(springFormulas.share, `${at}/share`, { alpha, Pr, Pcr });
  const titled = { title: 'Axial force below the critical load', clause: clause('9') };
  const below =
    r.choice(
      `${at}/below`,
      [{ left: share, relation: '<', right: 1, outcome: 'the member is stable' }],
      'the member is unstable',
      titled,
    ) === 0;
  if (!below)
    r.notice(
      `${at}/unstable`,
      'failed',
      'sprung-critical-load',
      'The axial force reaches the elastic critical load of the member with its end springs. There is no stable equilibrium, so no moment is given.',
      titled,
    );
  return below;
}

/** What all loads together do at end B when the member is held at end A alone. */
function loadSums(
  r: Recorder,
  at: string,
  loads: readonly BayLoad[],
  known: { readonly chi: Quantity; readonly L1: Quantity; readonly EIstar: Quantity },
): { mL: Quantity; tauL: Quantity; etaL: Quantity } {
  const each = loads.map((load, i) => {
    const { kind, operands } = heldOperands(load, known.L1);
    const one = (name: 'm' | 'slope' | 'chord', symbol: string) =>
      r.formula(
        heldLoad[kind][name],
        `${at}/held/${name}${i + 1}`,
        { ...operands, ...known },
        loads.length === 1 ? { symbol } : {},
      );
    return { mi: one('m', 'mL'), taui: one('slope', 'tauL'), etai: one('chord', 'etaL') };
  });
  const [first, ...others] = each;
  if (!first) throw new Error('a sprung bay without load has no moments');
  return others.reduce(
    ({ mL, tauL, etaL }, { mi, taui, etai }, i) => ({
      mL: r.formula(springFormulas.momentSum, `${at}/held/m/sum${i + 2}`, { mL, mi }),
      tauL: r.formula(springFormulas.slopeSum, `${at}/held/slope/sum${i + 2}`, { tauL, taui }),
      etaL: r.formula(springFormulas.chordSum, `${at}/held/chord/sum${i + 2}`, { etaL, etai }),
    }),
    { mL: first.mi, tauL: first.taui, etaL: first.etai },
  );
}

function heldOperands(
  load: BayLoad,
  L1: Quantity,
): { kind: keyof typeof heldLoad; operands: Record<string, Quantity> } {
  if (load.kind === 'point') return { kind: 'point', operands: { W: load.W, a: load.at } };
  const { from: a, to: b } = load;
  if (load.kind === 'linear')
    return { kind: 'linear', operands: { wa: load.wa, wb: load.wb, a, b } };
  return a.value === 0 && b.value === L1.value
    ? { kind: 'whole', operands: { w: load.w } }
    : { kind: 'uniform', operands: { w: load.w, a, b } };
}
