import { type ReactNode, useId, useLayoutEffect, useRef } from 'react';
import { classNames } from './class-names.ts';

/**
 * A question that has to be answered before going on: the browser's own modal dialog, which keeps
 * the focus inside and gives it back. Escape closes it unless `onClose` is left out.
 */
export function Dialog(props: {
  title: string;
  onClose?: () => void;
  wide?: boolean;
  children: ReactNode;
  footer?: ReactNode;
}) {
  const ref = useRef<HTMLDialogElement>(null);
  const title = useId();
  // Closed before it leaves the page, so that the focus goes back to where it was.
  useLayoutEffect(() => {
    const dialog = ref.current;
    if (dialog && !dialog.open) dialog.showModal();
    return () => dialog?.close();
  }, []);
  return (
    <dialog
      ref={ref}
      aria-labelledby={title}
      onCancel={(event) => {
        event.preventDefault();
        props.onClose?.();
      }}
      className={classNames(
        'max-h-[88vh] overflow-auto rounded-field border border-ink bg-paper shadow-sheet',
        props.wide ? 'w-[min(1080px,94vw)]' : 'w-[min(520px,94vw)]',
      )}
    >
      <div className="px-6 pt-5 pb-6">
        <h2
          id={title}
          className="mb-4 border-b-2 border-ink pb-2 font-serif text-title font-semibold"
        >
          {props.title}
        </h2>
        {props.children}
        {props.footer && (
          <div className="mt-6 flex flex-wrap justify-end gap-2">{props.footer}</div>
        )}
      </div>
    </dialog>
  );
}
