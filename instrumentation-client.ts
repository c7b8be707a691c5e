import { z } from "zod";

/** Zod would try to compile code from text, which the content security policy refuses: it is told not to try. */
z.config({ jitless: true });
