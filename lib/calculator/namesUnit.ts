const exponent = /\d[\d.,]*e[+-]?\d+/gi;
const unit = /[a-zµ"'°”″]/i;

/** What was typed says its own unit, so that the usual one does not count. */
export const namesUnit = (text: string): boolean => unit.test(text.replace(exponent, "0"));
