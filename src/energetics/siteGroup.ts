import type { GroupClass, Register } from "../register/Register.ts";
import type { Substituent } from "../structure/StructureAnalysis.ts";

/** The class of a group, with its stand-in values. */
export function classOf(register: Register, substituent: Substituent): GroupClass {
  const found = register.groupClasses.find((entry) => entry.key === substituent.groupClass);
  if (found === undefined) throw new Error(`the register has no group class ${substituent.groupClass}`);
  return found;
}

/** A name under which a group's stand-ins are kept apart: its register key, or its formula. */
export function nameOf(substituent: Substituent): string {
  return substituent.group?.key ?? substituent.label;
}

/** Keys of the register's other groups of the same class, in register order. */
export function similarGroups(register: Register, substituent: Substituent): readonly string[] {
  return register.groups
    .filter((group) => group.groupClass === substituent.groupClass && group.key !== substituent.group?.key)
    .map((group) => group.key);
}
