import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { Collection } from "../../dossier/Collection.ts";
import { renderProse } from "./renderProse.ts";

interface Prose {
  readonly markdown: string;
  readonly firstLine: number;
}

/** What only setting the prose shows, each at its place in the content file: formulae that cannot be set, pictures. */
export function proseDiagnostics(collection: Collection): readonly Diagnostic[] {
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

function check(file: string, prose: Prose): readonly Diagnostic[] {
  const { problems, pictures } = renderProse(prose.markdown, () => null);
  const place = ({ line, column }: { readonly line: number; readonly column: number }) => {
    const sourceLine = prose.markdown.split("\n")[line - 1];
    return {
      file,
      line: prose.firstLine + line - 1,
      column,
      ...(sourceLine === undefined ? {} : { sourceLine }),
    };
  };
  return [
    ...problems.map(
      (problem): Diagnostic => ({
        code: "bad-formula",
        severity: "error",
        place: place(problem),
        message: problem.message,
      }),
    ),
    ...pictures.map(
      (picture): Diagnostic => ({
        code: "picture-not-shown",
        severity: "caution",
        place: place(picture),
        message:
          "Pictures are not shown; readers see their words in brackets. Use ::figure[…] for what the program draws, and record measured data under evidence.",
      }),
    ),
  ];
}
