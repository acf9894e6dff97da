import { BOOKS } from '#shared/standards/library.ts';
import { provePrinted } from './prove-printed.ts';

// Every book but the standard.
provePrinted(
  BOOKS.filter((book) => book.id !== 'aisc360-22').flatMap((book) => [...book.formulas.values()]),
  {
    'elastic-theory/threshold': ['psi large', 'psi thousands'],
    'section-properties/I-rts': ['Sx negative'],
  },
);
