import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { beginHistory, changeHistory, redoHistory, undoHistory, type DraftHistory } from "./draftHistory";

const typed = (texts: readonly string[], gap: number) =>
  texts.reduce((history, text, i) => changeHistory(history, text, 10_000 + i * gap, "width"), beginHistory(""));
const times = <T>(count: number, step: (history: DraftHistory<T>) => DraftHistory<T>, from: DraftHistory<T>) =>
  Array.from({ length: count }).reduce<DraftHistory<T>>((history) => step(history), from);

describe("undo and redo", () => {
  it("give back every state, however many", () => {
    fc.assert(fc.property(fc.array(fc.string(), { minLength: 1, maxLength: 300 }), fc.nat(), (texts, wish) => {
      const all = typed(texts, 5000);
      const back = wish % (texts.length + 1);
      const gone = times(back, undoHistory, all);
      expect(gone.draft).toBe(["", ...texts][texts.length - back]);
      expect(times(back, redoHistory, gone).draft).toBe(texts.at(-1));
      expect(times(texts.length + 5, undoHistory, all).draft).toBe("");
    }));
  });

  it("take a number that was typed in one go back as one change", () => {
    expect(undoHistory(typed(["1", "12", "120"], 100)).draft).toBe("");
    expect(undoHistory(typed(["1", "12", "120"], 900)).draft).toBe("12");
  });

  it("keep an act apart from what was typed just before it, and two fields apart from one another", () => {
    expect(undoHistory(changeHistory(typed(["5"], 100), "7", 10_050, null)).draft).toBe("5");
    expect(undoHistory(changeHistory(typed(["5"], 100), "5 3", 10_050, "depth")).draft).toBe("5");
  });

  it("bring nothing back after a new change", () => {
    const changed = changeHistory(undoHistory(typed(["a", "b"], 5000)), "c", 99_000, "width");
    expect(redoHistory(changed).draft).toBe("c");
    expect(undoHistory(changed).draft).toBe("a");
  });
});
