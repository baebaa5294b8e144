import type { Dossier, Identity } from "../../dossier/Dossier.ts";
import { formatTemperature } from "../../quantity/formatTemperature.ts";
import { toDecimals } from "../../quantity/toDecimals.ts";
import { configurationText } from "../configurationText.ts";
import { descriptorsText } from "../descriptorsText.ts";
import type { Cell, TableModel } from "../TableModel.ts";

const CHIRALITY: Readonly<Record<Identity["chirality"], string>> = {
  achiral: "achiral",
  meso: "achiral by symmetry (meso)",
  chiral: "chiral",
};

/** What the compound is: names, notations, formula, stereochemistry, conditions. */
export function identityTable(dossier: Dossier): TableModel {
  const { identity, conditions } = dossier;
  const solvent = conditions.solvent === "unstated" ? "solvent not stated" : conditions.solventLabel;
  const entries: readonly (readonly [string, Cell])[] = [
    ["Code", { text: dossier.code }],
    ["Name", { text: dossier.name }],
    [
      "Parent ring",
      { text: [...new Set(dossier.rings.map(({ parent }) => parent))].join(", ") || "none analysed" },
    ],
    ["Configuration", { text: configurationText(dossier) }],
    ["Stereodescriptors", { text: descriptorsText(identity) }],
    ["Chirality", { text: CHIRALITY[identity.chirality] }],
    ["Molecular formula", { text: identity.formula.replace(/(\d+)/g, "_$1"), markup: true }],
    ["Relative molecular mass", { text: toDecimals(identity.molarMass, 2) }],
    ["SMILES as given", { text: identity.smiles }],
    ["Canonical SMILES", { text: identity.canonicalSmiles }],
    ["InChI", { text: identity.inchi }],
    ["InChIKey", { text: identity.inchikey }],
    [
      "Conditions",
      {
        text: `${formatTemperature(conditions.temperature_K)}, ${solvent}${conditions.stated ? "" : " (assumed, not stated)"}`,
        markup: true,
      },
    ],
  ];
  return {
    id: "identity",
    caption: `Identity of ${dossier.code}`,
    columns: [
      { key: "property", title: "Property", align: "left", rowHeader: true },
      { key: "value", title: "Value", align: "left" },
    ],
    rows: entries.map(([property, value]) => ({ cells: [{ text: property }, value] })),
    notes: [
      "Both chairs share one structure, one InChI and one InChIKey: none of them describes a conformation.",
    ],
  };
}
