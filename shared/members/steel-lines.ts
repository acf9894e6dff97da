import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { SPECIFICATION } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { parseQuantity } from '../units/parse.ts';
import { MODULI, type ResolvedSteel } from './material.ts';
import type { SteelQuantities } from './section-quantities.ts';

/** In MPa: A514 and A709 Grade HPS 100W [690], the strongest that A3.1 lists. */
const HIGHEST_YIELD_STRESS = 690;

const stressOf = (published: string): number => {
  const parsed = parseQuantity(published, 'stress');
  if (!parsed.ok) throw new Error(`${published}: ${parsed.reason}`);
  return parsed.quantity.value;
};

const TITLES = { Fy: 'Yield stress', Fu: 'Tensile strength' } as const;

/**
 * Constants of the steel: of its grade's row, which says its range of thickness, or as given; E and
 * G of the standard (US customary or SI). Fu is null for a steel of the user's own without it.
 */
export function steelLines(
  r: Recorder,
  steel: ResolvedSteel,
  constants: 'us' | 'si',
): SteelQuantities {
  r.section('steel', 'Steel');
  const published = (
    symbol: string,
    title: string,
    found: { published: string; table: string; row: string; tableSource: string },
  ): Quantity =>
    r.lookup(
      `steel/${symbol}`,
      symbol,
      'stress',
      { ...found, value: stressOf(found.published), column: symbol },
      { title },
    );
  const strength = (symbol: 'Fy' | 'Fu'): Quantity | null => {
    if (steel.kind === 'own') {
      const given = steel[symbol];
      return given
        ? r.given(`steel/${symbol}`, symbol, 'stress', given, {
            title: `${TITLES[symbol]}, ${steel.name}`,
          })
        : null;
    }
    const { title, row } = steel.steel;
    return published(symbol, `${TITLES[symbol]}, ${title}`, {
      published: steel.steel[constants][symbol],
      table: 'Steels by grade',
      row,
      tableSource: title,
    });
  };
  const Fy = strength('Fy') as Quantity;
  const Fu = strength('Fu');
  noticeOfSteel(r, steel, Fy);
  const modulus = (symbol: 'E' | 'G', title: string): Quantity =>
    published(symbol, title, {
      published: MODULI[constants][symbol],
      table: 'Symbols',
      row: constants === 'us' ? 'US customary' : 'SI',
      tableSource: SPECIFICATION,
    });
  const E = modulus('E', 'Modulus of elasticity');
  const G = modulus('G', 'Shear modulus');
  return { E, G, Fy, Fu };
}

function noticeOfSteel(r: Recorder, steel: ResolvedSteel, Fy: Quantity): void {
  if (steel.kind === 'own' && Fy.value > HIGHEST_YIELD_STRESS)
    r.notice(
      'steel/unusual',
      'caution',
      'yield-stress-above-listed',
      'The yield stress exceeds 100 ksi (690 MPa), more than any steel that A3.1 lists has: see the number and its unit.',
      { title: 'Yield stress above those of the standard', clause: clause('A3.1') },
    );
  if (steel.kind === 'grade' && !steel.suits)
    r.notice(
      'steel/product',
      'caution',
      'steel-not-made-as-section',
      `${steel.steel.title} is not made as this kind of section; its lowest yield stress is used. See that the steel is the one ordered.`,
      { title: 'Steel and section', clause: clause('A3.1') },
    );
}
