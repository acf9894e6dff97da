import { readSource, type Source } from './read-imports.ts';
import { resolveImport } from './resolve-import.ts';
import * as rules from './zones.ts';

interface File {
  readonly path: string;
  /** Folders above the file and its name. */
  readonly parts: readonly string[];
  readonly isTest: boolean;
}

const describe = (path: string): File => ({
  path,
  parts: path.split('/'),
  isTest: /\.test\.tsx?$/.test(path),
});

const editionOf = ({ parts }: File) =>
  parts[0] === 'shared' && parts[1] === 'standards' && parts.length > 3 ? parts[2]! : undefined;

const featureOf = ({ parts }: File) =>
  parts[0] === 'src' && parts[1] === 'features' ? parts[2]! : undefined;

function wrongOrder(from: File, to: File): string | undefined {
  if (from.parts[0] !== 'shared' || to.parts[0] !== 'shared') return undefined;
  const [own, other] = [from.parts[1]!, to.parts[1]!];
  const [ownPlace, otherPlace] = [own, other].map((folder) => rules.sharedOrder.indexOf(folder));
  if (otherPlace === -1) return 'it lies in no folder of shared that the order knows';
  if (otherPlace! > ownPlace!) return `${own} stands before ${other}`;
  return rules.sharedApart[own]?.includes(other) ? `${own} knows no ${other}` : undefined;
}

function wrongEdition(from: File, to: File): string | undefined {
  const [own, other] = [editionOf(from), editionOf(to)];
  if (!own || !other || own === other) return undefined;
  return rules.editionsUsed[own]?.includes(other) ? undefined : 'another edition';
}

function wrongInClient(from: File, to: File): string | undefined {
  const [own, other] = [featureOf(from), featureOf(to)];
  if (own && other && own !== other) return 'another feature: a route composes them';
  if (from.parts[0] !== 'src' || to.parts[0] !== 'src') return undefined;
  const upwards =
    rules.clientGround.includes(from.parts[1]!) && rules.clientUpper.includes(to.parts[1]!);
  return upwards ? `${from.parts[1]} knows no ${to.parts[1]}` : undefined;
}

function wrongFile(from: File, to: File): string | undefined {
  const top = from.parts[0]!;
  if (to.parts[0] === 'tests') return from.isTest ? undefined : 'only tests import tests';
  if (!rules.zones[top]?.includes(to.parts[0]!)) return `${top} may not import ${to.parts[0]}`;
  return wrongOrder(from, to) ?? wrongEdition(from, to) ?? wrongInClient(from, to);
}

function wrongPackage(from: File, kind: 'node' | 'package', name: string): string | undefined {
  if (from.isTest) return undefined;
  const top = from.parts[0]!;
  if (kind === 'node') return top === 'server' ? undefined : `${top} runs without Node.js`;
  if (top === 'shared') {
    return rules.sharedPackages.includes(name) ? undefined : 'not among the packages of shared';
  }
  const others = top === 'src' ? rules.serverOnly : rules.clientOnly;
  return others.includes(name) ? 'a package of the other side' : undefined;
}

function wrongImport(from: File, written: string): string | undefined {
  const target = resolveImport(from.path, written);
  if (target.kind === 'file') return wrongFile(from, describe(target.path));
  return wrongPackage(from, target.kind, target.name);
}

/** Everything in one source file that the import zones forbid, each as one line of text. */
export function zoneViolations(source: Source): string[] {
  const from = describe(source.path);
  const { imports, code } = readSource(source);
  const found = imports.flatMap((written) => {
    const reason = wrongImport(from, written);
    return reason ? [`${source.path} imports ${written}: ${reason}`] : [];
  });
  if (from.parts[0] !== 'shared') return found;
  if (!rules.sharedOrder.includes(from.parts[1]!)) {
    found.push(`${source.path} lies in no folder of shared that the order knows`);
  }
  const impure = from.isTest ? [] : rules.impure.filter((pattern) => pattern.test(code));
  return [...found, ...impure.map((pattern) => `${source.path} isn't pure: ${pattern.source}`)];
}
