import { type DossierView, dossierBody, type Section } from "../../../templates/dossier.ts";
import type { Series } from "../../dossier/Collection.ts";
import type { Dossier } from "../../dossier/Dossier.ts";
import { stereoisomerSentences } from "../../dossier/stereoisomerSentences.ts";
import type { FigureName } from "../../drawing/figures.ts";
import { escapeHtml } from "../../quantity/escapeHtml.ts";
import { labelHtml } from "../../quantity/labelHtml.ts";
import { nameMarkup } from "../../quantity/nameMarkup.ts";
import { DossierParts } from "./DossierParts.ts";
import { dossierValue } from "./dossierValue.ts";
import { PagePlan } from "./PagePlan.ts";
import type { RegisterPlaces } from "./registerPlaces.ts";
import { renderProse } from "./renderProse.ts";
import { xyzFileName } from "./xyzFileName.ts";

/** The parts of every dossier in their order; `key` names what stands for a part that the prose places whole. */
const STANDARD: readonly { readonly id: string; readonly title: string; readonly key?: string }[] = [
  { id: "identity", title: "Identity", key: "table/identity" },
  { id: "stereoisomers", title: "Stereoisomers", key: "table/stereoisomers" },
  { id: "conformers", title: "Conformers" },
  { id: "shapes", title: "Ring shapes", key: "table/shapes" },
  { id: "energies", title: "Energies", key: "table/energies" },
  { id: "derivation", title: "From contributions to populations", key: "derivation/equilibrium" },
  { id: "temperature", title: "Population against temperature", key: "figure/temperature" },
  { id: "members", title: "Stereoisomers that the structure may stand for" },
  { id: "evidence", title: "Evidence" },
  { id: "claim", title: "Claim" },
  { id: "alerts", title: "Checks" },
  { id: "sources", title: "Sources", key: "table/sources" },
  { id: "provenance", title: "Provenance" },
  { id: "downloads", title: "Downloads" },
];

/** The body of a dossier page. Parts that the prose places are not repeated below it. */
export function dossierPage(dossier: Dossier, series: Series, places: RegisterPlaces): string {
  const plan = new PagePlan();
  const parts = new DossierParts(dossier, plan, places);
  const wanted = new Set<string>();
  // A first pass finds what the prose places, so that the lead figure is not drawn twice.
  renderProse(dossier.prose.markdown, ({ kind, name }) => {
    wanted.add(`${kind}/${name}`);
    return "";
  });
  const lead = wanted.has("figure/equilibrium") ? "" : (parts.figure("equilibrium") ?? "");
  const prose = renderProse(dossier.prose.markdown, ({ kind, name, options }) => {
    switch (kind) {
      case "figure":
        return (
          parts.figure(name as FigureName, options["conformer"]) ??
          missing("This figure cannot be drawn: the dossier has no such conformer.")
        );
      case "table":
        return parts.table(name);
      case "derivation":
        return parts.derivation() ?? missing("There is no equilibrium to derive.");
      case "value":
        return `<span class="value">${labelHtml(dossierValue(dossier, name))}</span>`;
      default:
        return null;
    }
  }).html;
  const sections = sectionsOf(dossier, parts);
  return dossierBody({
    code: dossier.code,
    name: labelHtml(nameMarkup(dossier.name)),
    seriesTitle: series.title,
    seriesHref: "../index.html",
    status: statusOf(dossier),
    conclusion: labelHtml(dossier.conclusion),
    stops: dossier.alerts.filter(({ severity }) => severity === "stop").map(({ message }) => message),
    lead,
    prose,
    sections,
    contents: contentsOf(sections, parts),
    neighbours: neighboursOf(dossier, series),
  }).markup;
}

function neighboursOf(dossier: Dossier, series: Series): DossierView["neighbours"] {
  const index = series.dossiers.findIndex(({ slug }) => slug === dossier.slug);
  const entry = (relation: "Previous" | "Next", other: Dossier | undefined) =>
    other === undefined ? [] : [{ relation, code: other.code, href: `../${other.slug}/index.html` }];
  return [
    ...entry("Previous", index > 0 ? series.dossiers[index - 1] : undefined),
    ...entry("Next", series.dossiers[index + 1]),
  ];
}

/** The standard parts in their order, those that the prose places included. */
function contentsOf(sections: readonly Section[], parts: DossierParts): DossierView["contents"] {
  return STANDARD.flatMap(({ id, title, key }) => {
    const anchor = sections.some((section) => section.id === id) ? id : key && parts.idOf(key);
    return anchor === undefined ? [] : [{ id: anchor, title }];
  });
}

function missing(text: string): string {
  return `<p class="missing">${escapeHtml(text)}</p>`;
}

function statusOf(dossier: Dossier): string {
  const reviewed = dossier.review.some(({ as }) => as !== "author");
  const entries = dossier.review.map(
    ({ by, on, as, meaning }) => `${as}: ${by}, ${on}${meaning === null ? "" : ` (${meaning})`}`,
  );
  return `${reviewed ? "Signed" : "Unsigned draft"}${entries.length === 0 ? "; no author or reviewer is recorded" : `; ${entries.join("; ")}`}.`;
}

