"use client";
import { CircleAlert, CircleCheck, Info, X } from "lucide-react";
import { Toast } from "radix-ui";
import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from "react";
import { classes } from "./classes";

export type ToastTone = "good" | "note" | "wrong";
interface ToastEntry { readonly id: number; readonly tone: ToastTone; readonly title: string; readonly text: string | undefined }
type ShowToast = (tone: ToastTone, title: string, text?: string) => void;

const ToastContext = createContext<ShowToast>(() => undefined);

const looks = {
  good: { icon: CircleCheck, edge: "border-l-accent", ink: "text-accent-ink" },
  note: { icon: Info, edge: "border-l-steel-500", ink: "text-ink-soft" },
  wrong: { icon: CircleAlert, edge: "border-l-brick", ink: "text-brick-ink" },
} as const;

/** `const toast = useToast(); toast("good", "Saved", "Revision 3")`. */
export const useToast = (): ShowToast => useContext(ToastContext);

export function ToastProvider({ children }: { readonly children: ReactNode }) {
  const [entries, setEntries] = useState<readonly ToastEntry[]>([]);
  const show = useCallback<ShowToast>((tone, title, text) => {
    setEntries((old) => [...old.slice(-3), { id: (old.at(-1)?.id ?? 0) + 1, tone, title, text }]);
  }, []);
  const remove = (id: number) => setEntries((old) => old.filter((entry) => entry.id !== id));
  const value = useMemo(() => show, [show]);
  return (
    <Toast.Provider swipeDirection="right" duration={7000}>
      <ToastContext.Provider value={value}>{children}</ToastContext.Provider>
      {entries.map((entry) => {
        const look = looks[entry.tone];
        return (
          <Toast.Root key={entry.id} onOpenChange={(open) => { if (!open) remove(entry.id); }} duration={entry.tone === "wrong" ? 15_000 : 7000}
            className={classes("flex items-start gap-3 border border-l-4 border-rule-strong bg-sheet p-3 shadow-[0_2px_0_var(--rule)]", look.edge)}>
            <look.icon aria-hidden className={classes("mt-0.5 size-5 shrink-0", look.ink)} />
            <div className="min-w-0 grow">
              <Toast.Title className="font-semibold">{entry.title}</Toast.Title>
              {entry.text === undefined ? null : <Toast.Description className="text-ink-soft break-words">{entry.text}</Toast.Description>}
            </div>
            <Toast.Close aria-label="Close message" className="p-0.5 text-ink-soft hover:text-ink"><X aria-hidden className="size-4" /></Toast.Close>
          </Toast.Root>
        );
      })}
      <Toast.Viewport className="fixed right-4 bottom-4 z-50 flex w-96 max-w-[calc(100vw-2rem)] flex-col gap-2 print:hidden" />
    </Toast.Provider>
  );
}
