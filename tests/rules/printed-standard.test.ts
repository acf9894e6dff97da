import { aisc360 } from '#shared/standards/aisc360-22/book.ts';
import { provePrinted } from './prove-printed.ts';

provePrinted([...aisc360.formulas.values()], {
  'aisc360-22/G5-2a': ['lambda negative'],
  'aisc360-22/G5-2b': ['lambda negative'],
  'aisc360-22/B4.1-kc': ['lambdaw negative'],
});
