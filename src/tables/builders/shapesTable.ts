import type { Dossier, RingPuckering } from "../../dossier/Dossier.ts";
import { fixed } from "../cells/fixed.ts";
import { numberCell } from "../cells/numberCell.ts";
import type { TableModel } from "../TableModel.ts";

/** The shape of every ring in every conformer after relaxation: form, Cremer–Pople puckering, endocyclic torsions. */
export function shapesTable(dossier: Dossier): TableModel {
  const several = dossier.rings.length > 1;
  const rows = dossier.conformers.flatMap((conformer) =>
    (conformer.relaxed?.puckering ?? []).map((shape) => ({
      cells: [
        { text: conformer.id },
        ...(several ? [{ text: String(shape.ring + 1) }] : []),
        { text: `${shape.nearest}, ${shape.distance_deg.toFixed(1)}° off` },
        { text: shape.symbol ?? "", markup: true },
        numberCell(shape.Q_A, fixed(shape.Q_A, 3)),
        numberCell(shape.theta_deg, fixed(shape.theta_deg, 1)),
        shape.phi_deg === null ? { text: "" } : numberCell(shape.phi_deg, fixed(shape.phi_deg, 1)),
        { text: torsionsText(shape) },
      ],
    })),
  );
  const left = { align: "left" as const };
  const right = { align: "right" as const };
  return {
    id: "shapes",
    caption: `Ring shapes of ${dossier.code}, relaxed by ${dossier.conformers.find(({ relaxed }) => relaxed !== null)?.relaxed?.method ?? "mechanics"}`,
    columns: [
      { key: "conformer", title: "Conformer", ...left, rowHeader: true },
      ...(several ? [{ key: "ring", title: "Ring", ...left }] : []),
      { key: "form", title: "Nearest form", ...left },
      { key: "symbol", title: "Symbol", ...left },
      { key: "Q", title: "Q / Å", ...right, numbers: ["Q (Å)"] },
      { key: "theta", title: "θ / °", ...right, numbers: ["theta (degrees)"] },
      { key: "phi", title: "φ / °", ...right, numbers: ["phi (degrees)"] },
      { key: "torsions", title: "Torsions / °", ...left },
    ],
    rows,
    notes: [
      "Amplitude and angles by Cremer and Pople, in the order of locants given with the torsions; θ is 0° or 180° in a chair, 90° in a boat or twist-boat, and φ has no meaning near a chair.",
      "A minimum of the force field for the isolated molecule, not a measured geometry; the symbol is given where a ring has sugar numbering, and numbers the atoms listed with the torsions as O, C1 to C5 in that order (C2 to C6 in a ketose).",
    ],
  };
}

function torsionsText(shape: RingPuckering): string {
  const values = shape.torsions_deg.map((torsion) => fixed(torsion, 0));
  return `${shape.locants.join(" ")}: ${values.join(", ")}`;
}
