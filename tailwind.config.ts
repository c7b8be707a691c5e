import type { Config } from "tailwindcss";

/** Colours are variables so that one attribute (`data-theme="floor"`) turns the whole house dark; values in app/globals.css. */
const config: Config = {
  content: [],
  theme: {
    extend: {
      colors: {
        paper: "var(--paper)",
        sheet: "var(--sheet)",
        wash: "var(--wash)",
        ink: { DEFAULT: "var(--ink)", soft: "var(--ink-soft)", faint: "var(--ink-faint)" },
        rule: { DEFAULT: "var(--rule)", strong: "var(--rule-strong)" },
        accent: { DEFAULT: "var(--accent)", ink: "var(--accent-ink)", wash: "var(--accent-wash)", on: "var(--accent-on)" },
        amber: { DEFAULT: "var(--amber)", ink: "var(--amber-ink)", wash: "var(--amber-wash)" },
        brick: { DEFAULT: "var(--brick)", ink: "var(--brick-ink)", wash: "var(--brick-wash)", on: "var(--brick-on)" },
        steel: {
          100: "var(--steel-100)",
          200: "var(--steel-200)",
          300: "var(--steel-300)",
          400: "var(--steel-400)",
          500: "var(--steel-500)",
          600: "var(--steel-600)",
          700: "var(--steel-700)",
        },
      },
      fontFamily: {
        sans: ["var(--font-barlow-ext)", "var(--font-barlow)", "system-ui", "sans-serif"],
        mono: ["var(--font-plex-mono-ext)", "var(--font-plex-mono)", "ui-monospace", "monospace"],
      },
      borderRadius: { sm: "1px", DEFAULT: "2px", md: "2px", lg: "3px" },
    },
  },
};
export default config;
