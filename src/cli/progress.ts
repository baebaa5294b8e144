import type { Io } from "./Io.ts";

/** Compounds below which no progress is shown. */
const WORTH_SHOWING = 40;

/** Progress on the error stream's last line while it is a terminal; silent when piped. */
export function progress(io: Io): (done: number, total: number) => void {
  if (io.errors.isTTY !== true) return () => {};
  return (done, total) => {
    if (total < WORTH_SHOWING || (done % 10 !== 0 && done !== total)) return;
    io.errors.write(`\ranalysed ${done} of ${total}${done === total ? "\n" : ""}`);
  };
}
