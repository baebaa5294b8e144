import type { Diagnostic } from "../../diagnostics/Diagnostic.ts";
import type { ContentFile, SeriesInput } from "./CompoundInput.ts";
import { checkProse } from "./checkProse.ts";
import type { ContentSchema } from "./contentSchema.ts";
import { explainIssues } from "./issues/explainIssues.ts";
import { parseFrontMatter } from "./parseFrontMatter.ts";
import { NO_DEFAULTS, type SeriesDefaults } from "./SeriesDefaults.ts";
import { titleFromSlug } from "./titleFromSlug.ts";

/** What was read from a series file; the series itself is always given, with a title from its folder at worst. */
export interface SeriesReading {
  readonly series: SeriesInput;
  readonly defaults: SeriesDefaults;
  readonly diagnostics: readonly Diagnostic[];
}

/** Reads `series/<slug>/index.md`. */
export function readSeries(file: ContentFile, slug: string, schema: ContentSchema): SeriesReading {
  const matter = parseFrontMatter(file);
  const diagnostics = [...matter.diagnostics, ...checkProse(file, matter.prose, "series")];
  const { shape } = schema.series;
  if (matter.data !== null) {
    const whole = schema.series.safeParse(matter.data);
    if (!whole.success) diagnostics.push(...explainIssues(whole.error.issues, schema.series, matter));
  }
  const data = matter.data ?? {};
  const title = shape.title.safeParse(data["title"]);
  const summary = shape.summary.safeParse(data["summary"]);
  const notice = shape.notice.safeParse(data["notice"]);
  const parsed = shape.defaults.safeParse(data["defaults"]);
  const { conditions, stereoisomers, claim } = parsed.data ?? {};
  return {
    series: {
      file,
      slug,
      title: title.data ?? titleFromSlug(slug),
      summary: summary.data ?? "",
      notice: notice.data ?? null,
      prose: matter.prose,
    },
    defaults: {
      ...NO_DEFAULTS,
      temperature_K: conditions?.temperature?.kelvin ?? null,
      solvent: conditions?.solvent?.key ?? null,
      stereoisomers: stereoisomers ?? null,
      claim:
        claim === undefined
          ? null
          : {
              configuration: claim.configuration ?? null,
              basis: claim.basis ?? null,
              statement: claim.statement ?? null,
            },
    },
    diagnostics,
  };
}
