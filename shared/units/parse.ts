import { DIMENSION_WORDS, type DimensionName } from './dimension.ts';
import { UNITS, type Unit } from './unit.ts';

/** A typed quantity: its value in base units (N, mm) and the text as typed. */
export interface ParsedQuantity {
  readonly value: number;
  readonly text: string;
  /** The unit typed; for feet and inches together, feet. */
  readonly unit: Unit;
}

export type Parsed =
  | { readonly ok: true; readonly quantity: ParsedQuantity }
  | { readonly ok: false; readonly reason: string };

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,4})?/i;

// Spellings in use on drawings and in spreadsheets, on the left of the unit's own name.
const SPELLINGS: Readonly<Record<string, string>> = {
  kips: 'kip',
  k: 'kip',
  lb: 'lbf',
  lbs: 'lbf',
  feet: 'ft',
  foot: 'ft',
  "'": 'ft',
  '′': 'ft',
  inch: 'in',
  inches: 'in',
  '"': 'in',
  '″': 'in',
  'N/mm²': 'MPa',
  'N/mm2': 'MPa',
  kNm: 'kN m',
  Nm: 'N m',
  Nmm: 'N mm',
  'kip feet': 'kip ft',
  'kips ft': 'kip ft',
  'kips in': 'kip in',
  'k ft': 'kip ft',
  klf: 'kip/ft',
  'k/ft': 'kip/ft',
  'kips/ft': 'kip/ft',
  plf: 'lbf/ft',
  'lb/ft': 'lbf/ft',
  'k in': 'kip in',
  'ft kip': 'kip ft',
  'ft kips': 'kip ft',
  'in kip': 'kip in',
  'in kips': 'kip in',
};

const unitSpelled = (text: string): Unit | undefined => {
  const plain = text
    .trim()
    .replace(/[-·⋅*]/g, ' ')
    .replace(/\s+/g, ' ');
  return UNITS.get(SPELLINGS[plain] ?? plain);
};

const refuse = (reason: string): Parsed => ({ ok: false, reason });

const unitsOf = (dimension: DimensionName): string =>
  [...UNITS.values()]
    .filter((u) => u.dimension === dimension && u.name !== '')
    .map((u) => u.name)
    .join(', ');

/**
 * Reads `14 ft`, `168 in`, `4.27 m`, `14 ft 6 in`, `118 kip ft`, or a plain number where the
 * dimension is none. Any unit of the dimension is accepted. The reason of a refusal is a sentence
 * that can stand beside the field.
 */
export function parseQuantity(input: string, wanted: DimensionName): Parsed {
  // A deflection is typed as a length.
  const dimension = wanted === 'deflection' ? 'length' : wanted;
  const text = input.trim().replace(/\u2212/g, '-');
  if (text === '') return refuse('is empty');
  const match = NUMBER.exec(text);
  if (!match) return refuse(`"${short(text)}" does not start with a number`);
  const amount = Number(match[0]);
  if (!Number.isFinite(amount)) return refuse(`${short(match[0])} is too large to be a number`);
  const rest = text.slice(match[0].length);
  if (/^\s*,\s*\d/.test(rest))
    return refuse('has a comma in the number; write a point for decimals and no thousands mark');
  const feetInches = /^\s*(?:ft|'|′)\s*-?\s*(\d+(?:\.\d+)?)\s*(?:in|"|″)$/.exec(rest);
  if (feetInches && dimension === 'length') {
    const size = Math.abs(amount) * 12 + Number(feetInches[1]);
    const sign = match[0].startsWith('-') ? -1 : 1;
    return found(sign * size * 25.4, text, 'ft');
  }
  if (rest.trim() === '') {
    if (dimension === 'none') return found(amount, text, '');
    return refuse(`needs a unit (${unitsOf(dimension)})`);
  }
  const unit = unitSpelled(rest);
  if (!unit)
    return refuse(
      `"${short(rest.trim())}" is not a unit known here (${unitsOf(dimension) || 'no unit is wanted'})`,
    );
  if (unit.dimension !== dimension)
    return refuse(
      `is ${DIMENSION_WORDS[unit.dimension]}; ${DIMENSION_WORDS[dimension]} is wanted` +
        (dimension === 'none' ? '' : ` (${unitsOf(dimension)})`),
    );
  return found(amount * unit.factor, text, unit.name);
}

function found(value: number, text: string, unitName: string): Parsed {
  const unit = UNITS.get(unitName);
  if (!unit || !Number.isFinite(value)) return refuse('is too large to be a number');
  // 15 digits, so that 14 ft and 168 in are the same number.
  return { ok: true, quantity: { value: Number(value.toPrecision(15)), text, unit } };
}

const short = (text: string): string => (text.length > 24 ? `${text.slice(0, 24)}…` : text);
