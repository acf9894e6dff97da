import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { type Row, stroke, type Tag } from '../items.ts';
import { type TextStyle, textStyles, weights } from '../paper.ts';
import { sheetColumns } from './sheet-columns.ts';
import { plain, setWords } from './words.ts';

const titleStyle: TextStyle = {
  ...textStyles.prose,
  face: 'ibm-plex-serif-semibold',
  size: 11.5,
  leading: 14.5,
};
const referenceStyle: TextStyle = {
  ...textStyles.cell,
  face: 'ibm-plex-sans-condensed-semibold',
  ink: 'zinc7',
};

/** A section's head within a sheet: clause at the left, title in serif, on one baseline. */
export function measureLineSection(block: BlockOf<'lineSection'>, context: BlockContext): Row[] {
  const { reference, working } = sheetColumns;
  const tag: Tag = { type: 'H3', parent: context.sect };
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
  const bookmark = { kind: 'bookmark', level: 2, title: block.title } as const;
  const rule = stroke([0, foot], [context.width, foot], weights.hair, 'zinc3');
  const parts = [
    { tag, items: [bookmark, ...clause.items] },
    { tag, items: title.items },
    { tag: null, items: [rule] },
  ];
  return [row(foot + 0.5, parts, { before: 14, keep: true })];
}
