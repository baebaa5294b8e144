/** The anchor of a register row or stand-in on the register page: letters, digits and hyphens only. */
export function registerAnchor(rowId: string): string {
  return [...rowId]
    .map((character) => {
      if (/[A-Za-z0-9]/.test(character)) return character;
      if (/[/\s-]/.test(character)) return "-";
      // Other characters keep their code, so that `NH3+` and `NH3` stay apart.
      return `-${character.codePointAt(0)!.toString(16)}`;
    })
    .join("");
}
