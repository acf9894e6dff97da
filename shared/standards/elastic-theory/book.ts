import type { Formula } from '../../calc/formula.ts';
import { defineBook } from '../book.ts';
import { bowFormulas } from './bow.ts';
import { deflectionFormulas } from './deflection.ts';
import { endMomentFormulas } from './end-moments.ts';
import { endShearFormulas } from './end-shear.ts';
import { heldLoadFormulas, springFormulas } from './end-spring-formulas.ts';
import { extremeFormulas } from './extreme.ts';
import { secondOrderFormulas } from './second-order.ts';
import { bayFormulas } from './second-order-bay.ts';
import { shearFlexibilityFormulas } from './shear-flexibility.ts';
import { sizeFormulas } from './size.ts';
import { walkFormulas } from './solve-stretches.ts';
import { stretchFormulas } from './stretches.ts';
import { symbols } from './symbols.ts';
import { transferFormulas } from './transfer.ts';
import { BOOK } from './writer.ts';

export const elasticTheory = defineBook(
  {
    id: BOOK,
    name: 'Elastic theory',
    title: 'Moments of the elastic beam-column, first and second order',
    symbols,
  },
  [
    endMomentFormulas,
    secondOrderFormulas,
    bayFormulas,
    stretchFormulas,
    walkFormulas,
    sizeFormulas,
    transferFormulas,
    endShearFormulas,
    extremeFormulas,
    deflectionFormulas,
    springFormulas,
    heldLoadFormulas,
    bowFormulas,
    shearFlexibilityFormulas,
  ].flatMap((group) => Object.values<Formula>(group)),
);
