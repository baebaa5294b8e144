import { articleBody } from "../../../templates/article.ts";
import { renderTex } from "../../derivation/renderTex.ts";
import { ENERGY_RULES } from "../../energetics/rules/index.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { STAND_IN_DOUBTS } from "./standInDoubts.ts";

const display = (what: string, tex: string) =>
  `<div class="math-scroll" role="region" tabindex="0" aria-label="Formula: ${what}">${renderTex(tex, { display: true })}</div>`;

const paragraphs = (...texts: readonly string[]) => texts.map((text) => `<p>${text}</p>`).join("\n");

const facts = (rows: readonly (readonly [string, string])[]) =>
  `<dl class="facts rules">${rows.map(([term, text]) => `<dt>${escapeHtml(term)}</dt><dd>${escapeHtml(text)}</dd>`).join("\n")}</dl>`;

/** The body of the methods page: plain words that say what the program does, in the order in which it does it. */
export function methodsPage(): string {
  return articleBody({
    title: "Methods",
    intro:
      "<p>How a dossier is made from a structure, and how far to trust it. The working of each dossier shows the same steps with its own numbers.</p>",
    sections: [
      { id: "scope", title: "What is analysed", content: scope() },
      { id: "structure", title: "Structure and conformers", content: structure() },
      { id: "energies", title: "Energies", content: energies() },
      { id: "rows", title: "Choice of a register row", content: rows() },
      { id: "stand-ins", title: "Where the register has nothing", content: standIns() },
      { id: "temperature", title: "Temperature", content: temperature() },
      { id: "populations", title: "Populations and intervals", content: populations() },
      { id: "limits", title: "Limits", content: limits() },
    ],
  }).markup;
}

function scope(): string {
  return paragraphs(
    "Every saturated six-membered ring that stands alone: carbocycles and heterocycles with N, O, S, Se, Te, Si, Ge, Sn, Pb, P or As, any number of groups, several separate rings in one molecule, rings inside groups.",
    "A molecule with a fused, spiro or bridged six-membered ring, with a planar ring nitrogen (amide, carbamate, urea, sulfonamide, nitroso and the like), with another element or a radical in such a ring, or with more than 128 conformers is not analysed: its dossier says why with a <em>stop</em>. A six-membered ring with a double bond in or on it (S=O, Se=O and P=O excepted) is passed over, with a <em>caution</em> where another ring of the molecule is analysed and a stop where none is. Aromatic rings are groups.",
    "Forms other than chairs are not listed. A caution says when they may compete: where a tertiary alkyl group is axial in the best chair, or that chair carries more than 4\u00a0kcal/mol of contributions.",
  );
}

function structure(): string {
  return paragraphs(
    "SMILES are read by a cheminformatics library, which also gives InChI, formula and the CIP descriptors with r and s. A missing configuration is found by trying every combination of senses and comparing canonical forms, up to eight open centres. Where all that it leaves open is the choice between mirror images, or lies outside the rings without changing them, one member is shown and a <em>note</em> says so. Else nothing is concluded, unless the author asks for the members; each is then listed with its own major conformer.",
    "Faces follow the tetrahedral senses; a group is axial when its face is the one to which the axial bond of its ring atom points. Each ring has two chairs. The group on an inverting nitrogen takes both places, as separate conformers; the places of hydrogen on nitrogen are not told apart. Two chairs are called identical when one can be laid on the other, enantiomeric when it can be laid on the mirror image, otherwise diastereomeric; groups are compared with their own configuration.",
    "The drawings show the ideal chair (C–C 1.536\u00a0Å, C–C–C 111.4°) with bond lengths to groups from covalent radii. It is not a relaxed geometry and no energy rests on it.",
  );
}

