import { useMemo, useState } from 'react';
import { Shell } from '#client/app/shell.tsx';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext } from '#client/document/document-context.ts';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';
import { Primitives } from './primitives.tsx';
import { sampleBlocks } from './sample-blocks.ts';
import { sampleFigures } from './sample-figures.ts';
import { sampleLines } from './sample-lines.ts';

/** Everything the interface is made of, on one page. */
export function Component() {
  const [chosen, setChosen] = useState<string | null>('sample/formula');
  const [current, setCurrent] = useState<string | null>('sample/formula');
  const context = useMemo<DocumentContext>(
    () => ({
      chosen,
      lit: new Set(['sample/lookup']),
      follow: setChosen,
      current,
      onCurrent: setCurrent,
      folds: null,
      titleFields: [
        { label: 'Calculation', value: 'TQ-CAL-012' },
        { label: 'Sheet', value: '3 of 6' },
      ],
    }),
    [chosen, current],
  );
  return (
    <Shell title="Gallery" crumbs={[{ text: 'Gallery' }]}>
      <Paper className="px-10 pt-9 pb-12">
        <PaperHead title="Gallery" sub="Every primitive, line kind, figure and block." />
        <PartHead title="Primitives" />
        <Primitives />
      </Paper>
      <DocumentContext value={context}>
        <Paper className="sheet-interactive @container/sheet mt-8 max-w-[880px] pb-10">
          <Blocks blocks={[...sampleBlocks, ...sampleFigures, ...sampleLines]} />
        </Paper>
      </DocumentContext>
    </Shell>
  );
}
