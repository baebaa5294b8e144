/** Configurational prefixes that are set in italics before a hyphen. */
const PREFIXES = /\b(cis|trans|rel|rac|meso|tert|sec)(?=-)/g;
/** Stereodescriptors in brackets, with their locants: `(1R,2S)`, `(4aS,8aS)`, `(1r,4r)`, `(2E)`. */
const DESCRIPTORS = /\((?:\d*[a-z]?[′']*[RSrsEZ])(?:,\d*[a-z]?[′']*[RSrsEZ])*\)/g;
/** Letter locants: `N-`, `O-`, `N,N-`. */
const LETTERS = /(?<![A-Za-z])[NOSP](?:,[NOSP])*(?=-[A-Za-z])/g;

/**
 * A systematic name with the label markup that IUPAC typography asks for (P-16.2: stereodescriptors, configurational
 * prefixes and letter locants in italics). Other characters are left as they are.
 */
export function nameMarkup(name: string): string {
  return name
    .replace(PREFIXES, "*$1*")
    .replace(DESCRIPTORS, (group) => group.replace(/[RSrsEZ]/g, "*$&*"))
    .replace(LETTERS, (group) => group.replace(/[NOSP]/g, "*$&*"));
}
