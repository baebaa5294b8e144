import type { Dossier } from "../dossier/Dossier.ts";
import { conformersTable } from "./builders/conformersTable.ts";
import { energiesTable } from "./builders/energiesTable.ts";
import { evidenceTable } from "./builders/evidenceTable.ts";
import { identityTable } from "./builders/identityTable.ts";
import { membersTable } from "./builders/membersTable.ts";
import { shapesTable } from "./builders/shapesTable.ts";
import { sourcesTable } from "./builders/sourcesTable.ts";
import { stereocentresTable } from "./builders/stereocentresTable.ts";
import { stereoisomersTable } from "./builders/stereoisomersTable.ts";
import { temperatureTable } from "./builders/temperatureTable.ts";
import type { TableModel } from "./TableModel.ts";

/** Tables of a dossier by the name an author writes in `::table[name]`, in the order of the standard dossier. */
export const TABLES: Readonly<Record<string, (dossier: Dossier) => TableModel>> = {
  identity: identityTable,
  stereocentres: stereocentresTable,
  stereoisomers: stereoisomersTable,
  conformers: conformersTable,
  shapes: shapesTable,
  energies: energiesTable,
  temperature: temperatureTable,
  members: membersTable,
  evidence: evidenceTable,
  sources: sourcesTable,
};
