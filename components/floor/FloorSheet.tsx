"use client";
import { useState } from "react";
import { useWatchedSheet } from "@/lib/queries/sheets";
import { FloorFrame } from "./FloorFrame";
import { FloorRun } from "./FloorRun";

const back = { href: "/floor", label: "Sheets" };

/**
 * One released sheet at the brake. Anything else is refused here as well as by the server. A sheet that was
 * opened stays in sight when the network drops, and says so when it is superseded meanwhile.
 */
export function FloorSheet({ id }: { readonly id: string }) {
  const { data, error } = useWatchedSheet(id);
  const [opened, setOpened] = useState(false);
  if (data?.state === "released" && !opened) setOpened(true);
  if (!data) return error ? <Refusal title="Setup sheet" text={error.message} /> : <FloorFrame title="Setup sheet" back={back}><p className="p-6 text-2xl text-ink-soft">Loading…</p></FloorFrame>;
  if (data.state === "draft") return <Refusal title={data.number} text="This sheet is a draft. It is not for the floor." />;
  if (data.state === "superseded" && !opened) return <Refusal title={data.number} text="This sheet is superseded. Look in the list for the one that took its place." />;
  return <FloorRun view={data.view} superseded={data.state === "superseded"} flatChange={data.flatChange} />;
}

function Refusal({ title, text }: { readonly title: string; readonly text: string }) {
  return <FloorFrame title={title} back={back}><main id="content"><p role="alert" className="m-4 border-2 border-brick p-6 text-2xl text-brick-ink">{text}</p></main></FloorFrame>;
}
