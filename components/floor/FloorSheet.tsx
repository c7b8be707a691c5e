"use client";
import { useSheet } from "@/lib/queries/sheets";
import { FloorFrame } from "./FloorFrame";
import { FloorRun } from "./FloorRun";

/** One released sheet at the brake. Anything else is refused here as well as by the server. */
export function FloorSheet({ id }: { readonly id: string }) {
  const { data, error } = useSheet(id);
  const back = { href: "/floor", label: "Sheets" };
  if (error) return <FloorFrame title="Setup sheet" back={back}><p role="alert" className="m-4 border-2 border-brick p-6 text-2xl text-brick-ink">{error.message}</p></FloorFrame>;
  if (!data) return <FloorFrame title="Setup sheet" back={back}><p className="p-6 text-2xl text-ink-soft">Loading…</p></FloorFrame>;
  if (data.state !== "released") {
    return (
      <FloorFrame title={data.number} back={back}>
        <p role="alert" className="m-4 border-2 border-brick p-6 text-2xl text-brick-ink">{data.state === "draft" ? "This sheet is a draft. It is not for the floor." : "This sheet is superseded. Look in the list for the one that took its place."}</p>
      </FloorFrame>
    );
  }
  return <FloorRun view={data.view} />;
}
