import type { Scene } from '#shared/figures/scene.ts';
import type { Block, DocumentTree, LineBlock } from '#shared/report/tree.ts';

/** A document with every kind of block, its member and numbers invented. For tests. */

const line = (more: Partial<LineBlock> & Pick<LineBlock, 'address' | 'number'>): LineBlock => ({
  kind: 'line',
  lineKind: 'formula',
  member: 'm1',
  reference: { clause: '', equation: '' },
  title: '',
  working: [],
  text: '',
  sentence: [],
  result: null,
  also: null,
  verdict: null,
  tone: 'plain',
  given: null,
  ...more,
});

const scene: Scene = {
  width: 640,
  height: 120,
  description: 'Member C-07 with its end moments and the second-order moment, largest at 9.27 ft.',
  shapes: [
    {
      kind: 'area',
      points: [
        [60, 20],
        [580, 20],
        [580, 34],
        [60, 34],
      ],
      fill: 'paper',
      stroke: { ink: 'ink', width: 1 },
    },
    {
      kind: 'line',
      points: [
        [60, 27],
        [580, 27],
      ],
      stroke: { ink: 'zinc3', width: 0.75, dash: [8, 2, 2, 2] },
    },
    {
      kind: 'area',
      points: [
        [60, 110],
        [60, 66],
        [200, 58],
        [320, 56],
        [450, 60],
        [580, 70],
        [580, 110],
      ],
      fill: 'oxide2',
    },
    {
      kind: 'line',
      points: [
        [60, 66],
        [200, 58],
        [320, 56],
        [450, 60],
        [580, 70],
      ],
      stroke: { ink: 'oxide', width: 1.75 },
    },
    { kind: 'circle', center: [320, 56], radius: 3, fill: 'oxide' },
    {
      kind: 'arc',
      center: [60, 27],
      radius: 20,
      from: 2,
      to: 4.3,
      stroke: { ink: 'oxide', width: 1.5 },
    },
    {
      kind: 'text',
      at: [326, 50],
      text: '134.4 kip ft at 9.27 ft',
      size: 11,
      weight: 600,
      anchor: 'start',
      ink: 'ink',
    },
    {
      kind: 'text',
      at: [320, 14],
      text: 'W12×79 · 22 ft 0 in',
      size: 11,
      weight: 400,
      anchor: 'middle',
      ink: 'ink',
    },
  ],
};

