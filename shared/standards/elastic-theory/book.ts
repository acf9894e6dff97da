import { defineBook } from '../book.ts';
import { endMomentFormulas } from './end-moments.ts';
import { secondOrderFormulas } from './second-order.ts';
import { symbols } from './symbols.ts';
import { BOOK } from './writer.ts';

export const elasticTheory = defineBook(
  {
    id: BOOK,
    name: 'Elastic theory',
    title: 'Second-order theory of the elastic beam-column, pinned ends, end moments',
    symbols,
  },
  [endMomentFormulas, secondOrderFormulas].flatMap((group) => Object.values(group)),
);
