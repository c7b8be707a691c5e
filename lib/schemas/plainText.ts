import { z } from "zod";

/** Signs that no name or note needs and a database may refuse: controls but tab and line break, and half characters. */
const unstorable = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]|\p{Cs}/u;

/** Text that a person typed; markup in it is text like any other. */
export const plainText = (most: number) =>
  z.string().trim()
    .max(most, `must be at most ${most} characters`)
    .refine((text) => !unstorable.test(text), "must not contain control characters");

/** The same, and something must be in it. */
export const filledText = (most: number) => plainText(most).min(1, "must not be empty");
