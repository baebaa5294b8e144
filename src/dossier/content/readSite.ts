import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { ContentFile } from "./CompoundInput.ts";
import { checkProse } from "./checkProse.ts";
import type { ContentSchema } from "./contentSchema.ts";
import { explainIssues } from "./issues/explainIssues.ts";
import { parseFrontMatter } from "./parseFrontMatter.ts";

const DEFAULT_TITLE = "Conformer dossiers";

/** What `index.md` of the content folder says about the whole site. */
export interface SiteReading {
  readonly title: string;
  readonly prose: { readonly markdown: string; readonly firstLine: number };
  readonly diagnostics: readonly Diagnostic[];
}

/** Reads the site's own file; neither the file nor its front matter need exist. */
export function readSite(file: ContentFile | undefined, schema: ContentSchema): SiteReading {
  if (file === undefined) {
    return { title: DEFAULT_TITLE, prose: { markdown: "", firstLine: 1 }, diagnostics: [] };
  }
  const matter = parseFrontMatter(file);
  const diagnostics = [
    ...(matter.absent ? [] : matter.diagnostics),
    ...checkProse(file, matter.prose, "site"),
  ];
  if (matter.data !== null) {
    const whole = schema.site.safeParse(matter.data);
    if (!whole.success) diagnostics.push(...explainIssues(whole.error.issues, schema.site, matter));
  }
  return {
    title: schema.site.shape.title.safeParse(matter.data?.["title"]).data ?? DEFAULT_TITLE,
    prose: matter.prose,
    diagnostics,
  };
}
