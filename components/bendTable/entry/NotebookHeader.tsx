import { Save } from "lucide-react";
import Link from "next/link";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { PageHeader } from "@/components/ui/PageHeader";

interface NotebookHeaderProps {
  /** Lines with work in them. */
  readonly count: number;
  readonly busy: boolean;
  readonly onSave: () => void;
  readonly onThrowAway: () => void;
}

export function NotebookHeader({ count, busy, onSave, onThrowAway }: NotebookHeaderProps) {
  return (
    <PageHeader kicker="Bend table" title="Enter trials" summary="One line for each bent strip, as in the shop's notebook. What comes of it stands at the right as you type."
      actions={<>
        <Link href="/bend-table/import" className={buttonClasses("plain")}>From a file</Link>
        {count === 0 ? null : <Button look="plain" onClick={onThrowAway}>Throw the page away</Button>}
        <Button icon={<Save aria-hidden />} busy={busy} onClick={onSave}>{count === 0 ? "Save" : count === 1 ? "Save 1 trial" : `Save ${count} trials`}</Button>
      </>} />
  );
}
