import { memo, useEffect, useLayoutEffect, useRef } from 'react';
import { showFormula, watchFormula } from './formula-queue.ts';

/** A formula for the eye; whoever uses it puts its text beside it for those who listen. */
export const Formula = memo(function Formula({
  tex,
  className,
}: {
  tex: string;
  className?: string;
}) {
  const element = useRef<HTMLSpanElement>(null);
  useLayoutEffect(() => {
    if (element.current) showFormula(element.current, tex);
  }, [tex]);
  useEffect(() => (element.current ? watchFormula(element.current) : undefined), []);
  return <span ref={element} aria-hidden="true" {...(className ? { className } : {})} />;
});
