"use client";
import { useEffect, useState } from "react";
import { Button } from "@/components/ui/Button";
import { ProgressBar } from "@/components/ui/ProgressBar";

/** The file on its way: how long it has taken, and a way to stop it. */
export function ReadingFile({ file, onStop }: { readonly file: File; readonly onStop: () => void }) {
  const [seconds, setSeconds] = useState(0);
  useEffect(() => {
    const timer = setInterval(() => setSeconds((value) => value + 1), 1000);
    return () => clearInterval(timer);
  }, []);
  return (
    <div className="space-y-3 border border-rule-strong bg-sheet p-6">
      <p role="status" className="font-medium break-words">Reading {file.name}</p>
      <ProgressBar label="Reading the file" value={null} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="text-sm text-ink-soft"><span className="num">{(file.size / 1e6).toFixed(1)} MB, {seconds} s</span>. A single part takes a few seconds; after 90 seconds it is given up.</p>
        <Button look="danger" onClick={onStop}>Stop reading</Button>
      </div>
    </div>
  );
}
