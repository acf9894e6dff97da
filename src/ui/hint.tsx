import { Tooltip } from 'radix-ui';
import type { ReactElement, ReactNode } from 'react';

/** Explains a control on hover and on focus. */
export function Hint({ text, children }: { text: ReactNode; children: ReactElement }) {
  return (
    <Tooltip.Root>
      <Tooltip.Trigger asChild>{children}</Tooltip.Trigger>
      <Tooltip.Portal>
        <Tooltip.Content
          side="top"
          sideOffset={5}
          collisionPadding={8}
          className="z-50 max-w-72 rounded-field bg-ink px-2.5 py-1.5 text-small text-paper"
        >
          {text}
        </Tooltip.Content>
      </Tooltip.Portal>
    </Tooltip.Root>
  );
}
