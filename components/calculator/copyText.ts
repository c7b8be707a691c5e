/** Puts a text on the clipboard; false where the browser refuses. Over plain HTTP only the older way is open. */
export async function copyText(text: string): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text);
    return true;
  } catch {
    return byOldWay(text);
  }
}

function byOldWay(text: string): boolean {
  const before = document.activeElement;
  const box = document.createElement("textarea");
  box.value = text;
  box.setAttribute("aria-hidden", "true");
  box.style.cssText = "position:fixed;top:0;opacity:0";
  document.body.append(box);
  box.select();
  const done = document.execCommand("copy");
  box.remove();
  if (before instanceof HTMLElement) before.focus();
  return done;
}
