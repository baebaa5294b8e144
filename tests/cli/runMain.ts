import { PassThrough, Readable } from "node:stream";
import { main } from "../../src/cli/main.ts";

export interface MainRun {
  readonly code: number;
  readonly output: string;
  readonly errors: string;
}

/** Runs one command line inside this process, with standard input as given in parts. */
export async function runMain(
  args: readonly string[],
  input: readonly (string | Uint8Array)[] = [],
): Promise<MainRun> {
  const output = new PassThrough();
  const errors = new PassThrough();
  const texts = { output: "", errors: "" };
  output.setEncoding("utf8").on("data", (text: string) => {
    texts.output += text;
  });
  errors.setEncoding("utf8").on("data", (text: string) => {
    texts.errors += text;
  });
  const code = await main(args, { input: Readable.from(input), output, errors });
  // What was written last is handed on in a later turn.
  await new Promise((resolve) => setImmediate(resolve));
  return { code, ...texts };
}
