import { type BookSymbol, symbol } from '../book.ts';
import { MOST_NUMBERED, numbered } from './stretches.ts';

/* Symbols of the nodes and stretches of a bay: one set for each number. */
const each = (n: number): Readonly<Record<string, BookSymbol>> => ({
  [numbered('z', n)]: symbol(`z_{(${n})}`, `distance of node ${n} from end A`, 'length'),
  [numbered('l', n)]: symbol(`l_{${n}}`, `length of stretch ${n}`, 'length'),
  [numbered('w', n)]: symbol(`w_{${n}}`, `load at the start of stretch ${n}`, 'lineLoad'),
  [numbered('we', n)]: symbol(`w_{${n},e}`, `load at the end of stretch ${n}`, 'lineLoad'),
  [numbered('kl', n)]: symbol(`kl_{${n}}`, `axial parameter of stretch ${n}`, 'angle'),
  [numbered('V', n)]: symbol(`V_{(${n})}`, `shear at the end of stretch ${n}`, 'force'),
  [numbered('Vb', n)]: symbol(`V_{(${n})b}`, `shear behind the force at node ${n}`, 'force'),
  [numbered('VA', n)]: symbol(`V_{(A),${n}}`, `shear at end A with ${n} loads`, 'force'),
  [numbered('M', n, 'z')]: symbol(`M_{(${n})}`, `moment at node ${n}`, 'moment'),
  [numbered('g', n)]: symbol(
    `g_{${n}}`,
    `load with that of the axial force on the bent axis, stretch ${n}`,
    'lineLoad',
  ),
  [numbered('h', n)]: symbol(`h_{${n}}`, `auxiliary load of the extreme, stretch ${n}`, 'lineLoad'),
  [numbered('ze', n)]: symbol(`z_{${n},ext}`, `place of the extreme in stretch ${n}`, 'length'),
  [numbered('Me', n)]: symbol(`M_{${n},ext}`, `extreme moment in stretch ${n}`, 'moment'),
  [numbered('ze', n, 'b')]: symbol(
    `z_{${n},ext2}`,
    `place of the second extreme in stretch ${n}`,
    'length',
  ),
  [numbered('Me', n, 'b')]: symbol(
    `M_{${n},ext2}`,
    `second extreme moment in stretch ${n}`,
    'moment',
  ),
  [numbered('th', n)]: symbol(`\\theta_{(${n})}`, `slope at node ${n}`, 'angle'),
  [numbered('y', n)]: symbol(`y_{(${n})}`, `deflection at node ${n}`, 'deflection'),
});

export const numberedSymbols: Readonly<Record<string, BookSymbol>> = Object.assign(
  {},
  ...Array.from({ length: MOST_NUMBERED + 1 }, (_, n) => each(n)),
);
