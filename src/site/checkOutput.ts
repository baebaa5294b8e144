import { readdirSync, realpathSync, statSync } from "node:fs";
import path from "node:path";
import { OutputRefused } from "./OutputRefused.ts";

/** Marks a folder as written by this program, so that it may be replaced. */
export const SITE_MARK = ".ringfolio-site";

/**
 * Where a site may be written, with links resolved.
 * @returns the folder, and in words why it must not be replaced although it is well placed, or null.
 * @throws OutputRefused when it lies in the content folder, holds it, or is no folder.
 */
export function checkOutput(
  output: string,
  content: string,
): { readonly folder: string; readonly foreign: string | null } {
  const folder = realPath(path.resolve(output));
  const source = realPath(path.resolve(content));
  if (isInside(source, folder)) {
    throw new OutputRefused(`The output folder ${output} holds the content folder; choose another.`);
  }
  if (isInside(folder, source)) {
    throw new OutputRefused(`The output folder ${output} lies inside the content folder; choose another.`);
  }
  const found = statSync(folder, { throwIfNoEntry: false });
  if (found === undefined) return { folder, foreign: null };
  if (!found.isDirectory()) throw new OutputRefused(`The output ${output} is a file; name a folder.`);
  const names = readdirSync(folder);
  if (names.length === 0 || names.includes(SITE_MARK)) return { folder, foreign: null };
  return {
    folder,
    foreign: `The folder ${output} is not empty and was not written by ringfolio; choose another, or empty it yourself.`,
  };
}

function isInside(inner: string, outer: string): boolean {
  return inner === outer || inner.startsWith(outer.endsWith(path.sep) ? outer : outer + path.sep);
}

/** The path with links resolved as far as it exists. */
function realPath(target: string): string {
  try {
    return realpathSync(target);
  } catch {
    const parent = path.dirname(target);
    return parent === target ? target : path.join(realPath(parent), path.basename(target));
  }
}
