import type { Readable, Writable } from "node:stream";

/** The three streams of a command; a terminal is known by `isTTY`. */
export interface Io {
  readonly input: Readable;
  readonly output: Writable & { readonly isTTY?: boolean };
  readonly errors: Writable & { readonly isTTY?: boolean };
}
