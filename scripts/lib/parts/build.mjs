import { ensureBuild } from "../build/ensureBuild.mjs";
import { wholePart } from "../report/wholePart.mjs";

/** A production build of the sources as they are. */
export const build = async () => wholePart("next build", await ensureBuild({ quiet: true }));
