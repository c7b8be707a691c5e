/** Colours of things in 3D: steel for tools, the two sides of the sheet told apart by tone (and by letter). */
export const stageColours = {
  light: { ground: "#f7f4ec", sideA: "#b9c9c6", sideB: "#8fa39f", edge: "#17766c", line: "#0f5f56", punch: "#a9b3bc", die: "#9aa5af", ram: "#aeb7bf", toolLine: "#363e47", finger: "#d9a24a", cut: "#17766c", letter: "#20242a", mark: "#b23a2a" },
  dark: { ground: "#14181c", sideA: "#dfe9e6", sideB: "#9fb5b0", edge: "#56c9b8", line: "#7fdccd", punch: "#8d98a3", die: "#7a858f", ram: "#55616d", toolLine: "#0d1013", finger: "#e8b04a", cut: "#56c9b8", letter: "#14181c", mark: "#f58a7b" },
} as const;

export type StageTheme = keyof typeof stageColours;
