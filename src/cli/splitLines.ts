import type { Readable } from "node:stream";

/**
 * The lines of a stream of UTF-8 text, without their ends (LF or CRLF). Node's own line reader also breaks at U+2028
 * and at a lone carriage return, which JSON text may hold, so it cannot be used here. A last line without an end counts
 * unless it is empty.
 * @param longest - characters kept of one line; the rest is dropped, so that no input can fill the memory.
 */
export async function* splitLines(input: Readable, longest: number): AsyncGenerator<string> {
  const decoder = new TextDecoder("utf-8");
  let held = "";
  let begun = false;
  const hold = (part: string) => {
    if (held.length < longest) held += part.slice(0, longest - held.length);
  };
  const take = () => {
    const line = held.endsWith("\r") ? held.slice(0, -1) : held;
    held = "";
    begun = false;
    return line;
  };
  for await (const chunk of input) {
    const text = typeof chunk === "string" ? chunk : decoder.decode(chunk as Uint8Array, { stream: true });
    let from = 0;
    for (let end = text.indexOf("\n"); end !== -1; end = text.indexOf("\n", from)) {
      hold(text.slice(from, end));
      yield take();
      from = end + 1;
    }
    if (from < text.length) begun = true;
    hold(text.slice(from));
  }
  hold(decoder.decode());
  if (begun || held !== "") yield take();
}
