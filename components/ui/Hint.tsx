"use client";
import { Tooltip } from "radix-ui";
import type { ReactNode } from "react";

/** A tooltip on hover and focus; the child must take a ref (a plain element does). */
export function Hint({ text, children }: { readonly text: ReactNode; readonly children: ReactNode }) {
  return (
    <Tooltip.Root>
      <Tooltip.Trigger asChild>{children}</Tooltip.Trigger>
      <Tooltip.Portal>
        <Tooltip.Content sideOffset={6} collisionPadding={8} className="z-50 max-w-xs rounded bg-ink px-2.5 py-1.5 text-sm text-paper">
          {text}
          <Tooltip.Arrow className="fill-ink" />
        </Tooltip.Content>
      </Tooltip.Portal>
    </Tooltip.Root>
  );
}
