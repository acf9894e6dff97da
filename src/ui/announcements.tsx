import {
  createContext,
  type ReactNode,
  useCallback,
  useContext,
  useMemo,
  useRef,
  useState,
} from 'react';
import { Button } from './button.tsx';

interface Announcement {
  readonly text: string;
  /** A way back, such as restoring what was deleted. */
  readonly action?: { readonly label: string; readonly run: () => void };
}

type Announce = (announcement: Announcement | string) => void;

const AnnounceContext = createContext<Announce>(() => {});

/** Says in one line what happened, to eyes and to screen readers. */
export const useAnnounce = (): Announce => useContext(AnnounceContext);

const SHOWN_FOR = 9_000;

export function AnnouncementsProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<Announcement | null>(null);
  const timer = useRef<number>(undefined);
  const close = useCallback(() => setShown(null), []);
  const announce = useCallback<Announce>(
    (announcement) => {
      setShown(typeof announcement === 'string' ? { text: announcement } : announcement);
      window.clearTimeout(timer.current);
      timer.current = window.setTimeout(close, SHOWN_FOR);
    },
    [close],
  );
  const action = useMemo(() => shown?.action, [shown]);
  return (
    <AnnounceContext value={announce}>
      {children}
      <div
        data-screen-only
        className="on-ink pointer-events-none fixed inset-x-0 bottom-5 z-40 flex justify-center"
      >
        <div role="status" className="pointer-events-auto">
          {shown && (
            <div className="flex items-center gap-4 rounded-field bg-ink py-1.5 pr-1.5 pl-4 text-paper shadow-sheet">
              <span>{shown.text}</span>
              {action && (
                <Button
                  size="small"
                  onClick={() => {
                    close();
                    action.run();
                  }}
                >
                  {action.label}
                </Button>
              )}
              <button type="button" onClick={close} className="px-2 text-zinc-3 hover:text-paper">
                Close
              </button>
            </div>
          )}
        </div>
      </div>
    </AnnounceContext>
  );
}
