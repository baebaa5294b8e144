import { equilibriumDerivation } from "../../derivation/equilibriumDerivation.ts";
import { renderDerivation } from "../../derivation/renderDerivation.ts";
import type { Dossier } from "../../dossier/Dossier.ts";
import { FIGURES, type FigureName } from "../../drawing/figures.ts";
import { renderFigure } from "../../drawing/renderFigure.ts";
import { registerAnchor } from "../../tables/registerAnchor.ts";
import { renderTable } from "../../tables/renderTable.ts";
import { standingKey } from "../../tables/standingKey.ts";
import { TABLES } from "../../tables/TABLES.ts";
import type { PagePlan } from "./PagePlan.ts";
import type { RegisterPlaces } from "./registerPlaces.ts";

/** Makes the numbered parts of one dossier page, each once, in the order in which it is asked. */
export class DossierParts {
  private readonly dossier: Dossier;
  private readonly plan: PagePlan;
  private readonly places: RegisterPlaces;
  private drawings = 0;
  /** Id of each part where it first stands, by name such as `table/energies`. */
  private readonly ids = new Map<string, string>();

  constructor(dossier: Dossier, plan: PagePlan, places: RegisterPlaces) {
    this.dossier = dossier;
    this.plan = plan;
    this.places = places;
  }

  /** A figure, or null when the dossier cannot show it. */
  figure(name: FigureName, conformer?: string): string | null {
    const options = conformer === undefined ? {} : { conformer };
    if (!FIGURES[name].canShow(this.dossier, options)) return null;
    const key = `figure/${name}${conformer === undefined ? "" : `/${conformer}`}`;
    const again = this.plan.placed.has(key);
    this.plan.placed.add(key);
    this.drawings += 1;
    const id = `fig-${this.dossier.slug}-${name}${conformer === undefined ? "" : `-${conformer.toLowerCase()}`}${again ? `-${this.drawings}` : ""}`;
    if (!again) this.ids.set(key, id);
    const { svg, caption } = renderFigure(this.dossier, name, { ...options, idPrefix: `${id}-drawing` });
    const download = conformer === undefined ? [{ href: `figures/${name}.svg`, text: "SVG" }] : [];
    return this.plan.figure(id, svg, caption, download);
  }

  /** A table; the one of energies comes with the key of its marks. */
  table(name: string): string {
    const again = this.plan.placed.has(`table/${name}`);
    this.plan.placed.add(`table/${name}`);
    this.drawings += 1;
    const model = TABLES[name]!(this.dossier);
    const idPrefix = again ? `${this.dossier.slug}-${this.drawings}` : this.dossier.slug;
    if (!again) this.ids.set(`table/${name}`, `${idPrefix}-table-${model.id}`);
    const table = renderTable(model, {
      idPrefix,
      number: this.plan.nextTable(),
      rowHref: (row) => this.rowHref(row),
      sourceHref: (key) => `${this.places.root}references/index.html#${registerAnchor(key)}`,
    });
    const key = name === "energies" && !this.plan.placed.has("standing-key") ? standingKey() : "";
    if (key !== "") this.plan.placed.add("standing-key");
    return `<div class="wide">${table}${key}<p class="table-download"><a href="tables/${name}.csv" download>CSV</a></p></div>`;
  }

  derivation(): string | null {
    if (this.dossier.conformers.length === 0) return null;
    const again = this.plan.placed.has("derivation/equilibrium");
    this.plan.placed.add("derivation/equilibrium");
    this.drawings += 1;
    const idPrefix = again ? `derivation-${this.drawings}` : "derivation";
    const steps = equilibriumDerivation(this.dossier);
    if (!again && steps[0] !== undefined)
      this.ids.set("derivation/equilibrium", `${idPrefix}-${steps[0].id}`);
    return renderDerivation(steps, { headingLevel: 3, idPrefix, rowHref: (row) => this.rowHref(row) });
  }

  /** Where a part stands on the page; undefined when it does not. */
  idOf(key: string): string | undefined {
    return this.ids.get(key);
  }

  has(key: string): boolean {
    return this.plan.placed.has(key);
  }

  private rowHref(row: string): string | undefined {
    const anchor = this.places.anchors.get(row);
    return anchor === undefined ? undefined : `${this.places.root}register/index.html#${anchor}`;
  }
}
