import { defineBook } from '../book.ts';
import { axesFormulas } from './axes.ts';
import { platesBoxFormulas } from './plates-box.ts';
import { platesIFormulas } from './plates-i.ts';
import { platesMonoIFormulas } from './plates-mono-i.ts';
import { symbols } from './symbols.ts';
import { tubeFormulas } from './tube.ts';
import { BOOK } from './writer.ts';

export const sectionProperties = defineBook(
  {
    id: BOOK,
    name: 'Section properties',
    title: 'Properties of sections welded from plates and of tubes, from their sizes',
    symbols,
  },
  [axesFormulas, platesIFormulas, platesMonoIFormulas, platesBoxFormulas, tubeFormulas].flatMap(
    (group) => Object.values(group),
  ),
);
