import { articleBody } from "../../../templates/article.ts";
import { renderTex } from "../../derivation/renderTex.ts";
import { ENERGY_RULES } from "../../energetics/rules/index.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";

const display = (what: string, tex: string) =>
  `<div class="math-scroll" role="region" tabindex="0" aria-label="Formula: ${what}">${renderTex(tex, { display: true })}</div>`;

/** The body of the methods page: plain words that say what the program does, in the order in which it does it. */
export function methodsPage(): string {
  const rules = ENERGY_RULES.map(
    ({ title, appliesTo }) =>
      `<dt>${escapeHtml(title)}</dt><dd>${escapeHtml(`${appliesTo[0]!.toUpperCase()}${appliesTo.slice(1)}.`)}</dd>`,
  );
  return articleBody({
    title: "Methods",
    intro:
      "<p>How a dossier is made from a structure, and how far to trust it. The working of each dossier shows the same steps with its own numbers.</p>",
    sections: [
      {
        id: "scope",
        title: "What is analysed",
        content:
          "<p>Every saturated six-membered ring that stands alone: carbocycles and heterocycles with N, O, S, Se, Te, Si, Ge, Sn, Pb, P or As, any number of groups, several separate rings in one molecule, rings inside groups. Fused, spiro and bridged rings, rings with a double bond in or on them (S=O and P=O excepted) and rings with a planar nitrogen (amides, carbamates, ureas, sulfonamides) are named and not analysed yet. Forms other than chairs are not listed; a caution says when they may compete.</p>",
      },
      {
        id: "structure",
        title: "Structure and conformers",
        content:
          "<p>SMILES are read by a cheminformatics library, which also gives InChI, formula and the CIP descriptors with r and s. A missing configuration is found by trying every combination of senses and comparing canonical forms. Faces follow the tetrahedral senses; a group is axial when its face is the one to which the axial bond of its ring atom points. Each ring has two chairs. The group on an inverting nitrogen takes both places, as separate conformers; the places of hydrogen on nitrogen are not told apart. Two chairs are called identical when one can be laid on the other, enantiomeric when it can be laid on the mirror image, otherwise diastereomeric; groups are compared with their own configuration.</p>" +
          "<p>The drawings show the ideal chair (C–C 1.536 Å, C–C–C 111.4°) with bond lengths to groups from covalent radii. It is not a relaxed geometry and no energy rests on it.</p>",
      },
      {
        id: "energies",
        title: "Energies",
        content:
          "<p>The free energy of a conformer is a sum of contributions, each from the register with its source, uncertainty, medium and temperature. Differences are given as the named conformer minus the most stable one. Contributions:</p>" +
          `<dl class="facts rules">${rules.join("")}</dl>` +
          "<p>A syn-axial pair is charged with the published total less half of each group's cyclohexane value, since that half is the contact with the hydrogen that the other group replaced. A geminal pair is charged with the published difference less that of the two single values.</p>" +
          "<p><strong>Choice of a row.</strong> A row that names the solvent comes first; then one for its class of medium; then one for any medium; else the nearest class in the order gas, nonpolar, chlorinated, polar aprotic, protic, with 0.2 kcal/mol added to its uncertainty. Rows equal in this are taken by standing: confirmed, from memory, estimate. Without a stated solvent a chlorinated one is assumed, and the dossier says so.</p>" +
          "<p><strong>Where the register has nothing.</strong> A value of a similar group or pair is borrowed (0.25 to 0.5 kcal/mol added to its uncertainty); in a heteroring the cyclohexane value is used, for carbon groups scaled by the ratio known for methyl at the same position (0.4 kcal/mol added, 1.0 for a polar group beside a heteroatom or on a charged ring); or the range usual for the class of group stands in. Geminal values are never borrowed. Each is shown as not available, stand-in, with its reason, and never as zero. Two polar groups that no value joins are charged no shift but a doubt of their own (0.5 kcal/mol for 1,4-diaxial, 0.2 kcal/mol for 1,3-diequatorial).</p>",
      },
      {
        id: "temperature",
        title: "Temperature",
        content:
          "<p>A row keeps its value at its own temperature. Where an entropy difference is published it gives the slope; elsewhere the slope is zero with 1 cal/(mol K) of doubt, so that intervals widen away from the temperature of the measurement. Rows that print no temperature are taken at 298.15 K.</p>" +
          display("energy at another temperature", "G(T)=G(T_0)-\\Delta S\\,(T-T_0)"),
      },
      {
        id: "populations",
        title: "Populations and intervals",
        content:
          display(
            "population and equilibrium constant",
            "p_i=\\frac{e^{-G_i/RT}}{\\sum_k e^{-G_k/RT}}\\qquad K=e^{-\\Delta G^\\circ/RT}\\qquad R=8.314\\,462\\,618\\ \\mathrm{J\\,mol^{-1}\\,K^{-1}}",
          ) +
          "<p>Register rows are independent of each other; a row used in both conformers moves both, so factors are subtracted before they are squared. Intervals are 95\u00a0%, from 1.96 standard uncertainties. For two conformers the ends of the interval of ΔG° are transformed; for more, the interval of logit p is propagated to first order and transformed back. When the interval of ΔG° contains zero the dossier says that the major conformer is unresolved. Chairs that are equal by symmetry hold exactly equal shares and carry no uncertainty. 1 kcal = 4.184 kJ exactly.</p>",
      },
      {
        id: "limits",
        title: "Limits",
        content:
          "<p>Additive increments are estimates. They may have the wrong sign for geminal pairs without a published value, for hydrogen-bonded and charged groups, for dihalides and other strong dipoles, beside ring heteroatoms, and for pyranoses in water. Most sources of the register are recalled and marked so; estimates are marked as estimates. The uncertainties are those of the register and have not yet been calibrated against measured equilibria. Evidence is recorded and not yet compared with the calculation.</p>" +
          "<p>Every dossier is a draft for qualified review. Defer to current regional guidance.</p>",
      },
    ],
  }).markup;
}
