"use client";
import { X } from "lucide-react";
import { Dialog } from "radix-ui";
import { useRef, type ReactNode } from "react";

interface DialogBoxProps {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly title: string;
  readonly description?: ReactNode;
  readonly children: ReactNode;
  /** The buttons, at the foot. */
  readonly actions?: ReactNode;
  readonly wide?: boolean;
}

/** Whatever opened it has the focus again when it closes. */
export function DialogBox({ open, onOpenChange, title, description, children, actions, wide = false }: DialogBoxProps) {
  const opener = useRef<Element | null>(null);
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-ink/45" />
        <Dialog.Content {...(description === undefined ? { "aria-describedby": undefined } : {})}
          onOpenAutoFocus={() => { opener.current = document.activeElement; }}
          onCloseAutoFocus={(event) => { event.preventDefault(); if (opener.current instanceof HTMLElement) opener.current.focus(); }}
          className={`fixed top-1/2 left-1/2 z-40 flex max-h-[calc(100dvh-2rem)] w-[calc(100vw-2rem)] ${wide ? "max-w-3xl" : "max-w-lg"} -translate-x-1/2 -translate-y-1/2 flex-col border border-ink bg-paper outline-offset-0`}>
          <header className="flex items-start justify-between gap-4 border-b border-ink px-5 py-3">
            <Dialog.Title className="text-lg font-semibold">{title}</Dialog.Title>
            <Dialog.Close aria-label="Close" className="-mr-2 p-2 text-ink-soft hover:text-ink"><X aria-hidden className="size-5" /></Dialog.Close>
          </header>
          <div className="grow overflow-y-auto px-5 py-4">
            {description === undefined ? null : <Dialog.Description className="mb-4 text-ink-soft">{description}</Dialog.Description>}
            {children}
          </div>
          {actions === undefined ? null : <footer className="flex flex-wrap justify-end gap-2 border-t border-rule px-5 py-3">{actions}</footer>}
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
