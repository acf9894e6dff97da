import type { PhrasingContent, RootContent, Table } from 'mdast';
import 'mdast-util-directive';
import 'mdast-util-math';
import type { TemplateProblem } from './template.ts';
import type { Block, Inline, TableCell } from './tree.ts';

/** What may stand between the directives, right or not. */
type ProseNode = Exclude<RootContent, { type: 'yaml' | 'leafDirective' | 'containerDirective' }>;

interface Prose {
  readonly block: Block | null;
  readonly problems: readonly TemplateProblem[];
}

/** One Markdown block of a template as a block of the document. */
export function proseOf(node: ProseNode, markdown: string): Prose {
  const reader = new InlineReader(markdown);
  const block = blockOf(node, reader);
  return { block, problems: reader.problems };
}

function blockOf(node: ProseNode, reader: InlineReader): Block | null {
  switch (node.type) {
    case 'heading': {
      const level = node.depth === 1 ? 1 : node.depth === 2 ? 2 : 3;
      return { kind: 'heading', level, text: plainText(reader.read(node.children)) };
    }
    case 'paragraph':
      return { kind: 'paragraph', content: reader.read(node.children) };
    case 'thematicBreak':
      return { kind: 'pageBreak' };
    case 'list': {
      const items = node.children.map((item) =>
        item.children.flatMap((child) => {
          if (child.type === 'paragraph') return reader.read(child.children);
          reader.refuse(child, `a list item holds ${child.type}; text only`);
          return [];
        }),
      );
      return { kind: 'list', ordered: node.ordered ?? false, items };
    }
    case 'table':
      return tableOf(node, reader);
    default:
      reader.refuse(node, `${node.type} can't be set in a report`);
      return null;
  }
}

function tableOf(node: Table, reader: InlineReader): Block {
  const [head = [], ...rows] = node.children.map((row) =>
    row.children.map((cell, column): TableCell => {
      const align = node.align?.[column] === 'right' ? 'right' : 'left';
      return { content: reader.read(cell.children), align };
    }),
  );
  return { kind: 'table', caption: '', head, rows, widths: head.map(() => 1) };
}

const plainText = (inlines: readonly Inline[]): string => inlines.map((i) => i.text).join('');

/** Turns phrasing content into inlines and gathers what can't be set. */
class InlineReader {
  readonly problems: TemplateProblem[] = [];
  private readonly markdown: string;

  constructor(markdown: string) {
    this.markdown = markdown;
  }

  refuse(node: { position?: ProseNode['position'] }, message: string): void {
    const { line, column } = node.position?.start ?? { line: 1, column: 1 };
    this.problems.push({ line, column, rule: 'not-supported', message });
  }

  read(nodes: readonly PhrasingContent[], strong = false): Inline[] {
    return nodes.flatMap((node): Inline[] => {
      const text = (words: string): Inline[] => [
        { kind: 'text', text: words, ...(strong ? { strong } : {}) },
      ];
      switch (node.type) {
        case 'text':
          return text(node.value.replace(/\n/g, ' '));
        case 'break':
          return text(' ');
        case 'strong':
          return this.read(node.children, true);
        case 'inlineMath':
          return [{ kind: 'math', tex: node.value, text: node.value }];
        case 'textDirective': {
          // "at 10:30" holds no directive: a colon in prose stays what was written.
          const { start, end } = node.position ?? {};
          return text(this.markdown.slice(start?.offset ?? 0, end?.offset ?? 0));
        }
        default:
          this.refuse(node, `${node.type} can't be set in a report`);
          return [];
      }
    });
  }
}
