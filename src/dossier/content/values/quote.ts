/** Longest piece of an author's text repeated in a message. */
const LONGEST = 60;

/** An author's text in typographic quotation marks, on one line, shortened, without control characters. */
export function quote(found: string): string {
  const plain = found
    .replace(/\s+/g, " ")
    .replace(/[\p{Cc}\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu, "\uFFFD");
  const characters = [...plain];
  return characters.length <= LONGEST ? `“${plain}”` : `“${characters.slice(0, LONGEST).join("")}…”`;
}
