import localFont from "next/font/local";

/** Latin first; the extended files join in only for the letters that they hold. */
export const barlow = localFont({
  variable: "--font-barlow",
  display: "swap",
  src: [
    { path: "../public/fonts/barlow-latin-400-normal.woff2", weight: "400" },
    { path: "../public/fonts/barlow-latin-500-normal.woff2", weight: "500" },
    { path: "../public/fonts/barlow-latin-600-normal.woff2", weight: "600" },
    { path: "../public/fonts/barlow-latin-700-normal.woff2", weight: "700" },
  ],
});

export const barlowExt = localFont({
  variable: "--font-barlow-ext",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB, U+2C60-2C7F" }],
  src: [
    { path: "../public/fonts/barlow-latin-ext-400-normal.woff2", weight: "400" },
    { path: "../public/fonts/barlow-latin-ext-500-normal.woff2", weight: "500" },
    { path: "../public/fonts/barlow-latin-ext-600-normal.woff2", weight: "600" },
    { path: "../public/fonts/barlow-latin-ext-700-normal.woff2", weight: "700" },
  ],
});

export const plexMono = localFont({
  variable: "--font-plex-mono",
  display: "swap",
  adjustFontFallback: false,
  src: [
    { path: "../public/fonts/ibm-plex-mono-latin-400-normal.woff2", weight: "400" },
    { path: "../public/fonts/ibm-plex-mono-latin-500-normal.woff2", weight: "500" },
    { path: "../public/fonts/ibm-plex-mono-latin-600-normal.woff2", weight: "600" },
  ],
});

export const plexMonoExt = localFont({
  variable: "--font-plex-mono-ext",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB, U+2C60-2C7F" }],
  src: [
    { path: "../public/fonts/ibm-plex-mono-latin-ext-400-normal.woff2", weight: "400" },
    { path: "../public/fonts/ibm-plex-mono-latin-ext-500-normal.woff2", weight: "500" },
    { path: "../public/fonts/ibm-plex-mono-latin-ext-600-normal.woff2", weight: "600" },
  ],
});
