import type { Io } from "./Io.ts";

/** Compounds or files below which no progress is shown. */
const WORTH_SHOWING = 40;

/** Progress on the error stream's last line while it is a terminal; silent when piped. */
export function progress(io: Io): (stage: string, done: number, total: number) => void {
  if (io.errors.isTTY !== true) return () => {};
  return (stage, done, total) => {
    if (total < WORTH_SHOWING || (done % 10 !== 0 && done !== total)) return;
    io.errors.write(`\r${stage} ${done} of ${total}${done === total ? "\n" : ""}`);
  };
}
