/** Characters with a meaning in TeX, and those its text fonts lack but its mathematics has. */
const REPLACEMENTS: Readonly<Record<string, string>> = {
  "\\": "\\textbackslash{}",
  "{": "\\{",
  "}": "\\}",
  $: "\\$",
  "&": "\\&",
  "#": "\\#",
  "%": "\\%",
  _: "\\_",
  "^": "\\textasciicircum{}",
  "~": "\\textasciitilde{}",
  "\u00a0": "~",
  "\u2212": "$-$",
  "\u2032": "$'$",
  "\u2033": "$''$",
  "\u00d7": "$\\times$",
  "\u00b1": "$\\pm$",
  "\u00b0": "$^{\\circ}$",
  "\u00b7": "$\\cdot$",
  "\u2013": "--",
  "\u2014": "---",
  "\u2018": "`",
  "\u2019": "'",
  "\u0394": "$\\Delta$",
  "\u03b1": "$\\alpha$",
  "\u03b2": "$\\beta$",
  "\u03b3": "$\\gamma$",
  "\u03b4": "$\\delta$",
  "\u03c9": "$\\omega$",
};

/**
 * Makes any text safe inside `\text{…}`, so that what an author wrote can never act as TeX.
 * Accented letters lose their accent and characters without a glyph become `?`: a formula names its terms
 * by number, and the table beside it carries the label in full.
 */
export function escapeTex(text: string): string {
  return [...text].map(escapeCharacter).join("");
}

function escapeCharacter(character: string): string {
  const replacement = REPLACEMENTS[character];
  if (replacement !== undefined) return replacement;
  if (/^[\x20-\x7e]$/.test(character)) return character;
  if (/^\s$/.test(character)) return " ";
  const base = character.normalize("NFKD").replace(/\p{M}/gu, "");
  return /^[A-Za-z0-9]+$/.test(base) ? base : "?";
}
