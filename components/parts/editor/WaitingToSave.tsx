import { Notice } from "@/components/ui/Notice";

/** Said while a save waits for the network. */
export function WaitingToSave() {
  return (
    <Notice tone="caution" title="No connection: saving as soon as it is back" live>
      <p>What you entered is kept in this browser as well; it is still here when this page is closed and opened again.</p>
    </Notice>
  );
}
