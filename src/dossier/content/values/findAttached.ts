import type { AttachedFile } from "../CompoundInput.ts";
import { quote } from "./quote.ts";
import { problem, type Reading } from "./Reading.ts";
import { suggest } from "./suggest.ts";

/** The attached file that a compound file names by a path from its own folder; the content folder is the limit. */
export function findAttached(
  name: string,
  from: string,
  attached: readonly AttachedFile[],
): Reading<AttachedFile> {
  if (name.startsWith("/") || name.includes("\\") || /^[A-Za-z][A-Za-z0-9+.-]*:/.test(name)) {
    return problem(
      "evidence-file-outside",
      `${quote(name)} is not a path from this file. A file of evidence lies in the content folder and is named with forward slashes.`,
    );
  }
  const segments = from.split("/").slice(0, -1);
  for (const segment of name.split("/")) {
    if (segment === "..") {
      if (segments.pop() === undefined) {
        return problem("evidence-file-outside", `${quote(name)} leads out of the content folder.`);
      }
    } else if (segment !== "" && segment !== ".") segments.push(segment);
  }
  const path = segments.join("/");
  const file = attached.find((candidate) => candidate.path === path);
  if (file !== undefined) return { value: file };
  const folder = `${from.split("/").slice(0, -1).join("/")}/`;
  const beside = attached
    .filter((candidate) => candidate.path.startsWith(folder))
    .map(({ path: at }) => at.slice(folder.length));
  const there =
    beside.length === 0
      ? "No evidence file lies in this folder."
      : `This folder has ${beside.slice(0, 8).join(", ")}${beside.length > 8 ? " and others" : ""}.`;
  return problem(
    "missing-evidence-file",
    `There is no file ${quote(path)} in the content folder. ${there}`,
    suggest(name, beside),
  );
}
