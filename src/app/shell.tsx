import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';
import { classNames } from '#client/ui/class-names.ts';
import { type Crumb, type Tab, TopBar } from './top-bar.tsx';

/**
 * The frame of every page for signed-in people: skip link, top bar, main. A new page takes the
 * focus to its main part, so that the keyboard and a screen reader arrive where the eye does.
 */
export function Shell(props: {
  title: string;
  crumbs: readonly Crumb[];
  tabs?: readonly Tab[] | undefined;
  status?: ReactNode;
  /** `desk`: paper on the bench; `bare`: the page lays itself out from edge to edge. */
  layout?: 'desk' | 'bare';
  children: ReactNode;
}) {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  useEffect(() => {
    document.title = `${props.title} · Stanchion`;
  }, [props.title]);
  // biome-ignore lint/correctness/useExhaustiveDependencies: runs when the page changes.
  useEffect(() => {
    const focused = document.activeElement;
    if (!focused || focused === document.body) main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return (
    <div className="flex min-h-screen flex-col">
      <a
        href="#main"
        data-screen-only
        className="fixed top-1 left-1 z-50 -translate-y-20 bg-paper px-3 py-2 font-medium focus:translate-y-0"
      >
        Skip to the page
      </a>
      <TopBar crumbs={props.crumbs} tabs={props.tabs} status={props.status} />
      <main
        id="main"
        ref={main}
        tabIndex={-1}
        data-print-plain
        className={classNames('flex-1 outline-none', props.layout !== 'bare' && 'px-6 py-9')}
      >
        {props.children}
      </main>
    </div>
  );
}
