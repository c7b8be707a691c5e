/** The last lines of a program's output, which tell why it failed. @param {string} text */
export const tail = (text, lines = 60) => text.trimEnd().split("\n").slice(-lines).join("\n");
