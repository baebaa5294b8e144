import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { Collection } from "../../dossier/Collection.ts";
import { renderProse } from "./renderProse.ts";

/** Formulae in prose that cannot be set, each at its place in the content file. */
export function proseDiagnostics(collection: Collection): readonly Diagnostic[] {
  const check = (
    file: string,
    prose: { readonly markdown: string; readonly firstLine: number },
  ): Diagnostic[] =>
    renderProse(prose.markdown, () => "").problems.map(({ message, line, column }) => {
      const sourceLine = prose.markdown.split("\n")[line - 1];
      return {
        code: "bad-formula",
        severity: "error",
        place: {
          file,
          line: prose.firstLine + line - 1,
          column,
          ...(sourceLine === undefined ? {} : { sourceLine }),
        },
        message,
      };
    });
  return [
    ...check(`${collection.folder}index.md`, collection.prose),
    ...collection.series.flatMap((series) => [
      ...check(`${collection.folder}series/${series.slug}/index.md`, series.prose),
      ...series.dossiers.flatMap((dossier) =>
        check(`${collection.folder}${dossier.input.file}`, dossier.prose),
      ),
    ]),
  ];
}
