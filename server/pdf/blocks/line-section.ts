import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { type Row, stroke, type Tag } from '../items.ts';
import { type InkName, type TextStyle, textStyles, weights } from '../paper.ts';
import { sheetColumns } from './sheet-columns.ts';
import { plain, setWords } from './words.ts';

const titleFace = { ...textStyles.prose, face: 'ibm-plex-serif-semibold' } as const;

/** Sections and the parts within them: bays, segments, flanges. */
const levels = {
  1: { style: { ...titleFace, size: 11.5, leading: 14.5 }, before: 14, tag: 'H3', rule: 'zinc3' },
  2: { style: { ...titleFace, size: 10.5, leading: 13.5 }, before: 11, tag: 'H4', rule: 'zinc3' },
  3: { style: { ...titleFace, size: 9.5, leading: 12.5 }, before: 8, tag: 'H5', rule: 'zinc2' },
} as const satisfies Record<
  1 | 2 | 3,
  { style: TextStyle; before: number; tag: Tag['type']; rule: InkName }
>;
const referenceStyle: TextStyle = {
  ...textStyles.cell,
  face: 'ibm-plex-sans-condensed-semibold',
  ink: 'zinc7',
};

/** A section's head within a sheet: clause at the left, title in serif, on one baseline. */
export function measureLineSection(block: BlockOf<'lineSection'>, context: BlockContext): Row[] {
  const { reference, working } = sheetColumns;
  const { style: titleStyle, before, tag: type, rule: ink } = levels[block.level];
  const tag: Tag = { type, parent: context.sect };
  const titlePlace = { x: working.x, y: 0, width: context.width - working.x };
  const title = setWords(plain(block.title), titleStyle, titlePlace, context);
  const drop = titleStyle.leading * 0.76 - referenceStyle.leading * 0.76;
  const clause = setWords(
    plain(block.reference),
    referenceStyle,
    { ...reference, y: drop },
    context,
  );
  const foot = Math.max(title.height, drop + clause.height) + 3;
  const bookmark = { kind: 'bookmark', level: 2 + block.level, title: block.title } as const;
  const rule = stroke([0, foot], [context.width, foot], weights.hair, ink);
  const parts = [
    { tag, items: [bookmark, ...clause.items] },
    { tag, items: title.items },
    { tag: null, items: [rule] },
  ];
  return [row(foot + 0.5, parts, { before, keep: true })];
}
