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
    "Every six-membered ring of C, N, O, S, Se, Te, Si, Ge, Sn, Pb, P or As that has chairs, half-chairs or a forced boat: alone, linked, fused, spiro or bridged, beside rings of any other size; carbocycles and heterocycles, any number of groups, rings inside groups.",
    "A ring is a chair when all its bonds are free; one trigonal atom (C=O, C=C outside the ring, N-acyl) leaves it a chair with a flat corner, and so do two that are 1,3 to each other, or the two nitrogens of an N,N′-diacylpiperazine. It is a half-chair when one bond is held flat by a double bond, an aromatic ring or a three-membered ring. It is a boat when a bridge of up to four atoms joins opposite atoms. Lactones, lactams, carbonates, enones, dienes, other flat corners, bridges of one atom across a corner, and other elements are refused by name: with a <em>stop</em> when nothing else can be analysed, with a <em>caution</em> and as a flexible partner beside rings that are. A compound with more than 128 conformers is refused too.",
    "Twist-boats are listed where no arrangement of chairs exists, or where a tertiary alkyl group is axial in the best chair or that chair carries more than 4\u00a0kcal/mol of contributions, and where mechanics runs; otherwise a caution says that they may compete.",
  );
}

function structure(): string {
  return paragraphs(
    "SMILES are read by a cheminformatics library, which also gives InChI, formula and the CIP descriptors with r and s. A missing configuration is found by trying every combination of senses and comparing canonical forms, up to eight open centres; combinations that a short bridge forbids are left out, and a centre that canonical forms overlook is found by superposition. Where all that is left open is the choice between mirror images, or lies outside the rings without changing them, one member is shown and a <em>note</em> says so. Else nothing is concluded, unless the author asks for the members; each is then listed with its own major conformer.",
    "Faces follow the tetrahedral senses; a group is axial when its face is the one to which the axial bond of its ring atom points. The state of a ring fixes the torsion about each bond it shares, and with the faces of the outside bonds there the torsion of the ring fused to it; every arrangement in which all rings agree is a conformer. The ends of a bridge between atoms 1,3 to each other must both be axial. The group on an inverting nitrogen takes both places, as separate conformers; the places of hydrogen on nitrogen are held together by one conformer and their shares stated. Two conformers are called identical when one can be laid on the other, enantiomeric when it can be laid on the mirror image, otherwise diastereomeric; groups are compared with their own configuration.",
    "Stereoisomers of the constitution are enumerated over all centres and double bonds that matter, up to eight, and related to the compound. Locants of two fused, spiro or bridged rings and of the anthracene, phenanthrene, steroid and adamantane skeletons follow IUPAC numbering; atom classes in the SMILES go before it.",
    "A single chair is drawn in the shape of cyclohexane (C–C 1.536\u00a0Å, C–C–C 111.4°); ring systems are drawn from coordinates built by distance geometry with tetrahedral angles, so that all-chair systems lie on the diamond lattice. Relaxed geometries are minima of MMFF94s for the isolated molecule, built from graph, senses and ring states alone, the lowest of up to nine rotamers, and kept only when states and senses survive. Puckering is that of Cremer and Pople. No population rests on them, twist-boats apart.",
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
      "A bond from a ring into another ring of its system is charged like the open-chain group it resembles: methyl, methoxy, methylsulfanyl, dimethylamino. Across a cis-fused bond the two rings charge one contact twice; a half of either group’s value, averaged, is taken back, so that cis-decalin carries three gauche butane units. Contacts that lie within another ring, or that it charges as axial, are left out. Every conformer of a system of several rings that symmetry does not make equal carries 0.4\u00a0kcal/mol of doubt, 1.0 where a bridge is involved. A twist-boat is charged with the contributions of the best chair and the difference by mechanics, with 1.5\u00a0kcal/mol of doubt; 1.4\u00a0kcal/mol is added for each axial tert-butyl group of that chair, which the force field overcharges.",
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