const sheet: Block[] = [
  { kind: 'sheetHead', member: 'm1', mark: 'C-07', section: 'W12×79', material: 'ASTM A992' },
  {
    kind: 'verdict',
    verdict: 'OK',
    ratioText: '0.898',
    address: 'c1:H1/ratio',
    terms: [
      { label: 'axial', value: 0.514, text: '0.514' },
      { label: 'major', value: 0.298, text: '0.298' },
      { label: 'minor', value: 0.086, text: '0.086' },
    ],
    limit: '1.000',
    governs: 'H1-1a, flexure and compression',
    combination: '1.2D + 1.6L',
  },
  { kind: 'figure', scene, caption: 'Member and second-order moment, combination 1.2D + 1.6L.' },
  { kind: 'lineSection', reference: '', title: 'Given values', address: 'given' },
  line({
    address: 'given/L',
    number: '1.1',
    lineKind: 'given',
    title: 'Length',
    working: ['\\htmlData{ref=given/L}{L}'],
    text: 'L = 22 ft = 264 in',
    result: { value: '264', unit: 'in' },
    also: { value: '22', unit: 'ft' },
    given: { letter: 'D', source: 'drawing S-201 rev C, grid 4/B', confirmed: true },
  }),
  line({
    address: 'given/Lcy',
    number: '1.2',
    lineKind: 'given',
    title: 'Buckling length about y',
    working: ['{L_{cy}}'],
    text: 'Lcy = 22 ft = 264 in',
    result: { value: '264', unit: 'in' },
    given: { letter: 'A', source: 'assumption: held at both ends only', confirmed: false },
  }),
  line({
    address: 'given/ends',
    number: '1.3',
    lineKind: 'statement',
    title: 'Ends of the member',
    text: 'Ends of the member: held in both planes and against twist',
    result: { value: 'held in both planes and against twist', unit: '' },
    given: { letter: 'T', source: 'typed', confirmed: true },
  }),
  line({
    address: 'table/Ix',
    number: '1.4',
    lineKind: 'lookup',
    title: 'Second moment of area about x',
    working: ['{I_x}'],
    text: 'Ix = 662 in⁴',
    sentence: [{ kind: 'text', quiet: true, text: 'W shapes, row W12X79, column Ix' }],
    result: { value: '662', unit: 'in⁴' },
  }),
  {
    kind: 'lineSection',
    reference: 'App. 8, theory',
    title: 'Second-order moment, major axis',
    address: 'second',
  },
  line({
    address: 'c1:theory/EI',
    number: '14.21',
    reference: { clause: 'C2.3', equation: '0.8' },
    title: 'Flexural rigidity, reduced',
    working: [
      '{EI^{*}}',
      '=0.8\\,{\\tau_b}\\,{E}\\,{\\htmlData{ref=table/Ix}{I_x}}',
      '=0.8\\,{(1.000)}\\,{(29\\,000)}\\,{(\\htmlData{ref=table/Ix}{662})}',
    ],
    text: 'EI* = 0.8 τb E Ix = 0.8 (1.000) (29 000) (662) = 15 358 000 kip in²',
    result: { value: '15\u2009358\u2009000', unit: 'kip in²' },
  }),
  line({
    address: 'c1:theory/kL',
    number: '14.22',
    reference: { clause: 'theory 1', equation: '' },
    title: 'Axial parameter',
    working: [
      '{kL}',
      '=\\sqrt{\\dfrac{{P}}{{\\htmlData{ref=c1:theory/EI}{EI^{*}}}}}\\,{\\htmlData{ref=given/L}{L}}',
      '=\\sqrt{\\dfrac{{310.0}}{{\\htmlData{ref=c1:theory/EI}{15\\,358\\,000}}}}\\,{(\\htmlData{ref=given/L}{264.0})}',
    ],
    text: 'kL = √(P/EI*) L = √(310.0/15 358 000) (264.0) = 1.1861 rad',
    result: { value: '1.1861', unit: 'rad' },
  }),
  line({
    address: 'c1:theory/place',
    number: '14.23',
    lineKind: 'choice',
    reference: { clause: 'theory 1.1', equation: '' },
    title: 'Place of the largest moment',
    text: 'The maximum lies in the span, because ψ = 0.8814 exceeds cos kL = 0.3753.',
    sentence: [
      { kind: 'text', text: 'The maximum lies in the span', strong: true },
      { kind: 'text', text: ', because ' },
      { kind: 'math', tex: '\\psi', text: 'ψ' },
      { kind: 'text', text: ' = ' },
      { kind: 'value', text: '0.8814', address: 'c1:theory/kL' },
      { kind: 'text', text: ' exceeds ' },
      { kind: 'math', tex: '\\cos kL', text: 'cos kL' },
      { kind: 'text', text: ' = ' },
      { kind: 'value', text: '0.3753', address: 'c1:theory/kL' },
      { kind: 'text', text: '. Otherwise the larger end moment would govern.' },
    ],
  }),
  line({
    address: 'c1:theory/Mmax',
    number: '14.24',
    reference: { clause: 'theory 1.1', equation: '' },
    title: 'Largest second-order moment',
    working: [
      '{M_{max}}',
      '={M_A}\\,\\dfrac{\\sqrt{1-2\\psi\\cos{\\htmlData{ref=c1:theory/kL}{kL}}+\\psi^{2}}}{\\sin{\\htmlData{ref=c1:theory/kL}{kL}}}',
      '=118.0\\,\\dfrac{\\sqrt{1-2(0.8814)(0.3753)+0.8814^{2}}}{0.9269}',
    ],
    text: 'Mmax = MA √(1 − 2ψ cos kL + ψ²)/sin kL = 118.0 √(1 − 2(0.8814)(0.3753) + 0.8814²)/0.9269 = 134.4 kip ft',
    result: { value: '1613', unit: 'kip in' },
    also: { value: '134.4', unit: 'kip ft' },
  }),
  line({
    address: 'c1:theory/caution',
    number: '14.25',
    lineKind: 'notice',
    title: 'Unbraced length taken as the member’s length',
    tone: 'caution',
    text: 'caution: Twist is taken as held at the ends only.',
    sentence: [
      {
        kind: 'text',
        text: 'Twist is taken as held at the ends only; no brace between them is counted.',
      },
    ],
  }),
  line({
    address: 'c1:H1/tension',
    number: '14.26',
    lineKind: 'notice',
    reference: { clause: 'H1.2', equation: '' },
    title: 'Axial tension',
    tone: 'outside scope',
    verdict: 'NOT CHECKED',
    text: 'outside scope: Tension is outside what this book covers.',
    sentence: [{ kind: 'text', text: 'Tension is outside what this book covers.' }],
  }),
  line({
    address: 'c1:A8/Pe1',
    number: '14.27',
    lineKind: 'notice',
    reference: { clause: 'App. 8', equation: 'A-8-5' },
    title: 'Elastic critical load',
    tone: 'failed',
    verdict: 'FAILED',
    text: 'failed: The required axial force is not below the elastic critical load.',
    sentence: [
      {
        kind: 'text',
        text: 'The required axial force is not below the elastic critical load; the member is unstable.',
      },
    ],
  }),
  { kind: 'lineSection', reference: 'H1', title: 'Flexure and compression', address: 'h1' },
  line({
    address: 'c1:H1/interaction',
    number: '14.30',
    reference: { clause: 'H1.1', equation: 'H1-1a' },
    title: 'Interaction',
    working: [
      '{r}',
      '=\\dfrac{{P_r}}{{P_c}}+\\dfrac{8}{9}\\left(\\dfrac{{M_{rx}}}{{M_{cx}}}+\\dfrac{{M_{ry}}}{{M_{cy}}}\\right)',
      '=\\dfrac{310.0}{603.2}+\\dfrac{8}{9}\\left(\\dfrac{134.4}{400.9}+\\dfrac{18.00}{186.0}\\right)',
    ],
    text: 'r = Pr/Pc + 8/9 (Mrx/Mcx + Mry/Mcy) = 310.0/603.2 + 8/9 (134.4/400.9 + 18.00/186.0) = 0.898',
    result: { value: '0.898', unit: '' },
  }),
  line({
    address: 'c1:H1/ratio',
    number: '14.31',
    lineKind: 'check',
    reference: { clause: 'H1.1', equation: 'H1-1a' },
    title: 'Check of flexure and compression',
    working: ['{r}', '=\\htmlData{ref=c1:H1/interaction}{0.898}', '\\le 1'],
    text: 'r = 0.898 ≤ 1, OK',
    result: { value: '0.898', unit: '' },
    verdict: 'OK',
  }),
];

