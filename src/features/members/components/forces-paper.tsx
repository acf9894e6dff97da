import { type ClipboardEvent, useState } from 'react';
import { Button } from '#client/ui/button.tsx';
import { HeadCell, Ledger } from '#client/ui/ledger.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import { SymbolMark } from '#client/ui/symbol.tsx';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import { type ActionName, actionNames, actionOf } from '#shared/contracts/members.ts';
import { withForcesOf } from '../edit-draft.ts';
import { firstCombination } from '../first-draft.ts';
import { actionWords } from '../member-fields.ts';
import { ForcesRow } from './forces-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { PasteDialog } from './paste-dialog.tsx';

/** All combinations as a table, to be typed in or pasted from a spreadsheet. */
export function ForcesPaper(props: {
  units: 'us' | 'si';
  /** Largest moments are asked for only where an analysis gives them. */
  withLargest: boolean;
  onShow: (id: string) => void;
}) {
  const { units } = props;
  const { draft, edit, editable } = useMemberForm();
  const [pasting, setPasting] = useState<string | null>(null);
  const rows = draft.combinations;
  const [withShears, setWithShears] = useState(() => rows.some(({ Vx, Vy }) => Vx || Vy));
  const asked = (action: ActionName) =>
    action.startsWith('V') ? withShears : props.withLargest || !action.endsWith('Max');
  const actions = actionNames.filter(
    (action) => asked(action) || rows.some((row) => actionOf(row, action).text !== ''),
  );
  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    if (!editable || !/[\t\n]./.test(text)) return;
    event.preventDefault();
    setPasting(text);
  };
  return (
    <section
      aria-label="Forces"
      onPaste={onPaste}
      className="mx-auto max-w-[1080px] bg-paper px-7 pt-6 pb-9 shadow-sheet"
    >
      <div className="mb-3 flex flex-wrap items-end justify-between gap-3">
        <div>
          <h1 className="font-serif text-title font-semibold">Member forces of {draft.mark}</h1>
          <p className="text-zinc-7">
            Compression positive; moments at the ends A and B about x (major) and y (minor). An
            empty moment is zero.{' '}
            {editable && !actions.includes('Vx') && (
              <button type="button" className="link" onClick={() => setWithShears(true)}>
                Shear forces too
              </button>
            )}
          </p>
        </div>
        {editable && (
          <div className="flex gap-2">
            <Button onClick={() => setPasting('')}>Paste a table</Button>
            <Button
              onClick={() =>
                edit({ ...draft, combinations: [...rows, firstCombination(rows)] }, 'rows/add')
              }
            >
              Add a row
            </Button>
          </div>
        )}
      </div>
      {rows.length === 0 ? (
        <Empty>
          No combinations yet. Copy them from a spreadsheet with their header row and paste them
          here, or add a row.
        </Empty>
      ) : (
        <Ledger
          caption="Combinations and their forces"
          head={
            <>
              <HeadCell className="w-[26%]">Combination</HeadCell>
              {actions.map((action) => (
                <HeadCell key={action} className="text-right">
                  <SymbolMark tex={actionWords[action].tex} />
                  <span className="sr-only">{actionWords[action].spoken}</span>
                </HeadCell>
              ))}
              <HeadCell className="w-[1%]">Source</HeadCell>
              <HeadCell className="w-[1%]">
                <span className="sr-only">Sheet, delete</span>
              </HeadCell>
            </>
          }
        >
          {rows.map((row, index) => (
            <ForcesRow
              key={row.id}
              row={row}
              index={index}
              actions={actions}
              onShow={props.onShow}
            />
          ))}
        </Ledger>
      )}
      {pasting !== null && (
        <PasteDialog
          text={pasting}
          units={units}
          present={rows}
          onClose={() => setPasting(null)}
          onTake={(combinations) => {
            const here = combinations.map((row) => withForcesOf(sectionTextOf(draft), row));
            edit({ ...draft, combinations: here }, 'rows/paste');
            setPasting(null);
          }}
        />
      )}
    </section>
  );
}
