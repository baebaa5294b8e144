import type * as z from "zod";
import { valueAt } from "./valueAt.ts";

type Issue = z.core.$ZodIssue;

/** A union fails with the issues of every branch; the branch whose kind of value stands there is meant. */
export function chooseBranch(issue: Issue, data: unknown): readonly Issue[] {
  if (issue.code !== "invalid_union") return [issue];
  const found = valueAt(data, issue.path as (string | number)[]);
  const isMap = typeof found === "object" && found !== null && !Array.isArray(found);
  const branch =
    issue.errors.find((errors) => errors.some((error) => isMap !== isWholeValue(error))) ??
    issue.errors[0] ??
    [];
  return branch.flatMap((inner) =>
    chooseBranch({ ...inner, path: [...issue.path, ...inner.path] } as Issue, data),
  );
}

const isWholeValue = (issue: Issue) => issue.path.length === 0 && issue.code !== "unrecognized_keys";
