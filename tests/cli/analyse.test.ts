import { PassThrough, Readable, Writable } from "node:stream";
import { describe, expect, test } from "vitest";
import { main } from "../../src/cli/main.ts";
import { runMain } from "./runMain.ts";

const answers = (output: string) =>
  output
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line) as { id: unknown; ok: boolean; error?: { code: string } });

describe("ringfolio analyse", () => {
  test("answers line for line in order, whatever is wrong with a line", async () => {
    const input = [
      '{"id":"α−1","smiles":"CC1CCCCC1"}\r\n',
      "\n",
      "nonsense\n",
      '{"id":"c","smi',
      'les":"C1CCCCC1"}\n',
      `{"id":"d","smiles":"${"C".repeat(200_000)}"}\n`,
      '{"id":"\u2028e","smiles":"OC1CCCCC1"}',
    ];
    const { code, output, errors } = await runMain(["analyse"], input);
    expect(code).toBe(0);
    expect(errors).toBe("");
    const found = answers(output);
    expect(found.map(({ id }) => id)).toEqual(["α−1", null, null, "c", null, "\u2028e"]);
    expect(found.map(({ ok }) => ok)).toEqual([true, false, false, true, false, true]);
    expect(found.filter(({ ok }) => !ok).map(({ error }) => error?.code)).toEqual([
      "invalid-json",
      "invalid-json",
      "invalid-line",
    ]);
  });

  test("waits for a slow reader instead of filling the memory", async () => {
    const written: string[] = [];
    const slow = new Writable({
      highWaterMark: 1,
      write: (chunk: Buffer, _encoding, done) => {
        written.push(chunk.toString("utf8"));
        setTimeout(done, 1);
      },
    });
    const lines = Array.from({ length: 30 }, (_, id) => `{"id":${id},"smiles":"CC1CCCCC1"}\n`);
    const code = await main(["analyse"], {
      input: Readable.from(lines),
      output: slow,
      errors: new PassThrough(),
    });
    expect(code).toBe(0);
    await new Promise((resolve) => slow.end(resolve));
    expect(answers(written.join("")).map(({ id }) => id)).toEqual(lines.map((_, id) => id));
    expect(slow.listenerCount("drain")).toBeLessThan(3);
  });

  test("stops quietly when nobody reads any more", async () => {
    let left = 3;
    const closing: Writable = new Writable({
      write: (_chunk, _encoding, done) => {
        left -= 1;
        done(left > 0 ? null : Object.assign(new Error("write EPIPE"), { code: "EPIPE" }));
      },
    });
    const endless = Readable.from(
      (function* () {
        for (let id = 0; id < 10_000; id++) yield `{"id":${id},"smiles":"C1CCCCC1"}\n`;
      })(),
    );
    const errors = new PassThrough();
    expect(await main(["analyse"], { input: endless, output: closing, errors })).toBe(0);
    expect(endless.destroyed).toBe(true);
    expect(errors.readableLength).toBe(0);
  });
});
