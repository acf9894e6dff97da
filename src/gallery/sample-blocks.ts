import type { Scene } from '#shared/figures/scene.ts';
import type { Block, Inline } from '#shared/report/tree.ts';

const text = (words: string): Inline => ({ kind: 'text', text: words });
const cell = (words: string, tone: 'plain' | 'quiet' | 'over' | 'strong' = 'plain') => ({
  content: [text(words)],
  tone,
});

const scene: Scene = {
  width: 640,
  height: 120,
  description: 'Every shape a figure may have: line, dashed line, area, circle, arc and text.',
  shapes: [
    {
      kind: 'area',
      points: [
        [20, 90],
        [180, 90],
        [180, 40],
        [20, 60],
      ],
      fill: 'oxide2',
      stroke: { ink: 'oxide', width: 1.5 },
    },
    {
      kind: 'line',
      points: [
        [220, 90],
        [380, 30],
      ],
      stroke: { ink: 'ink', width: 1 },
    },
    {
      kind: 'line',
      points: [
        [220, 100],
        [380, 40],
      ],
      stroke: { ink: 'zinc5', width: 1, dash: [4, 3] },
    },
    {
      kind: 'circle',
      center: [440, 60],
      radius: 20,
      fill: 'zinc1',
      stroke: { ink: 'ink', width: 1 },
    },
    {
      kind: 'arc',
      center: [510, 60],
      radius: 22,
      from: -2,
      to: 1.2,
      stroke: { ink: 'oxide', width: 1.5 },
    },
    {
      kind: 'text',
      at: [560, 64],
      text: 'text',
      size: 11,
      weight: 600,
      anchor: 'start',
      ink: 'ink',
    },
  ],
};

/** One block of every kind but lines, made up. */
export const sampleBlocks: readonly Block[] = [
  {
    kind: 'cover',
    number: 'TQ-CAL-012',
    title: 'Hall columns',
    project: '2417 Tern Quay Ferry Hall',
    fields: [
      { label: 'Revision', value: 'B, draft' },
      { label: 'Originator', value: 'Ines Marlow' },
      { label: 'Worst verdict', value: 'NOT OK 1.041', tone: 'over' },
    ],
    notices: ['Preliminary, not issued.'],
    cautions: ['It does not replace the locally adopted building code and its amendments.'],
  },
  { kind: 'heading', level: 1, text: 'A heading of the first level' },
  { kind: 'heading', level: 2, text: 'Of the second' },
  { kind: 'heading', level: 3, text: 'Of the third' },
  {
    kind: 'paragraph',
    content: [
      text('A paragraph with '),
      { kind: 'text', text: 'strong', strong: true },
      text(' and '),
      { kind: 'text', text: 'quiet', quiet: true },
      text(' words, maths '),
      { kind: 'math', tex: 'M_r = B_1 M_{nt}', text: 'Mr = B1 Mnt' },
      text(' and a value '),
      { kind: 'value', text: '134.4 kip ft', address: 'sample/formula' },
      text('.'),
    ],
  },
  { kind: 'list', ordered: false, items: [[text('An item')], [text('Another item')]] },
  { kind: 'list', ordered: true, items: [[text('The first')], [text('The second')]] },
  {
    kind: 'table',
    caption: 'A table',
    head: [cell('Member'), cell('Section'), { ...cell('Ratio'), align: 'right' }],
    rows: [
      [cell('C-05', 'strong'), cell('W10×49', 'quiet'), { ...cell('OK 0.612'), align: 'right' }],
      [cell('C-11', 'strong'), cell('W14×90'), { ...cell('NOT OK 1.041', 'over'), align: 'right' }],
    ],
    widths: [2, 2, 1],
  },
  { kind: 'pageBreak' },
  { kind: 'sheetHead', member: 'sample', mark: 'C-07', section: 'W12X79', material: 'A992' },
  ...(
    [
      ['OK', '0.898', [0.514, 0.298, 0.086]],
      ['NOT OK', '1.041', [0.6, 0.341, 0.1]],
      ['NOT CHECKED', null, []],
      ['FAILED', null, []],
    ] as const
  ).map(
    ([verdict, ratioText, values]): Block => ({
      kind: 'verdict',
      verdict,
      ratioText,
      address: null,
      terms: values.map((value, index) => ({
        label: ['axial', 'major', 'minor'][index] ?? '',
        value,
        text: value.toFixed(3),
      })),
      limit: '1.000',
      governs: ratioText ? 'H1-1a' : 'E3, outside scope',
      combination: '1.2D + 1.6L',
    }),
  ),
  { kind: 'figure', scene, caption: 'A figure with every shape.' },
  { kind: 'cautions', items: ['A caution that every sheet says.', 'Another.'] },
];
