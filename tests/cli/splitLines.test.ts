import { Readable } from "node:stream";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { splitLines } from "../../src/cli/splitLines.ts";

async function linesOf(parts: readonly (string | Uint8Array)[], longest = 1000): Promise<string[]> {
  const lines: string[] = [];
  for await (const line of splitLines(Readable.from(parts), longest)) lines.push(line);
  return lines;
}

describe("Lines of standard input", () => {
  test.each([
    { text: "", lines: [] },
    { text: "a\nb\n", lines: ["a", "b"] },
    { text: "a\nb", lines: ["a", "b"] },
    { text: "a\r\nb\r\n", lines: ["a", "b"] },
    { text: "\n\na\n", lines: ["", "", "a"] },
    { text: "a\u2028b\u2029c\rd\n", lines: ["a\u2028b\u2029c\rd"] },
  ])("of $text are $lines", async ({ text, lines }) => {
    expect(await linesOf([text])).toEqual(lines);
  });

  test("are the same however the bytes arrive, also within a character", async () => {
    const text = fc.array(fc.constantFrom("a", "é", "−", "🜔", "\r\n", "\n", "\u2028"), { maxLength: 30 });
    await fc.assert(
      fc.asyncProperty(text, fc.integer({ min: 1, max: 7 }), async (signs, size) => {
        const bytes = Buffer.from(signs.join(""), "utf8");
        const parts: Uint8Array[] = [];
        for (let i = 0; i < bytes.length; i += size) parts.push(bytes.subarray(i, i + size));
        expect(await linesOf(parts)).toEqual(await linesOf([signs.join("")]));
      }),
      { numRuns: 200 },
    );
  });

  test("are cut when one would fill the memory, and the next is whole", async () => {
    const parts = [...Array.from({ length: 50 }, () => "x".repeat(1000)), "\nnext\n"];
    expect(await linesOf(parts, 1500)).toEqual(["x".repeat(1500), "next"]);
  });
});
