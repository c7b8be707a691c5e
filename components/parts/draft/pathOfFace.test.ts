import { describe, expect, it } from "vitest";
import { fieldId } from "../editor/fieldId";
import { newBend, newFlange, newLeg } from "./newRows";
import { faceOfField, pathOfBend, pathOfFace } from "./pathOfFace";
import { startDraft } from "./startDraft";

const profile = { ...startDraft("S235"), shape: "profile" as const, legs: [newLeg("20"), newLeg("40", newBend()), newLeg("20")] };
const tray = { ...startDraft("S235"), shape: "base" as const, flanges: [newFlange("front", "base", 0, "30"), newFlange("ear", "front", 2, "12")] };

describe("a face picked in a drawing", () => {
  it("leads to the field of its length, and the field back to the face", () => {
    for (const [draft, faces] of [[profile, ["base", "b1", "b2"]], [tray, ["base", "front", "ear"]]] as const) {
      for (const face of faces) {
        const path = pathOfFace(draft, face);
        expect(path).not.toBeNull();
        expect(faceOfField(draft, fieldId(path ?? ""))).toBe(face);
      }
    }
  });

  it("leads by its bend to the angle", () => {
    expect(pathOfBend(profile, "b2")).toBe("profile.bends[1].angle");
    expect(pathOfBend(tray, "ear")).toBe("flanges[1].angle");
    expect(faceOfField(tray, fieldId("flanges[1].angle"))).toBe("ear");
  });

  it("is none for fields of the whole part and for faces that are gone", () => {
    expect(faceOfField(tray, fieldId("thickness"))).toBeNull();
    expect(faceOfField(tray, fieldId("flanges[7].length"))).toBeNull();
    expect(pathOfFace(tray, "gone")).toBeNull();
  });
});
