import type { Dossier } from "../../dossier/Dossier.ts";
import { writeXyz } from "../../dossier/writeXyz.ts";
import { FIGURES, type FigureName } from "../../drawing/figures.ts";
import { renderFigure } from "../../drawing/renderFigure.ts";
import { TABLES } from "../../tables/TABLES.ts";
import { tableCsv } from "../../tables/tableCsv.ts";
import type { SitePage } from "./SitePage.ts";
import { xyzFileName } from "./xyzFileName.ts";

/** What a reader can take away from a dossier: the record, its figures and its tables. */
export function dossierFiles(dossier: Dossier, folder: string): readonly SitePage[] {
  const figures = (Object.keys(FIGURES) as FigureName[]).filter(
    (name) => name !== "chair" && FIGURES[name].canShow(dossier),
  );
  return [
    { path: `${folder}/${dossier.slug}.json`, render: () => `${JSON.stringify(dossier, null, 1)}\n` },
    ...figures.map((name) => ({
      path: `${folder}/figures/${name}.svg`,
      render: () => standalone(renderFigure(dossier, name).svg),
    })),
    ...Object.keys(TABLES).map((name) => ({
      path: `${folder}/tables/${name}.csv`,
      render: () => tableCsv(TABLES[name]!(dossier)),
    })),
    ...dossier.conformers.flatMap(({ id, label, relaxed }) =>
      relaxed === null
        ? []
        : [
            {
              path: `${folder}/${xyzFileName(dossier, id)}`,
              render: () =>
                writeXyz(relaxed, `${dossier.code} conformer ${id} (${label}); calculated, not measured`),
            },
          ],
    ),
  ];
}

/** An inline drawing as a file of its own: XML declaration, and the name space if the page form lacks it. */
function standalone(svg: string): string {
  const named = /<svg[^>]*\sxmlns=/.test(svg)
    ? svg
    : svg.replace("<svg", '<svg xmlns="http://www.w3.org/2000/svg"');
  return `<?xml version="1.0" encoding="UTF-8"?>\n${named}\n`;
}
