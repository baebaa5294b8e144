import { expect, test } from "vitest";
import { readRegister } from "../../src/site/readRegister.ts";
import { classifyFragment } from "../../src/structure/classifyFragment.ts";
import { loadToolkit } from "../../src/structure/loadToolkit.ts";

test("every group of the register is recognised as the class the register gives it", async () => {
  const toolkit = await loadToolkit();
  const differing = readRegister().groups.flatMap((group) => {
    const molecule = toolkit.readFragment(group.smiles)!;
    const attachment = molecule.atoms.findIndex((atom) => atom.atomicNumber === 0);
    const found = classifyFragment({ molecule, atoms: [], attachment });
    return found === group.groupClass ? [] : [`${group.key}: ${found} instead of ${group.groupClass}`];
  });
  expect(differing).toEqual([]);
});
