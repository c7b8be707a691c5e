import { runWholePart } from "../report/wholePart.mjs";

export const lint = () => runWholePart("eslint", "eslint/bin/eslint.js", [".", "--max-warnings", "0"]);
