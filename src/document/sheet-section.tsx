import { type ReactNode, useLayoutEffect, useRef } from 'react';
import { classNames } from '#client/ui/class-names.ts';
import type { BlockOf } from '#shared/report/tree.ts';
import { useDocument } from './document-context.ts';
import { Inlines } from './inlines.tsx';

/** A section of a sheet: its head, which folds it where the sheet lets it, and what it holds. */
export function SheetSectionView(props: { head: BlockOf<'lineSection'>; children: ReactNode }) {
  const { head, children } = props;
  const { folds } = useDocument();
  const folded = folds?.isFolded(head) ?? false;
  return (
    <div
      data-group={head.address}
      className={classNames(`section-group level-${head.level}`, folded && 'is-folded')}
    >
      <SectionHead head={head} folded={folded} />
      <SectionBody
        id={bodyId(head)}
        folded={folded}
        onFound={() => folds?.fold(head.address, false)}
      >
        {children}
      </SectionBody>
    </div>
  );
}

const bodyId = ({ address }: BlockOf<'lineSection'>): string => `body-${address}`;
const HEADINGS = { 1: 'h3', 2: 'h4', 3: 'h5' } as const;

function SectionHead(props: { head: BlockOf<'lineSection'>; folded: boolean }) {
  const { head, folded } = props;
  const { address, title } = head;
  const { folds, current, onCurrent } = useDocument();
  const Heading = HEADINGS[head.level];
  return (
    <div className="sheet-section" id={`section-${address}`}>
      <span className="section-reference">{head.reference}</span>
      <Heading>
        {folds ? (
          <button
            type="button"
            className="section-fold"
            data-section={address}
            aria-expanded={!folded}
            aria-controls={bodyId(head)}
            tabIndex={current === address ? 0 : -1}
            onFocus={() => onCurrent?.(address)}
            onClick={() => folds.fold(address, !folded)}
          >
            <svg viewBox="0 0 8 8" aria-hidden="true">
              <path d="M1.5 2.5 4 5.5 6.5 2.5" fill="none" stroke="currentColor" />
            </svg>
            {title}
          </button>
        ) : (
          title
        )}
      </Heading>
      {folded && head.outcome && (
        <p className={classNames('section-outcome', head.outcome.over && 'text-oxide')}>
          <Inlines runs={head.outcome.content} />
        </p>
      )}
    </div>
  );
}

/** What is folded is not seen, but the browser's search finds it and printing shows it. */
function SectionBody(props: {
  id: string;
  folded: boolean;
  onFound: () => void;
  children: ReactNode;
}) {
  const { id, folded, onFound, children } = props;
  const element = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    if (folded) element.current?.setAttribute('hidden', 'until-found');
    else element.current?.removeAttribute('hidden');
  }, [folded]);
  useLayoutEffect(() => {
    const body = element.current;
    body?.addEventListener('beforematch', onFound);
    return () => body?.removeEventListener('beforematch', onFound);
  }, [onFound]);
  return (
    <div ref={element} id={id} className="section-body" data-folded={folded || undefined}>
      {children}
    </div>
  );
}
