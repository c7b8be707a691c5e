/** A line for the person at the terminal. @param {string} text */
export const say = (text) => {
  process.stdout.write(`${text}\n`);
};

/** Seconds since a moment, for a line of progress. @param {number} since milliseconds */
export const secondsSince = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`;
