import type { Root } from 'mdast';
import type { LeafDirective } from 'mdast-util-directive';
import remarkDirective from 'remark-directive';
import remarkFrontmatter from 'remark-frontmatter';
import remarkGfm from 'remark-gfm';
import remarkMath from 'remark-math';
import remarkParse from 'remark-parse';
import { unified } from 'unified';
import { parse as parseYaml } from 'yaml';
import { z } from 'zod';
import { proseOf } from './prose.ts';
import {
  DIRECTIVES,
  type DirectiveName,
  isDirective,
  type Template,
  type TemplatePart,
  type TemplateProblem,
} from './template.ts';

const parser = unified()
  .use(remarkParse)
  .use(remarkFrontmatter)
  .use(remarkGfm)
  .use(remarkMath)
  .use(remarkDirective);

const frontMatter = z.strictObject({ name: z.string().trim().min(1).max(80) });

/** Blocks that no report may be without. */
const NEEDED: readonly { name: DirectiveName; rule: TemplateProblem['rule'] }[] = [
  { name: 'members', rule: 'no-members' },
  { name: 'cautions', rule: 'no-cautions' },
];

/**
 * Reads a template: Markdown prose between directives (`::cover`, `::members`, …). Everything wrong
 * is a problem with its place; the parts that are right are in the template all the same.
 */
export function parseTemplate(markdown: string): {
  template: Template;
  problems: TemplateProblem[];
} {
  const root: Root = parser.parse(markdown);
  const problems: TemplateProblem[] = [];
  const parts: TemplatePart[] = [];
  const seen = new Set<DirectiveName>();
  let name = 'Untitled';
  for (const node of root.children) {
    const report = (rule: TemplateProblem['rule'], message: string): void => {
      const { line, column } = node.position?.start ?? { line: 1, column: 1 };
      problems.push({ line, column, rule, message });
    };
    if (node.type === 'yaml') name = readName(node.value, report) ?? name;
    else if (node.type === 'leafDirective') {
      const directive = readDirective(node, seen, report);
      if (directive) parts.push({ kind: 'directive', name: directive });
    } else if (node.type === 'containerDirective') {
      report(
        'directive-form',
        `":::${node.name}" is a container; write "::${node.name}" on a line of its own`,
      );
    } else {
      const prose = proseOf(node, markdown);
      problems.push(...prose.problems);
      if (prose.block) parts.push({ kind: 'prose', block: prose.block });
    }
  }
  for (const { name: needed, rule } of NEEDED)
    if (!seen.has(needed))
      problems.push({ ...endOf(root), rule, message: `the template has no "::${needed}"` });
  return { template: { name, parts }, problems };
}

type Report = (rule: TemplateProblem['rule'], message: string) => void;

function readName(yaml: string, report: Report): string | null {
  let value: unknown;
  try {
    value = parseYaml(yaml);
  } catch {
    report('front-matter', 'the front matter is not YAML');
    return null;
  }
  const read = frontMatter.safeParse(value);
  if (read.success) return read.data.name;
  for (const problem of read.error.issues)
    report('front-matter', `${problem.path.join('.') || 'front matter'}: ${problem.message}`);
  return null;
}

function readDirective(
  node: LeafDirective,
  seen: Set<DirectiveName>,
  report: Report,
): DirectiveName | null {
  const { name } = node;
  if (!isDirective(name)) {
    report('unknown-directive', `"::${name}" is not one of ${Object.keys(DIRECTIVES).join(', ')}`);
    return null;
  }
  if (seen.has(name)) report('repeated-directive', `"::${name}" stands here a second time`);
  seen.add(name);
  if (node.children.length > 0) report('directive-form', `"::${name}" takes no text in brackets`);
  const attributes = DIRECTIVES[name].safeParse(node.attributes ?? {});
  for (const problem of attributes.error?.issues ?? [])
    report('directive-attribute', `"::${name}": ${problem.message}`);
  return name;
}

const endOf = (root: Root): { line: number; column: number } => {
  const end = root.position?.end;
  return { line: end?.line ?? 1, column: end?.column ?? 1 };
};
