import { trusted } from "../../../templates/html.ts";
import { layout } from "../../../templates/layout.ts";
import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import { compareDiagnostics } from "../../diagnostics/printDiagnostic.ts";
import type { Collection, Series } from "../../dossier/Collection.ts";
import { SERIES_TABLES } from "../../tables/SERIES_TABLES.ts";
import { tableCsv } from "../../tables/tableCsv.ts";
import { checksPage } from "./checksPage.ts";
import { dossierFiles } from "./dossierFiles.ts";
import { dossierPage } from "./dossierPage.ts";
import { formulaStyles } from "./formulaStyles.ts";
import { homePage } from "./homePage.ts";
import { methodsPage } from "./methodsPage.ts";
import { proseDiagnostics } from "./proseDiagnostics.ts";
import { referencesPage } from "./referencesPage.ts";
import { registerPage } from "./registerPage.ts";
import { registerAnchors } from "./registerPlaces.ts";
import type { SitePage } from "./SitePage.ts";
import { seriesPage } from "./seriesPage.ts";

/**
 * Every file of the site that is made rather than copied, and the problems of prose that only setting it shows.
 * Nothing is rendered until a page is asked for.
 */
export function sitePages(collection: Collection): {
  readonly pages: readonly SitePage[];
  readonly diagnostics: readonly Diagnostic[];
} {
  const anchors = registerAnchors(collection.register);
  const diagnostics = proseDiagnostics(collection);
  const page = (
    path: string,
    title: string,
    description: string,
    current: string,
    notice: string | null,
    body: () => string,
  ): SitePage => {
    const root = "../".repeat(path.split("/").length - 1);
    return {
      path,
      render: () =>
        layout(
          {
            siteTitle: collection.title,
            root,
            program: `${collection.program.name} ${collection.program.version}`,
            registerVersion: collection.register.version,
          },
          { title, description, current, below: current === "Series", notice, body: trusted(body()) },
        ).markup,
    };
  };
  const plain = (path: string, name: string, description: string, body: () => string) =>
    page(path, `${name} · ${collection.title}`, description, name, null, body);
  return {
    diagnostics,
    pages: [
      page("index.html", collection.title, "Conformational analysis dossiers", "Home", null, () =>
        homePage(collection),
      ),
      plain("checks/index.html", "Checks", "What a reviewer still has to look at", () =>
        checksPage(collection, [...collection.diagnostics, ...diagnostics].sort(compareDiagnostics)),
      ),
      plain("register/index.html", "Register", "Every parameter with its source and standing", () =>
        registerPage(collection),
      ),
      plain("references/index.html", "References", "The bibliography", () => referencesPage(collection)),
      plain("methods/index.html", "Methods", "How energies, populations and intervals are made", () =>
        methodsPage(),
      ),
      ...collection.series.flatMap((series) => seriesPages(series)),
      formulaStyles(),
    ],
  };

  function seriesPages(series: Series): readonly SitePage[] {
    const folder = `series/${series.slug}`;
    return [
      page(
        `${folder}/index.html`,
        `${series.title} · ${collection.title}`,
        series.summary,
        "Series",
        series.notice,
        () => seriesPage(series),
      ),
      { path: `${folder}/comparison.csv`, render: () => tableCsv(SERIES_TABLES["comparison"]!(series)) },
      ...series.dossiers.flatMap((dossier) => [
        page(
          `${folder}/${dossier.slug}/index.html`,
          `${dossier.code} ${dossier.name} · ${series.title}`,
          `Conformational analysis of ${dossier.name}`,
          "Series",
          series.notice,
          () => dossierPage(dossier, series, { root: "../../../", anchors }),
        ),
        ...dossierFiles(dossier, `${folder}/${dossier.slug}`),
      ]),
    ];
  }
}
