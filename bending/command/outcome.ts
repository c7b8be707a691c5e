import type { Result } from "../core/result";
import type { RecognisedPart } from "../exchange/step/recognisedPart";

/** What a run of the command line prints and returns: 0 done, 2 wrong input, 3 no plan, 4 gave up within the time limit. */
export interface CommandOutcome {
  readonly exitCode: 0 | 2 | 3 | 4;
  /** For standard output. */
  readonly json: unknown;
  /** One line for standard error. */
  readonly error: string | null;
  /** A file to write; when that fails the run fails. */
  readonly file?: { readonly path: string; readonly content: string | Uint8Array };
}

/** The only things of the outside world that the command line touches. */
export interface CommandWorld {
  readonly readText: (path: string) => Result<string, string>;
  readonly readBytes: (path: string) => Result<Uint8Array, string>;
  /** The part recognised in a solid's file, read beforehand: reading takes a geometry kernel, which is loaded only when one is named. */
  readonly readSolid?: (path: string) => Result<RecognisedPart, string>;
  /** Milliseconds of a clock. */
  readonly now: () => number;
}

export const wrongInput = (message: string): CommandOutcome => ({ exitCode: 2, json: null, error: message.replace(/\s*\n\s*/g, " ") });
