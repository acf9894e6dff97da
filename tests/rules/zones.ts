/** The import zones of the architecture, as data. Change the architecture first, then this. */

/** What the files of each top folder may import from. */
export const zones: Readonly<Record<string, readonly string[]>> = {
  shared: ['shared'],
  server: ['shared', 'server'],
  src: ['shared', 'src'],
};

/** The folders of `shared` in reading order: each may import those before it and itself. */
export const sharedOrder: readonly string[] = [
  ...['units', 'expr', 'calc', 'sections', 'standards', 'actions', 'members'],
  ...['published-cases', 'figures', 'report', 'library', 'policy', 'contracts'],
];

/** Folders of `shared` that do without one before them: a book takes quantities, not sections. */
export const sharedApart: Readonly<Record<string, readonly string[]>> = {
  standards: ['sections'],
};

/** Editions that may build on another edition: none does. Overlays of a standard come here. */
export const editionsUsed: Readonly<Record<string, readonly string[]>> = {};

/** The lower floors of the client, which know no feature and no page. */
export const clientGround: readonly string[] = ['lib', 'ui', 'document'];
export const clientUpper: readonly string[] = ['features', 'routes', 'app', 'gallery'];

/** The only packages that the pure domain code may use. */
export const sharedPackages: readonly string[] = [
  ...['mathjs', 'zod', 'canonicalize', '@noble/hashes', 'yaml', 'd3-scale', 'd3-shape'],
  ...['unified', 'remark-parse', 'remark-gfm', 'remark-directive', 'remark-math'],
  ...['remark-frontmatter', 'mdast', 'mdast-util-directive', 'mdast-util-math', 'unist', 'vfile'],
];

/** Packages of the other side. */
export const serverOnly: readonly string[] = [
  ...['express', 'express-session', 'connect-pg-simple', 'passport', 'passport-local', 'helmet'],
  ...['pg', 'drizzle-orm', '@node-rs/argon2', 'rate-limiter-flexible', 'pino', 'pino-http'],
  ...['pdfkit', 'tsx', 'vite'],
];
export const clientOnly: readonly string[] = [
  ...['react', 'react-dom', 'react-router-dom', 'react-hook-form', 'react-katex', 'radix-ui'],
  ...['@tanstack/react-query', '@tanstack/react-table', '@hookform/resolvers', 'sonner', 'vite'],
];

/** What pure code does without: clock, chance, process and network. */
export const impure: readonly RegExp[] = [
  /\bDate\.now\b/,
  /\bnew Date\(\s*\)/,
  /\bperformance\.now\b/,
  /\bMath\.random\b/,
  /\bcrypto\.(getRandomValues|randomUUID)\b/,
  /\bprocess\.(env|cwd|argv|hrtime|stdout)\b/,
  /\bset(Timeout|Interval)\(/,
  /\bfetch\(/,
  /\blocalStorage\b/,
];
