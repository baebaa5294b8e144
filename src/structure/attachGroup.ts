/** A group's SMILES without its attachment point, ready to stand in a branch. */
export interface AttachedGroup {
  readonly smiles: string;
  /** Atoms that the text adds, in SMILES order. */
  readonly atomCount: number;
}

const TOKEN = /\[[^\]]*\]|%\d\d|Cl|Br|[A-Za-z*]|\d|[^A-Za-z0-9[\]]/g;

/**
 * Prepares a register group (`[*]C1CC1`) for a branch inside another ring: the attachment point is taken
 * off and ring-closure numbers are raised by `offset`, so that they never meet the outer ring's own.
 */
export function attachGroup(groupSmiles: string, offset: number): AttachedGroup {
  if (!groupSmiles.startsWith("[*]")) {
    throw new Error(`a group's SMILES begins with its attachment point [*]: ${groupSmiles}`);
  }
  let smiles = "";
  let atomCount = 0;
  for (const [token] of groupSmiles.slice("[*]".length).matchAll(TOKEN)) {
    if (/^%?\d+$/.test(token)) {
      const closure = Number(token.replace("%", "")) + offset;
      smiles += closure > 9 ? `%${closure}` : String(closure);
      continue;
    }
    if (/^[[A-Za-z*]/.test(token)) atomCount += 1;
    smiles += token;
  }
  return { smiles, atomCount };
}