function energies(): string {
  const rules = ENERGY_RULES.map(
    ({ title, appliesTo }) => [title, `${appliesTo[0]!.toUpperCase()}${appliesTo.slice(1)}.`] as const,
  );
  return [
    paragraphs(
      "The free energy of a conformer is a sum of contributions, each from the register with its source, uncertainty, medium and temperature. The value of a group is that of the axial less that of the equatorial place: positive when equatorial is preferred. The difference between two conformers is that of the one named less that of the most stable one, which is conformer A. The contributions:",
    ),
    facts(rules),
    paragraphs(
      "A syn-axial pair is charged with the published total less half of each group’s cyclohexane value, since that half is the contact with the hydrogen that the other group replaced. A geminal pair is charged with the published difference less that of the two single values.",
      "Rotamers of groups and symmetry numbers have no terms of their own: two superimposable chairs that exchange atoms are listed as two states.",
    ),
  ].join("\n");
}

function rows(): string {
  return paragraphs(
    "A row for the ring with its heteroatom in the same state comes before one for the parent ring; for a group on an inverting nitrogen a row for that ring in any other state will do. Rows hold for equivalent positions alike. A pair’s row for its very positions comes before a general one.",
    "Among these, a row that names the solvent comes first; then one for its class of medium; then one for any medium; else that of the nearest class in the order gas, nonpolar, chlorinated, polar aprotic, protic, the less polar on a tie. Rows equal in this are taken by standing: confirmed, from memory, estimate.",
    "Without a stated solvent a chlorinated one is assumed, and the dossier says so. Without a stated temperature it is 298.15\u00a0K.",
  );
}

function standIns(): string {
  return [
    paragraphs(
      "A gap is never filled with zero unseen. What stands in is shown as not available, with its reason and a wide uncertainty, and the dossier carries a caution where it decides the result. Numbers in kcal/mol; what is added is added in quadrature to the uncertainty of the value borrowed.",
    ),
    facts(STAND_IN_DOUBTS),
  ].join("\n");
}

function temperature(): string {
  return [
    paragraphs(
      "A row keeps its value at its own temperature. Where an entropy difference is published it gives the slope; elsewhere the slope is zero with 1\u00a0cal/(mol\u00a0K) of doubt, so that intervals widen away from the temperature of the measurement. Rows that print no temperature, and stand-ins, are taken at 298.15\u00a0K.",
    ),
    display("energy at another temperature", "G(T)=G(T_0)-\\Delta S\\,(T-T_0)"),
  ].join("\n");
}

function populations(): string {
  return [
    display(
      "population and equilibrium constant",
      "p_i=\\frac{e^{-G_i/RT}}{\\sum_k e^{-G_k/RT}}\\qquad K=e^{-\\Delta G^\\circ/RT}\\qquad R=8.314\\,462\\,618\\ \\mathrm{J\\,mol^{-1}\\,K^{-1}}",
    ),
    paragraphs(
      "Register rows are taken as independent of each other; a row used in both conformers moves both, so factors are subtracted before they are squared. Intervals are 95\u00a0%, from 1.96 standard uncertainties. For two conformers the ends of the interval of ΔG° are transformed; for more, the interval of logit <i>p</i> is propagated to first order and transformed back. Either way the interval of a population is not symmetric about it.",
      "When the interval of ΔG° contains zero the dossier says that the major conformer is unresolved. Chairs that are equal by symmetry hold exactly equal shares and carry no uncertainty. 1\u00a0kcal\u00a0=\u00a04.184\u00a0kJ exactly. Nothing is rounded before it is printed.",
    ),
  ].join("\n");
}

function limits(): string {
  return paragraphs(
    "Additive increments are estimates. They may have the wrong sign for geminal pairs without a published value, for hydrogen-bonded and charged groups, for dihalides and other strong dipoles, beside ring heteroatoms, and for pyranoses in water. Most sources of the register are recalled and marked so; estimates are marked as estimates. The uncertainties are those of the register and have not yet been calibrated against measured equilibria; the doubts above are judged. Evidence is recorded and not yet compared with the calculation.",
    "Every dossier is a draft for qualified review. This is not a validated system. Defer to current regional guidance.",
  );
}
