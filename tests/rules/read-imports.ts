import { parseSync } from 'vite';

/** One source file: its path from the top of the repository, and its text. */
export interface Source {
  readonly path: string;
  readonly text: string;
}

export interface ReadSource {
  /** What the file imports or exports from, types and `import()` included, as written. */
  readonly imports: readonly string[];
  /** The text with every comment blanked out. */
  readonly code: string;
}

type Node = { readonly type: string; readonly [key: string]: unknown };

const isNode = (value: unknown): value is Node =>
  typeof value === 'object' && value !== null && typeof (value as Node).type === 'string';

function* nodesBelow(value: unknown): Generator<Node> {
  if (Array.isArray(value)) for (const item of value) yield* nodesBelow(item);
  if (!isNode(value)) return;
  yield value;
  for (const child of Object.values(value)) yield* nodesBelow(child);
}

const importing = new Set([
  ...['ImportDeclaration', 'ExportAllDeclaration', 'ExportNamedDeclaration'],
  ...['ImportExpression', 'TSImportType', 'TSExternalModuleReference'],
]);

/** An import whose target is computed is given as its source text, which no rule allows. */
function target(node: Node, text: string): string | undefined {
  const source = node.source ?? node.expression;
  if (!isNode(source)) return undefined;
  if (typeof source.value === 'string') return source.value;
  return text.slice(Number(source.start), Number(source.end));
}

/** Parses TypeScript or JSX. Throws with the parser's message when the text isn't that. */
export function readSource({ path, text }: Source): ReadSource {
  const { program, comments, errors } = parseSync(path, text);
  if (errors[0]) throw new Error(`${path}: ${errors[0].message}`);
  const imports = [...nodesBelow(program)]
    .filter((node) => importing.has(node.type))
    .map((node) => target(node, text))
    .filter((found) => found !== undefined);
  const code = comments.reduce(
    (rest, { start, end }) => rest.slice(0, start) + ' '.repeat(end - start) + rest.slice(end),
    text,
  );
  return { imports, code };
}