function sectionsOf(dossier: Dossier, parts: DossierParts): readonly Section[] {
  const once = (key: string, make: () => string | null) => (parts.has(key) ? null : make());
  const figure = (name: FigureName) => once(`figure/${name}`, () => parts.figure(name));
  const table = (name: string) => once(`table/${name}`, () => parts.table(name));
  const analysed = dossier.conformers.length > 0;
  const relaxed = dossier.conformers.some((conformer) => conformer.relaxed !== null);
  const content: Record<string, () => readonly (string | null)[]> = {
    identity: () => [
      figure("wedge"),
      table("identity"),
      dossier.identity.stereocentres.length > 0 ? table("stereocentres") : null,
    ],
    stereoisomers: () => [
      dossier.stereoisomers.length > 0
        ? table("stereoisomers")
        : once("table/stereoisomers", () => `<p>${stereoisomerSentences(dossier).join(" ")}</p>`),
    ],
    conformers: () => [analysed ? table("conformers") : null],
    shapes: () => [relaxed ? table("shapes") : null],
    energies: () => [analysed ? table("energies") : null],
    derivation: () => [analysed ? once("derivation/equilibrium", () => parts.derivation()) : null],
    temperature: () => (analysed ? [figure("temperature"), table("temperature")] : []),
    members: () => [dossier.members.length > 0 ? table("members") : null],
    evidence: () => {
      if (dossier.evidence.length === 0) return ["<p>No evidence is recorded.</p>"];
      const placed = parts.idOf("table/evidence");
      const where = placed === undefined ? "" : ` It stands in <a href="#${placed}">the text above</a>.`;
      return [
        `<p>As recorded by the author; not yet compared with the calculation.${where}</p>`,
        table("evidence"),
      ];
    },
    claim: () => [claimOf(dossier)],
    alerts: () => [alertsOf(dossier)],
    sources: () => [dossier.sources.length === 0 ? null : table("sources")],
    provenance: () => [provenanceOf(dossier)],
    downloads: () => [downloadsOf(dossier)],
  };
  return STANDARD.flatMap(({ id, title }): Section[] => {
    const pieces = content[id]!().filter((piece) => piece !== null && piece !== "");
    return pieces.length === 0 ? [] : [{ id, title, content: pieces.join("\n") }];
  });
}

function claimOf(dossier: Dossier): string {
  const { claim } = dossier;
  if (claim === null) return "<p>No claim is recorded.</p>";
  const basis: Record<string, string> = {
    rm: "absolute configuration by comparison with a reference molecule of known configuration",
    ad: "absolute configuration by anomalous dispersion",
    rmad: "absolute configuration by reference molecule and anomalous dispersion",
    syn: "relative or absolute configuration by synthesis",
    unk: "absolute configuration unknown, arbitrary choice",
  };
  const rows = [
    claim.configuration === null ? null : `<dt>Configuration</dt><dd>${escapeHtml(claim.configuration)}</dd>`,
    claim.basis === null
      ? null
      : `<dt>Basis</dt><dd>${escapeHtml(claim.basis)}: ${escapeHtml(basis[claim.basis] ?? "")}</dd>`,
    claim.statement === null ? null : `<dt>Statement</dt><dd>${escapeHtml(claim.statement)}</dd>`,
  ].filter((row) => row !== null);
  return `<dl class="facts">${rows.join("")}</dl>`;
}

function alertsOf(dossier: Dossier): string {
  if (dossier.alerts.length === 0) return "<p>Nothing is open.</p>";
  const items = dossier.alerts.map(
    ({ severity, message, code }) =>
      `<li class="alert alert-${severity}"><strong>${severity[0]!.toUpperCase()}${severity.slice(1)}.</strong> ${escapeHtml(message)} <code>${escapeHtml(code)}</code></li>`,
  );
  return `<ul class="alerts">${items.join("")}</ul>`;
}

function provenanceOf(dossier: Dossier): string {
  const rows: readonly (readonly [string, string])[] = [
    [
      "Program",
      `${dossier.program.name} ${dossier.program.version}, record version ${dossier.schemaVersion}`,
    ],
    ["Register", `${dossier.register.version}, SHA-256 ${dossier.register.sha256}`],
    ["Input", `${dossier.input.file}, SHA-256 ${dossier.input.sha256}`],
    ["Result", `SHA-256 ${dossier.resultSha256}`],
  ];
  return `<dl class="facts digests">${rows.map(([term, text]) => `<dt>${term}</dt><dd>${escapeHtml(text)}</dd>`).join("")}</dl>`;
}

function downloadsOf(dossier: Dossier): string {
  const geometries = dossier.conformers
    .filter(({ relaxed }) => relaxed !== null)
    .map(({ id }) => `<a href="${xyzFileName(dossier, id)}" download>${id}</a>`);
  const coordinates =
    geometries.length === 0
      ? ""
      : ` Relaxed coordinates of the conformers (XYZ, Å): ${geometries.join(", ")}; minima of a force field for the isolated molecule, not measurements.`;
  return `<p><a href="${dossier.slug}.json" download>The whole record (JSON)</a>. Figures and tables have their own links above.${coordinates}</p>`;
}
