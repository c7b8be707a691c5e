interface ProgressBarProps {
  readonly label: string;
  /** 0..1, or null while unknown. */
  readonly value: number | null;
}

export function ProgressBar({ label, value }: ProgressBarProps) {
  const percent = value === null ? null : Math.round(Math.min(1, Math.max(0, value)) * 100);
  return (
    <div role="progressbar" aria-label={label} aria-valuemin={0} aria-valuemax={100} {...(percent === null ? {} : { "aria-valuenow": percent })}
      className="h-2.5 w-full overflow-hidden border border-rule-strong bg-sheet">
      <div className={percent === null ? "h-full w-1/3 animate-pulse bg-accent" : "h-full bg-accent transition-[width]"}
        style={percent === null ? undefined : { width: `${percent}%` }} />
    </div>
  );
}
