import { type ReactNode, useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { VersionedDraft } from '#client/lib/draft/use-versioned-draft.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { ConflictDialog } from '#client/ui/conflict-dialog.tsx';
import { useFormKeys } from '#client/ui/use-form-keys.ts';
import type { MemberRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { LengthName, MemberDraft } from '#shared/contracts/members.ts';
import { derivedLength } from '../derived-length.ts';
import { type FinderCriteria, firstCriteria } from '../finder-criteria.ts';
import { firstCombination } from '../first-draft.ts';
import { memberRules } from '../member-rules.ts';
import { useLivePreview } from '../use-preview.ts';
import { useSheet } from '../use-sheet.ts';
import { useSheetFolds } from '../use-sheet-folds.ts';
import { focusLine, focusSection, lineElement, useSheetKeys } from '../use-sheet-keys.ts';
import { useSheetPlace } from '../use-sheet-place.ts';
import { BlankSheet } from './blank-sheet.tsx';
import { FinderPaper } from './finder-paper.tsx';
import { ForcesPaper } from './forces-paper.tsx';
import { InputsMargin } from './inputs-margin.tsx';
import { MemberFormContext } from './member-form-context.ts';
import { type CentreView, MemberStrip } from './member-strip.tsx';
import { SheetCautions } from './sheet-cautions.tsx';
import { SheetContents } from './sheet-contents.tsx';
import { SheetPaper } from './sheet-paper.tsx';
import { focusControl, StaleNotice } from './stale-notice.tsx';
import { TraceMargin } from './trace-margin.tsx';
import { WorseElsewhere } from './worse-elsewhere.tsx';

/** A member: inputs at the left, its live sheet in the middle, the trace at the right. */
export function MemberEditor(props: {
  memberId: string;
  draft: VersionedDraft<MemberDraft>;
  basis: BasisDraft;
  editable: boolean;
  /** Place among the calculation's members, from 1. */
  position: number;
  titleFields: readonly { label: string; value: string }[];
  basisNote: ReactNode;
  neighbours: ReactNode;
}) {
  const { memberId, draft, basis, editable, position } = props;
  const { value, edit } = draft;
  const [view, setView] = useState<CentreView>('sheet');
  const [criteria, setCriteria] = useState<FinderCriteria | null>(null);
  const announce = useAnnounce();
  const place = useSheetPlace();
  const preview = useLivePreview(basis, memberId, value);
  const recordOfMember = preview.record?.members[0] ?? null;
  const opening = useOpening(recordOfMember);
  const wanted = place.combination ?? opening ?? value.combinations[0]?.id;
  const sheet = useSheet(preview.record, memberId, position, wanted, place.line);
  const folds = useSheetFolds(memberId, sheet.blocks);
  const sheetElement = useRef<HTMLElement>(null);
  const traceElement = useRef<HTMLElement>(null);

  const chooseLine = place.chooseLine;
  const pending = useRef<string | null>(place.line);
  const follow = useCallback(
    (address: string) => {
      setView('sheet');
      pending.current = address;
      chooseLine(address);
    },
    [chooseLine],
  );
  // A line followed to, or linked to, is scrolled to once its sheet is drawn and its section open.
  useEffect(() => {
    const address = pending.current;
    if (view !== 'sheet' || !address || address !== place.line) return;
    if (focusLine(sheetElement.current, address, 'center')) pending.current = null;
    else folds.reveal(address);
  }, [place.line, folds, view]);

  // A line chosen where it stands, or gone back to, comes out from under what may cover it.
  const shown = useRef<string | null>(null);
  useEffect(() => {
    const address = place.line;
    if (address === shown.current) return;
    shown.current = address;
    if (!address) return;
    folds.reveal(address);
    lineElement(sheetElement.current, address)?.scrollIntoView({ block: 'nearest' });
  }, [place.line, folds]);

  const copyLine = useCallback(
    (address: string) => {
      const block = sheet.blocks.find((b) => b.kind === 'line' && b.address === address);
      if (block?.kind !== 'line') return;
      const { number, title, text } = block;
      copy(`${number} ${title}: ${text}`, () => announce(`Line ${number} copied as text.`));
    },
    [sheet.blocks, announce],
  );
  const copyLink = () =>
    copy(window.location.href, () => announce('A link to this line is on the clipboard.'));
  const sheetKeys = useSheetKeys({
    sheet: sheetElement,
    trace: traceElement,
    chosen: place.line,
    choose: chooseLine,
    close: place.closeLine,
    copyLine,
    folds,
  });
  useFormKeys(draft);
  const go = (path: string) => {
    const row = /^combinations\[(\d+)\]/.exec(path)?.[1];
    const combination = row === undefined ? undefined : value.combinations[Number(row)];
    if (combination && combination.id !== sheet.combination) place.showCombination(combination.id);
    focusControl(path);
  };

  const problems = preview.problems;
  const form = useMemo(() => {
    const messages = new Map(problems.map(({ path, message }) => [path, message]));
    return {
      draft: value,
      edit,
      editable,
      derived: (name: LengthName) =>
        problems.length === 0 ? derivedLength(sheet.blocks, name) : null,
      problemAt: (path: string) => messages.get(path),
    };
  }, [value, edit, editable, problems, sheet.blocks]);

  return (
    <MemberFormContext value={form}>
      <div
        className={view === 'sheet' ? 'member-layout' : 'member-layout is-forces'}
        data-print-plain
      >
        <InputsMargin
          basis={basis}
          record={recordOfMember}
          combination={wanted}
          note={props.basisNote}
          restoredFrom={draft.restoredFrom}
          onShow={place.showCombination}
          onAdd={() => {
            const row = firstCombination(value.combinations);
            edit({ ...value, combinations: [...value.combinations, row] }, 'rows/add');
            place.showCombination(row.id);
          }}
          onOpenTable={() => setView('forces')}
        />
        <div data-print-plain className="min-w-0 px-5 pt-3 pb-12">
          <MemberStrip
            view={view}
            onView={setView}
            draft={draft}
            editable={editable}
            neighbours={props.neighbours}
          />
          <StaleNotice problems={problems} hasSheet={sheet.blocks.length > 0} onGo={go} />
          {view === 'forces' ? (
            <ForcesPaper
              units={basis.units}
              withLargest={basis.analysis.secondOrder === 'from-analysis'}
              onShow={(id) => {
                place.showCombination(id);
                setView('sheet');
              }}
            />
          ) : view === 'finder' ? (
            <FinderPaper
              memberId={memberId}
              basis={basis}
              record={recordOfMember}
              problems={problems}
              criteria={criteria ?? firstCriteria(value)}
              onCriteria={setCriteria}
              onShowSheet={() => setView('sheet')}
            />
          ) : sheet.blocks.length === 0 ? (
            <BlankSheet mark={value.mark} titleFields={props.titleFields} />
          ) : (
            <>
              {recordOfMember && (
                <WorseElsewhere
                  member={recordOfMember}
                  shown={sheet.combination}
                  onShow={place.showCombination}
                />
              )}
              <SheetPaper
                sheet={sheetElement}
                blocks={sheet.blocks}
                chosen={place.line}
                lit={sheet.lit}
                titleFields={props.titleFields}
                folds={folds}
                onChoose={chooseLine}
                onFollow={follow}
                onKeyDown={sheetKeys}
              />
              <SheetCautions />
            </>
          )}
        </div>
        {view === 'sheet' && (
          // biome-ignore lint/a11y/noStaticElementInteractions: the keys of the sheet hold in its trace too
          <div className="contents" onKeyDown={sheetKeys}>
            <TraceMargin
              container={traceElement}
              trace={sheet.trace}
              lost={place.line !== null && sheet.trace === null && sheet.blocks.length > 0}
              onFollow={follow}
              onClose={place.closeLine}
              onCopyLine={() => place.line && copyLine(place.line)}
              onCopyLink={copyLink}
              contents={
                <SheetContents
                  blocks={sheet.blocks}
                  onGo={(address) => {
                    folds.reveal(address);
                    requestAnimationFrame(() => focusSection(sheetElement.current, address));
                  }}
                />
              }
            />
          </div>
        )}
      </div>
      {draft.conflict && (
        <ConflictDialog
          what={`Member ${value.mark}`}
          conflict={draft.conflict}
          rules={memberRules}
          onSettle={draft.settle}
        />
      )}
    </MemberFormContext>
  );
}

/** The combination that governed when there first was a sheet; it stays while inputs change. */
function useOpening(member: MemberRecord | null): string | undefined {
  const opening = useRef<string | undefined>(undefined);
  opening.current ??= member?.summary.governing?.combination ?? undefined;
  return opening.current;
}

/** Puts text on the clipboard; where the browser refuses, nothing is said to have been copied. */
function copy(text: string, done: () => void) {
  void navigator.clipboard?.writeText(text).then(done, () => undefined);
}
