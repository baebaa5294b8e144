import type { Dossier, StereoisomerSummary } from "../../dossier/Dossier.ts";
import { stereoisomerSentences } from "../../dossier/stereoisomerSentences.ts";
import { NONE } from "../cells/NONE.ts";
import type { Row, TableModel } from "../TableModel.ts";

const RELATION: Readonly<Record<StereoisomerSummary["relation"], string>> = {
  same: "this compound",
  enantiomer: "enantiomer",
  diastereomer: "diastereomer",
};

const CHIRALITY: Readonly<Record<StereoisomerSummary["chirality"], string>> = {
  achiral: "achiral",
  meso: "achiral (meso)",
  chiral: "chiral",
};

/** Every stereoisomer of the constitution and its relation to the compound; the notes count them in words. */
export function stereoisomersTable(dossier: Dossier): TableModel {
  const { stereoisomers } = dossier;
  const open = stereoisomers.filter(({ relation }) => relation === "same").length > 1;
  const rows = stereoisomers.map(
    (entry): Row => ({
      cells: [
        { text: open && entry.relation === "same" ? "may be this compound" : RELATION[entry.relation] },
        entry.configuration === "" ? NONE : { text: entry.configuration },
        entry.descriptors === "" ? NONE : { text: `(${entry.descriptors})` },
        { text: CHIRALITY[entry.chirality] },
        { text: entry.canonicalSmiles },
      ],
    }),
  );
  const reference = stereoisomers.some(({ configuration }) => configuration.includes("r-"))
    ? ["r marks the group of reference on a ring, c and t the groups cis and trans to it."]
    : [];
  return {
    id: "stereoisomers",
    caption: `Stereoisomers with the constitution of ${dossier.code}`,
    columns: [
      { key: "relation", title: "Relation", align: "left", rowHeader: true },
      { key: "configuration", title: "Relative configuration", align: "left" },
      { key: "descriptors", title: "Stereodescriptors", align: "left" },
      { key: "chirality", title: "Chirality", align: "left" },
      { key: "smiles", title: "Canonical SMILES", align: "left" },
    ],
    rows: rows.length > 0 ? rows : [{ cells: [{ text: "not listed" }, NONE, NONE, NONE, NONE] }],
    notes: [
      ...stereoisomerSentences(dossier),
      ...(rows.length > 0 ? [`Locants are those of ${dossier.code} throughout.`, ...reference] : []),
    ],
  };
}
