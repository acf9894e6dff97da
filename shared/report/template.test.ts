import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseTemplate } from './parse-template.ts';
import { DIRECTIVES } from './template.ts';

const WHOLE = '---\nname: Short\n---\n\n::members\n\n::cautions\n';

describe('template', () => {
  it('reads the full report without a problem and with every block', () => {
    const text = readFileSync(new URL('../../templates/full.md', import.meta.url), 'utf8');
    const { template, problems } = parseTemplate(text);
    expect(problems).toEqual([]);
    const names = template.parts.flatMap((p) => (p.kind === 'directive' ? [p.name] : []));
    expect([...names].sort()).toEqual(Object.keys(DIRECTIVES).sort());
  });

  it('reads prose, emphasis, maths, lists and tables', () => {
    const { template, problems } = parseTemplate(
      `${WHOLE}\n## Part two\n\nAt 10:30 the **load** was $P_r$.\n\n1. one\n2. two\n\n| a | b |\n|---|--:|\n| 1 | 2 |\n\n---\n`,
    );
    expect(problems).toEqual([]);
    const blocks = template.parts.flatMap((p) => (p.kind === 'prose' ? [p.block] : []));
    expect(blocks).toEqual([
      { kind: 'heading', level: 2, text: 'Part two' },
      {
        kind: 'paragraph',
        content: [
          { kind: 'text', text: 'At 10' },
          { kind: 'text', text: ':30' },
          { kind: 'text', text: ' the ' },
          { kind: 'text', text: 'load', strong: true },
          { kind: 'text', text: ' was ' },
          { kind: 'math', tex: 'P_r', text: 'P_r' },
          { kind: 'text', text: '.' },
        ],
      },
      {
        kind: 'list',
        ordered: true,
        items: [[{ kind: 'text', text: 'one' }], [{ kind: 'text', text: 'two' }]],
      },
      {
        kind: 'table',
        caption: '',
        head: [
          { content: [{ kind: 'text', text: 'a' }], align: 'left' },
          { content: [{ kind: 'text', text: 'b' }], align: 'right' },
        ],
        rows: [
          [
            { content: [{ kind: 'text', text: '1' }], align: 'left' },
            { content: [{ kind: 'text', text: '2' }], align: 'right' },
          ],
        ],
        widths: [1, 1],
      },
      { kind: 'pageBreak' },
    ]);
  });

  it.each([
    ['an unknown directive', '\n\n::coverr\n', 'unknown-directive', 10, 1],
    ['an attribute it has not', '\n::cover{size="big"}\n', 'directive-attribute', 9, 1],
    ['text in brackets', '\n::cover[here]\n', 'directive-form', 9, 1],
    ['a container', '\n:::cover\nx\n:::\n', 'directive-form', 9, 1],
    ['a second one', '\n::members\n', 'repeated-directive', 9, 1],
    ['an image', '\nSee ![it](x.png) here\n', 'not-supported', 9, 5],
    ['HTML', '\n<b>x</b>\n', 'not-supported', 9, 1],
    ['a list in a list', '\n- a\n  - b\n', 'not-supported', 10, 3],
  ])('reports %s at its place', (_what, more, rule, line, column) => {
    const { problems } = parseTemplate(`${WHOLE}${more}`);
    expect(problems[0]).toMatchObject({ rule, line, column });
  });

  it('reports front matter that is wrong', () => {
    const rules = (yaml: string) =>
      parseTemplate(WHOLE.replace('name: Short', yaml)).problems.map((p) => [p.rule, p.line]);
    expect(rules('nam: x')).toEqual([
      ['front-matter', 1],
      ['front-matter', 1],
    ]);
    expect(rules('name: [')).toEqual([['front-matter', 1]]);
  });

  it('wants the members and the cautions', () => {
    expect(parseTemplate('::cover\n').problems.map((p) => p.rule)).toEqual([
      'no-members',
      'no-cautions',
    ]);
  });
});
