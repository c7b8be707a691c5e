/** A thread that takes memory until it is stopped. */
const taken: number[][] = [];
for (;;) taken.push(Array.from({ length: 100_000 }, (_, i) => i + taken.length));
