import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/*
 * Loader hooks of a mutation run. They let the switchboard stand between a formula and its value, a
 * condition and its outcome, candidates and what governs; and give tests another `vitest`. Sources
 * stay as they are on disk.
 */
const STAND_IN = new URL('./stand-in.ts', import.meta.url).href;
const BOARD = 'globalThis.mutationBoard';

/** What is written instead in a file, once. The text is that of the compiled source. */
const REPLACED = {
  'shared/calc/formula.ts': [
    [
      'parseExpression(text.expression)',
      `${BOARD}.expression(book + '/' + text.id, text.expression, parseExpression)`,
    ],
  ],
  'shared/calc/condition.ts': [
    [
      /function holds\(([^)]*)\)\s*\{/,
      `function holds(tried){return ${BOARD}.holds(tried,plainHolds)}function plainHolds($1){`,
    ],
  ],
  'shared/calc/recorder.ts': [
    [
      /governing\(key,\s*sense,\s*candidates,\s*more\)\s*\{/,
      `governing(site,key,sense,candidates,more){sense=${BOARD}.sense(site,sense,candidates.map((c)=>c.value));`,
    ],
    [
      /verdict:\s*ratio\s*<=\s*1\s*\?/,
      `verdict:${BOARD}.compare('shared/calc/recorder.ts: ratio <= 1',ratio,'<=',1)?`,
    ],
  ],
  'shared/standards/aisc360-22/parameters.ts': [
    ['Number(published)', `${BOARD}.constant(name + '/' + design,Number(published))`],
  ],
  'shared/standards/aisc360-22/e7-constants.ts': [
    ['Number(entry[column])', `${BOARD}.constant(kind + '/' + column,Number(entry[column]))`],
  ],
  // Digits are only printed; fixing and proving them takes most of a record's time.
  'shared/calc/closure.ts': [
    [/function closeLines\(placed,\s*set\)\s*\{/, '$&return placed.map((p)=>p.line);'],
  ],
  'shared/calc/closure-problems.ts': [[/function closureProblems\([^)]*\)\s*\{/, '$&return [];']],
};

/** What is given its place, `path:line`, where it stands in a clause or in the procedure. */
const PLACED = [
  { found: /\brelation:\s*(?=['"\w])/g, placed: (site) => `site:${site},`, before: true },
  { found: /\br\.governing\(\s*/g, placed: (site) => `${site},`, before: false },
];

/** Writes the places of the source on disk into the compiled source. */
function withPlaces(path, written, compiled) {
  let source = compiled;
  for (const { found, placed, before } of PLACED) {
    const lines = [...written.matchAll(found)].map(
      ({ index }) => written.slice(0, index).split('\n').length,
    );
    let count = 0;
    source = source.replace(found, (text) => {
      const place = placed(JSON.stringify(`${path}:${lines[count]}`));
      count += 1;
      return before ? place + text : text + place;
    });
    if (count !== lines.length)
      throw new Error(`${path}: ${lines.length} places are ${count} when compiled: ${found}`);
  }
  return source;
}

/**
 * Two quantities, or a quantity and a number, compared in plain code: what a clause needs to write at
 * all. Products are left out, and what reads an input.
 */
const COMPARED =
  /(?<![\w$.)\]])(?<![*+/-]\s?)((?:[\w$]+\.)+value)\s*([<>]=?)\s*((?:[\w$]+\.)*[\w$]+)(?![\w$.([]|\s*[*+/-])/g;
const INPUT = /^shared\/members\/(?:resolve|parse|given|find|section-candidates)/;

function withComparisons(path, written, compiled) {
  if (INPUT.test(path)) return compiled;
  let count = 0;
  const source = compiled.replace(COMPARED, (_, left, relation, right) => {
    count += 1;
    const site = JSON.stringify(`${path}: ${left} ${relation} ${right}`);
    return `${BOARD}.compare(${site},${left},${JSON.stringify(relation)},${right})`;
  });
  const expected = [...written.matchAll(COMPARED)].length;
  if (count !== expected)
    throw new Error(`${path}: ${expected} comparisons are ${count} when compiled`);
  return source;
}

export async function resolve(specifier, context, next) {
  return specifier === 'vitest' ? { url: STAND_IN, shortCircuit: true } : next(specifier, context);
}

export async function load(url, context, next) {
  const loaded = await next(url, context);
  const path = /\/(shared\/(?:calc|standards|members)\/.*\.ts)(?:\?.*)?$/.exec(url)?.[1];
  if (!path || path.endsWith('.test.ts')) return loaded;
  let source = String(loaded.source);
  for (const [from, to] of REPLACED[path] ?? []) {
    const changed = source.replace(from, to);
    if (changed === source) throw new Error(`nothing to replace in ${path}: ${from}`);
    source = changed;
  }
  if (!path.startsWith('shared/calc/')) {
    const written = readFileSync(fileURLToPath(url), 'utf8');
    source = withComparisons(path, written, withPlaces(path, written, source));
  }
  return { ...loaded, source };
}
