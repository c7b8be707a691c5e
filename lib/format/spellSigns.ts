const vulgar: Readonly<Record<string, string>> = { "½": "1/2", "¼": "1/4", "¾": "3/4", "⅛": "1/8", "⅜": "3/8", "⅝": "5/8", "⅞": "7/8", "⅓": "1/3", "⅔": "2/3" };

/** What was typed with printed signs (½, −) in the signs of a keyboard: `3½` becomes `3 1/2`. */
export const spellSigns = (text: string): string =>
  text.replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/g, (sign) => ` ${vulgar[sign] ?? ""}`).replace(/[−–]/g, "-").trim();
