import type { Register, Solvent } from "./Register.ts";
export function findSolvent(register: Register, word: string): Solvent | undefined {
  return register.solvents.find((s) => s.key === word || s.aliases.includes(word));
}
