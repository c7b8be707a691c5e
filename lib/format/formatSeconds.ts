/** A duration as m:ss, or h:mm:ss from an hour on. */
export function formatSeconds(seconds: number): string {
  const all = Math.max(0, Math.round(seconds));
  const s = String(all % 60).padStart(2, "0");
  const minutes = Math.floor(all / 60);
  if (minutes < 60) return `${minutes}:${s}`;
  return `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, "0")}:${s}`;
}
