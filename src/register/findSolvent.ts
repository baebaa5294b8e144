import type { Register, Solvent } from "./Register.ts";

/** A solvent by key or other spelling, upper and lower case alike. */
export function findSolvent(register: Register, word: string): Solvent | undefined {
  const folded = word.trim().toLowerCase();
  return register.solvents.find((solvent) =>
    [solvent.key, ...solvent.aliases].some((spelling) => spelling.toLowerCase() === folded),
  );
}