/** Lines enough for a second page. */
const more: Block[] = Array.from({ length: 14 }, (_, index) =>
  line({
    address: `c1:E3/step${index}`,
    number: `14.${40 + index}`,
    reference: { clause: 'E3', equation: 'E3-2' },
    title: 'Nominal stress, inelastic branch',
    working: [
      '{F_n}',
      '=\\left(0.658^{\\frac{{F_y}}{{F_e}}}\\right){F_y}',
      '=\\left(0.658^{\\frac{50.00}{38.20}}\\right){(50.00)}',
    ],
    text: 'Fn = 0.658^(Fy/Fe) Fy = 0.658^(50.00/38.20) (50.00) = 28.91 ksi',
    result: { value: '28.91', unit: 'ksi' },
  }),
);

export const sampleDocument: DocumentTree = {
  language: 'en',
  title: 'TQ-CAL-012 Hall columns <B & C>',
  frame: {
    firm: 'Harrow & Pike Structural',
    project: 'TQ Tern Quay Ferry Hall',
    calculation: 'TQ-CAL-012',
    title: 'Hall columns <B & C>',
    revision: 'B, draft',
    date: '2026-03-12',
    originator: 'IM',
    checker: 'TO',
    marking: 'Preliminary, not issued',
    foot: 'This calculation does not replace the locally adopted code and its amendments; a licensed engineer takes responsibility for it. Not covered: connections, base plates, bracing, deflection, torsion, fire, fatigue, seismic detailing, erection stability, temporary works.',
    paper: 'A4',
  },
  blocks: [
    {
      kind: 'cover',
      title: 'Hall columns <B & C>',
      number: 'TQ-CAL-012',
      project: 'Tern Quay Ferry Hall',
      fields: [
        { label: 'Firm', value: 'Harrow & Pike Structural' },
        { label: 'Client', value: 'Tern Quay Harbour Trust' },
        { label: 'Revision', value: 'B, draft' },
        { label: 'Date', value: '2026-03-12' },
        { label: 'Originator', value: 'Inés Marlöw 日' },
        { label: 'Checker', value: 'not yet checked' },
        { label: 'Standard', value: 'ANSI/AISC 360-22, LRFD' },
        { label: 'Inputs not confirmed', value: '5', tone: 'over' },
        {
          label: 'Result hash',
          value: '0f3c9d1be57a4862c1d09e7b3a64f852910c7de4b8a35f6027d1c49e8b60a3f7',
        },
      ],
      notices: [
        'Preliminary, not issued',
        '5 inputs are not confirmed; the list follows the summary.',
      ],
      cautions: ['It does not replace the locally adopted building code and its amendments.'],
    },
    { kind: 'pageBreak' },
    { kind: 'heading', level: 1, text: 'Summary' },
    {
      kind: 'paragraph',
      content: [
        {
          kind: 'text',
          text: 'The verdict of a member is the worst of its combinations; its ratio is the largest of all its checks. With ',
        },
        { kind: 'math', tex: '{P_r}/{P_c} \\ge 0.2', text: 'Pr/Pc ≥ 0.2' },
        { kind: 'text', text: ' the interaction is the first of the two; ' },
        { kind: 'text', text: 'NOT CHECKED', strong: true },
        { kind: 'text', text: ' and FAILED have no ratio.' },
      ],
    },
    {
      kind: 'table',
      caption: 'Members and their results',
      head: ['Member', 'Section', 'Verdict', 'Ratio', 'Governs'].map((text) => ({
        content: [{ kind: 'text', text }],
        ...(text === 'Ratio' ? { align: 'right' as const } : {}),
      })),
      rows: [
        ['C-07', 'W12×79', 'OK', '0.898', 'H1-1a, flexure and compression, 1.2D + 1.6L'],
        ['C-11', 'W14×90', 'NOT OK', '1.041', 'H1-1a, flexure and compression, 1.2D + 1.6L'],
      ].map((cells, row) =>
        cells.map((text, column) => ({
          content: [
            column === 3 && row === 0
              ? ({ kind: 'value', text, address: 'c1:H1/ratio', member: 'm1' } as const)
              : ({ kind: 'text', text } as const),
          ],
          ...(column === 3 ? { align: 'right' as const } : {}),
          ...(column === 2 && row === 1 ? { tone: 'over' as const } : {}),
          ...(column === 0 ? { tone: 'strong' as const } : {}),
        })),
      ),
      widths: [2, 2.4, 2.2, 1.4, 6],
    },
    { kind: 'heading', level: 2, text: 'Cautions' },
    {
      kind: 'cautions',
      items: [
        'This calculation does not replace the locally adopted building code and its amendments, nor the standards it cites. Where they differ from it, they decide.',
        'A licensed engineer takes responsibility for this calculation.',
      ],
    },
    { kind: 'heading', level: 3, text: 'How to read it' },
    {
      kind: 'list',
      ordered: true,
      items: [
        [
          {
            kind: 'text',
            text: 'Each line shows its clause, its formula in symbols, the same with the printed values, and its result.',
          },
        ],
        [
          {
            kind: 'text',
            text: 'The printed values reproduce the printed result to its last digit.',
          },
        ],
      ],
    },
    ...sheet,
    ...more,
  ],
};
