import { type Axis, WORD } from './bay-moments.ts';
import {
  type Context,
  check,
  checked,
  find,
  type LimitState,
  na,
  outside,
  strength,
  type Told,
  takenBy,
  unreached,
} from './limit-state.ts';

const COMPRESSION = 'no compression in this combination';
const TENSION = 'no tension in this combination';

const compressed = (tell: (c: Context) => Told) => (c: Context) =>
  c.run.compressed ? tell(c) : na(COMPRESSION);
const pulled = (tell: (c: Context) => Told) => (c: Context) =>
  c.run.tension ? tell(c) : na(TENSION);

const flexural = (axis: Axis): LimitState => ({
  id: `compression/flexural-${axis}`,
  title: `Flexural buckling about the ${WORD[axis]} axis`,
  clause: ['E3', 'E3-4'],
  tell: compressed((c) => {
    const key = `E3/${axis}/Fe`;
    const found = find(c, key);
    if (!found || !find(c, 'E3/Fe')) return unreached(c, []);
    return strength(found.address, takenBy(c, 'E3/Fe') === key);
  }),
});

/** Local buckling, E7: of plates, or of the wall of a round tube. */
function local(c: Context): Told {
  const found = find(c, 'E7/Pn');
  if (!found) return find(c, 'E3/Pn') ? na('no element is slender') : unreached(c, []);
  return find(c, 'E7/Ae')
    ? { state: 'governs', because: 'a slender element is partly effective', address: found.address }
    : {
        state: 'does not govern',
        because: 'slender elements are fully effective at this stress',
        address: found.address,
      };
}

/** Axial limit states of one combination; the axial force is the same in every segment. */
export const AXIAL_STATES: readonly LimitState[] = [
  flexural('x'),
  flexural('y'),
  {
    id: 'compression/torsional',
    title: 'Torsional and flexural-torsional buckling',
    clause: ['E4'],
    tell: compressed((c) => {
      const found = find(c, 'E4/Fe');
      if (found && find(c, 'E3/Fe'))
        return strength(found.address, takenBy(c, 'E3/Fe') === 'E4/Fe');
      const notice = find(c, 'E4/outside');
      if (notice) return outside(notice.line.title, notice.address);
      if (find(c, 'E4/closed')) return na('a closed section does not buckle in torsion');
      return find(c, 'E3/Fe')
        ? na('the torsional buckling length does not exceed the lateral one')
        : unreached(c, []);
    }),
  },
  {
    id: 'compression/slender',
    title: 'Local buckling in compression',
    clause: ['E7', 'E7-1'],
    tell: compressed(local),
  },
  {
    id: 'compression/check',
    title: 'Compression alone',
    clause: ['E1'],
    tell: compressed((c) => {
      const found = check(c, 'H1/axial');
      return found ? checked(c, found) : unreached(c, ['x', 'y']);
    }),
  },
  {
    id: 'tension/yielding',
    title: 'Tensile yielding of the gross section',
    clause: ['D2', 'D2-1'],
    tell: pulled((c) => {
      const found = find(c, 'D2/yielding/Pc');
      return found
        ? strength(found.address, takenBy(c, 'D2/Pc') === 'D2/yielding/Pc')
        : unreached(c, []);
    }),
  },
  {
    id: 'tension/rupture',
    title: 'Tensile rupture of the net section',
    clause: ['D2', 'D2-2'],
    tell: pulled((c) => {
      const notice = find(c, 'D2/rupture/outside');
      if (notice) return outside('the net section or Fu is not given', notice.address);
      const found = find(c, 'D2/rupture/Pc');
      return found
        ? strength(found.address, takenBy(c, 'D2/Pc') === 'D2/rupture/Pc')
        : unreached(c, []);
    }),
  },
  {
    id: 'tension/check',
    title: 'Tension alone',
    clause: ['D2'],
    tell: pulled((c) => {
      const found = check(c, 'H1/axial');
      return found ? checked(c, found) : unreached(c, ['x', 'y']);
    }),
  },
];
