import { defineBook } from '../book.ts';
import { alignmentChartFormulas } from './alignment-chart.ts';
import { app7Formulas } from './app7.ts';
import { app8Formulas } from './app8.ts';
import { app8B1Formulas } from './app8-b1.ts';
import { app8B2Formulas } from './app8-b2.ts';
import { b4CompressionFormulas } from './b4-compression.ts';
import { b4FlexureFormulas } from './b4-flexure.ts';
import { kcFormulas } from './b4-kc.ts';
import { b4WallFormulas } from './b4-wall.ts';
import { c2Formulas } from './c2.ts';
import { d2Formulas } from './d2.ts';
import { d3Formulas } from './d3.ts';
import { e2Formulas, placeFormulas } from './e2.ts';
import { e3Formulas } from './e3.ts';
import { e4Formulas } from './e4.ts';
import { e4ConstrainedFormulas } from './e4-constrained.ts';
import { e4FlexuralTorsionalFormulas } from './e4-flexural-torsional.ts';
import { e7Formulas } from './e7.ts';
import { e7RoundFormulas } from './e7-round.ts';
import { f1Formulas } from './f1.ts';
import { f2Formulas } from './f2.ts';
import { f3Formulas } from './f3.ts';
import { f4All } from './f4-formulas.ts';
import { f5Formulas } from './f5.ts';
import { f6Formulas } from './f6.ts';
import { f7Formulas } from './f7-formulas.ts';
import { f8Formulas } from './f8.ts';
import { f13Formulas } from './f13.ts';
import { g1Formulas } from './g1.ts';
import { g2Formulas } from './g2.ts';
import { g2BucklingFormulas } from './g2-buckling.ts';
import { g4Formulas } from './g4.ts';
import { g5Formulas } from './g5.ts';
import { g6Formulas } from './g6.ts';
import { h1Formulas } from './h1.ts';
import { h1SingleAxisFormulas } from './h1-single-axis.ts';
import { h1TensionFormulas } from './h1-tension.ts';
import { h2Formulas } from './h2.ts';
import { jointRatioFormulas } from './joint-ratio.ts';
import { SPECIFICATION } from './parameters.ts';
import { storyStiffnessFormulas } from './story-stiffness.ts';
import { symbols } from './symbols.ts';
import { BOOK } from './writer.ts';

/** ANSI/AISC 360-22 for rolled W shapes in compression and biaxial bending. */
export const aisc360 = defineBook(
  { id: BOOK, name: 'ANSI/AISC 360-22', title: SPECIFICATION, symbols },
  [
    b4CompressionFormulas,
    b4FlexureFormulas,
    kcFormulas,
    b4WallFormulas,
    c2Formulas,
    e2Formulas,
    placeFormulas,
    e3Formulas,
    e4Formulas,
    e4ConstrainedFormulas,
    e4FlexuralTorsionalFormulas,
    e7Formulas,
    e7RoundFormulas,
    f1Formulas,
    f2Formulas,
    f3Formulas,
    f4All,
    f5Formulas,
    f6Formulas,
    f7Formulas,
    f8Formulas,
    f13Formulas,
    app7Formulas,
    app8Formulas,
    app8B1Formulas,
    app8B2Formulas,
    jointRatioFormulas,
    alignmentChartFormulas,
    storyStiffnessFormulas,
    d2Formulas,
    d3Formulas,
    g1Formulas,
    g2Formulas,
    g2BucklingFormulas,
    g4Formulas,
    g5Formulas,
    g6Formulas,
    h1Formulas,
    h1TensionFormulas,
    h1SingleAxisFormulas,
    h2Formulas,
  ].flatMap((group) => Object.values(group)),
);
