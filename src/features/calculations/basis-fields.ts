import type { MergeRules } from '#client/lib/draft/merge.ts';
import type { HeadAndBasis } from './mutations.ts';

const labels: Readonly<Record<string, string>> = {
  number: 'Number',
  title: 'Title',
  'basis.standard': 'Standard',
  'basis.design': 'Design',
  'basis.units': 'Units',
  'basis.constants': 'Material constants',
  'basis.analysis.method': 'Method of analysis',
  'basis.analysis.secondOrder': 'Second-order moments',
  'basis.analysis.includesMemberEffect': 'Member effect in the analysis',
  'basis.analysis.sway': 'Sway of the stories',
  'basis.analysis.swaySource': 'Sway known from',
  'basis.analysis.driftRatio': 'Drift ratio',
  'basis.analysis.driftSource': 'Drift ratio known from',
  'basis.analysis.provisions': 'Optional provisions',
  'basis.analysis.notionalLoads': 'Notional loads',
  'basis.analysis.program': 'Program of the analysis',
  'basis.analysis.file': 'File of the analysis',
  'basis.buildingCode.name': 'Building code',
  'basis.buildingCode.year': 'Year of the building code',
  'basis.buildingCode.amendments': 'Local amendments',
  'basis.adoptedEdition': 'Edition the building code adopts',
  'basis.loadStandard': 'Load standard',
  'basis.assumptions': 'Assumptions',
};

type Tree = Readonly<Record<string, unknown>>;
const isTree = (value: unknown): value is Tree =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function leaves(tree: Tree, at = ''): [string, unknown][] {
  return Object.entries(tree).flatMap(([name, value]) =>
    isTree(value) ? leaves(value, `${at}${name}.`) : [[`${at}${name}`, value] as [string, unknown]],
  );
}

const leaf = (tree: unknown, path: readonly string[]): unknown =>
  path.reduce<unknown>((at, name) => (isTree(at) ? at[name] : undefined), tree);

function put(tree: Tree, [name = '', ...rest]: readonly string[], value: unknown): Tree {
  const below = tree[name];
  return { ...tree, [name]: rest.length > 0 && isTree(below) ? put(below, rest, value) : value };
}

/** A calculation's head and basis as fields, each on its own. */
export const basisRules: MergeRules<HeadAndBasis> = {
  fields: (value) =>
    leaves(value as unknown as Tree).map(([id, field]) => ({
      id,
      label: labels[id] ?? id,
      text: field === null ? '' : Array.isArray(field) ? field.join(', ') : String(field),
      value: field,
    })),
  take: (into, from, id) => {
    const path = id.split('.');
    return put(into as unknown as Tree, path, leaf(from, path)) as unknown as HeadAndBasis;
  },
};
