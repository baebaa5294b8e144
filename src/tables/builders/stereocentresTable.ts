import type { Dossier } from "../../dossier/Dossier.ts";
import { NONE } from "../cells/NONE.ts";
import { numberCell } from "../cells/numberCell.ts";
import type { TableModel } from "../TableModel.ts";

const MEANINGS: Readonly<Record<string, string>> = {
  r: "pseudoasymmetric",
  s: "pseudoasymmetric",
  unspecified: "needs a configuration and has none",
};

/** Stereocentres and stereo double bonds with their CIP descriptors. */
export function stereocentresTable(dossier: Dossier): TableModel {
  const { stereocentres, stereobonds } = dossier.identity;
  const element = (atom: number) => dossier.structure.atoms[atom]?.element ?? "";
  const rows = [
    ...stereocentres.map(({ atom, descriptor, locant }) => ({
      cells: [
        { text: locant === null ? element(atom) : `${element(atom)}${locant}` },
        numberCell(atom),
        { text: descriptor },
        { text: MEANINGS[descriptor] ?? "" },
      ],
    })),
    ...stereobonds.map(({ atoms, descriptor }) => ({
      cells: [
        { text: atoms.map(element).join("=") },
        { text: atoms.join(", "), numbers: [atoms[0]] },
        { text: descriptor },
        { text: descriptor === "unspecified" ? "needs a configuration and has none" : "double bond" },
      ],
    })),
  ];
  return {
    id: "stereocentres",
    caption: `Stereocentres of ${dossier.code}`,
    columns: [
      { key: "centre", title: "Centre", align: "left", rowHeader: true },
      { key: "atom", title: "Atom in SMILES order", align: "right", numbers: ["Atom in SMILES order"] },
      { key: "descriptor", title: "Descriptor", align: "left" },
      { key: "remark", title: "Remark", align: "left" },
    ],
    rows: rows.length > 0 ? rows : [{ cells: [{ text: "none" }, NONE, NONE, NONE] }],
    notes: ["Atoms count from 0 in the order of the SMILES as given."],
  };
}
