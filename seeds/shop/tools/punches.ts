import { deg, mm, toRad } from "@/bending/core/units";
import { relievedPunchProfile } from "@/bending/tooling/relievedPunchProfile";
import { straightPunchProfile } from "@/bending/tooling/straightPunchProfile";
import type { PunchEntry } from "@/bending/tooling/toolingDocument";
import { drawer } from "./drawer";
import { roundedProfile } from "./roundedProfile";
import type { SectionSet } from "./sectionSets";
import { sectionsOf } from "./sectionsOf";

type Build = "straight" | "relieved" | "deep relieved" | "sash";

/** Build, tip angle in degrees, tip radius, height, rating in kN/m, pieces. */
const rows: readonly (readonly [Build, number, number, number, number, SectionSet])[] = [
  ["straight", 88, 0.6, 120, 900, "pair"],
  ["straight", 88, 0.8, 90, 1000, "split"],
  ["straight", 88, 0.8, 120, 1000, "bed"],
  ["straight", 88, 0.8, 150, 1000, "bed"],
  ["straight", 88, 1, 120, 1000, "long"],
  ["straight", 88, 1, 200, 900, "pair"],
  ["straight", 88, 1.5, 120, 1000, "long"],
  ["straight", 88, 2, 120, 1000, "long"],
  ["straight", 88, 3, 120, 1200, "long"],
  ["straight", 85, 0.6, 120, 900, "pair"],
  ["straight", 85, 0.8, 150, 900, "split"],
  ["straight", 85, 1, 120, 900, "pair"],
  ["straight", 85, 3, 120, 1000, "pair"],
  ["straight", 60, 0.8, 120, 800, "short"],
  ["straight", 60, 1.5, 120, 800, "pair"],
  ["straight", 30, 0.6, 120, 500, "short"],
  ["straight", 30, 0.8, 150, 600, "split"],
  ["straight", 30, 1, 120, 600, "pair"],
  ["relieved", 88, 0.6, 120, 450, "split"],
  ["relieved", 88, 0.8, 150, 500, "bed"],
  ["relieved", 88, 1, 150, 500, "pair"],
  ["relieved", 85, 0.8, 150, 450, "short"],
  ["relieved", 85, 1, 120, 450, "pair"],
  ["relieved", 30, 0.8, 150, 300, "short"],
  ["deep relieved", 88, 0.6, 200, 250, "short"],
  ["deep relieved", 88, 0.8, 200, 300, "split"],
  ["deep relieved", 85, 0.8, 200, 300, "short"],
  ["sash", 88, 0.8, 150, 350, "short"],
  ["sash", 85, 0.6, 150, 300, "short"],
  ["straight", 26, 0.6, 120, 600, "short"],
];

const letters: Readonly<Record<Build, string>> = { straight: "P", relieved: "PR", "deep relieved": "PD", sash: "PS" };

/** How far behind the tip the cut-away side stands, how high it goes, and how thick the neck beside it is. */
const reliefs = {
  relieved: { reliefDepth: 6, reliefHeight: 62, neckWidth: 14 },
  "deep relieved": { reliefDepth: 18, reliefHeight: 120, neckWidth: 18 },
  sash: { reliefDepth: 2, reliefHeight: 90, neckWidth: 8 },
} as const;

function profileOf(build: Build, angle: number, radius: number, height: number) {
  const common = { tipAngle: toRad(deg(angle)), tipRadius: mm(radius), height: mm(height), bodyWidth: mm(radius >= 3 ? 30 : 24) };
  if (build === "straight") return straightPunchProfile(common);
  const { reliefDepth, reliefHeight, neckWidth } = reliefs[build];
  return relievedPunchProfile({ ...common, reliefDepth: mm(reliefDepth), reliefHeight: mm(reliefHeight), neckWidth: mm(neckWidth), noseWidth: mm(7) });
}

export const punches: readonly PunchEntry[] = rows.map(([build, tipAngle, tipRadius, height, maxForcePerMetre, set], index) => {
  const id = `${letters[build]}${tipAngle}-R${tipRadius}-H${height}`;
  return {
    id, kind: "punch", tipAngle, tipRadius, height, maxForcePerMetre,
    name: `${build[0]?.toUpperCase()}${build.slice(1)} punch ${tipAngle}°, tip radius ${tipRadius}`,
    tang: "20 mm",
    profile: roundedProfile(profileOf(build, tipAngle, tipRadius, height)),
    sections: sectionsOf(id, set, drawer("A", index)),
  };
});
