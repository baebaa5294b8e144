import { LineCounter, type ParsedNode, parseDocument, type YAMLSeq } from "yaml";
import type { Diagnostic } from "../diagnostics/Diagnostic.ts";
import { nearestWord } from "../diagnostics/nearestWord.ts";
import { deepFreeze } from "./deepFreeze.ts";
import type { Register, RegisterRow } from "./Register.ts";
import { type Entry, REGISTER_FILES, type RegisterFile } from "./registerSchema.ts";

/** A data file's entries with the line each begins on. */
interface ReadFile<F extends RegisterFile> {
  readonly entries: readonly { readonly entry: Entry<F>; readonly line: number }[];
}

/**
 * Reads the register from the texts of its files, by file name.
 * @param sha256 - digest of those texts, lower-case hex, kept in the register.
 * @returns the register, and every problem with file and line; a register with problems is not to be used.
 */
export function parseRegister(
  texts: Readonly<Record<string, string>>,
  sha256: string,
): { readonly register: Register; readonly problems: readonly Diagnostic[] } {
  const problems: Diagnostic[] = [];
  const read = <F extends RegisterFile>(file: F) => readFile(file, texts[file], problems);
  const groups = read("groups.yaml");
  const groupClasses = read("groupClasses.yaml");
  const parents = read("parents.yaml");
  const solvents = read("solvents.yaml");
  const citations = read("bibliography.yaml");
  const axial = read("axialGroups.yaml");
  const ringPositions = read("ringPositions.yaml");
  const anomeric = read("anomeric.yaml");
  const nitrogen = read("nitrogen.yaml");
  const vicinal = read("vicinalGauche.yaml");
  const synAxial = read("synAxial.yaml");
  const geminal = read("geminal.yaml");
  const barriers = read("barriers.yaml");
  const nonChair = read("nonChair.yaml");
  const version = /^version:\s*"?([^"\n]+)"?\s*$/m.exec(texts["register.yaml"] ?? "")?.[1] ?? "";
  if (version === "")
    problems.push(problem("register.yaml", 1, "missing-version", "The register states no version."));

  const cyclohexane = { ring: "cyclohexane", locants: [1] };
  const rows: { row: RegisterRow; file: RegisterFile; line: number }[] = [
    ...rowsOf("axialGroups.yaml", axial, "axial group", (e) => ({ ...cyclohexane, groups: [e.group] })),
    ...rowsOf("ringPositions.yaml", ringPositions, "axial group", (e) => ({
      ring: e.ring,
      locants: [e.locant],
      groups: [e.group],
    })),
    ...rowsOf("anomeric.yaml", anomeric, "anomeric", (e) => ({
      ring: e.ring,
      locants: [e.locant],
      groups: [e.group],
    })),
    ...rowsOf("nitrogen.yaml", nitrogen, "nitrogen substituent", (e) => ({
      ring: e.ring,
      locants: [e.locant],
      groups: [e.group],
    })),
    ...rowsOf("vicinalGauche.yaml", vicinal, "vicinal gauche", (e) => ({
      ring: "cyclohexane",
      locants: [],
      groups: e.groups,
    })),
    ...rowsOf("synAxial.yaml", synAxial, "syn-axial", (e) => ({
      ring: e.ring ?? "cyclohexane",
      locants: e.locants ?? [],
      groups: e.groups,
    })),
    ...rowsOf("geminal.yaml", geminal, "geminal", (e) => ({
      ring: "cyclohexane",
      locants: [],
      groups: e.groups,
    })),
  ];

  const expectKnown = (file: string, line: number, what: string, word: string, known: readonly string[]) => {
    if (known.includes(word)) return;
    const near = nearestWord(word, known);
    problems.push({
      ...problem(file, line, `unknown-${what}`, `The register has no ${what} "${word}".`),
      ...(near === undefined ? {} : { suggestion: near }),
    });
  };
  // Hydrogen is no group, but has places of its own on an inverting nitrogen.
  const groupKeys = [...groups.entries.map(({ entry }) => entry.key), "H"];
  const classKeys = groupClasses.entries.map(({ entry }) => entry.key);
  const solventKeys = solvents.entries.map(({ entry }) => entry.key);
  const citationKeys = citations.entries.map(({ entry }) => entry.key);
  for (const { entry, line } of groups.entries)
    expectKnown("groups.yaml", line, "class", entry.groupClass, classKeys);
  for (const { row, file, line } of rows) {
    for (const group of row.groups) expectKnown(file, line, "group", group, groupKeys);
    for (const solvent of row.solvents) expectKnown(file, line, "solvent", solvent, solventKeys);
    for (const source of [...row.sources, ...(row.entropy?.sources ?? [])])
      expectKnown(file, line, "source", source, citationKeys);
  }
  for (const [file, list] of [
    ["barriers.yaml", barriers],
    ["nonChair.yaml", nonChair],
  ] as const) {
    for (const { entry, line } of list.entries) {
      for (const source of entry.sources) expectKnown(file, line, "source", source, citationKeys);
    }
  }
  unique(
    "groups.yaml",
    groups.entries.map(({ entry, line }) => ({ key: entry.key, line })),
    problems,
  );
  unique(
    "groupClasses.yaml",
    groupClasses.entries.map(({ entry, line }) => ({ key: entry.key, line })),
    problems,
  );
  unique(
    "solvents.yaml",
    solvents.entries.map(({ entry, line }) => ({ key: entry.key, line })),
    problems,
  );
  unique(
    "bibliography.yaml",
    citations.entries.map(({ entry, line }) => ({ key: entry.key, line })),
    problems,
  );
  unique(
    "parents.yaml",
    parents.entries.map(({ entry, line }) => ({ key: entry.name, line })),
    problems,
  );
  uniqueAcross(
    [
      ...rows.map(({ row, file, line }) => ({ key: row.id, file, line })),
      ...barriers.entries.map(({ entry, line }) => ({ key: entry.id, file: "barriers.yaml", line })),
      ...nonChair.entries.map(({ entry, line }) => ({ key: entry.id, file: "nonChair.yaml", line })),
    ],
    problems,
  );

  const register: Register = {
    version,
    sha256,
    groups: groups.entries.map(({ entry }) => entry),
    groupClasses: groupClasses.entries.map(({ entry: { pattern: _pattern, ...rest } }) => rest),
    rows: rows.map(({ row }) => row),
    barriers: barriers.entries.map(({ entry }) => withoutUndefined(entry)),
    nonChair: nonChair.entries.map(({ entry }) => withoutUndefined(entry)),
    parents: parents.entries.map(({ entry }) => entry),
    solvents: solvents.entries.map(({ entry }) => entry),
    citations: citations.entries.map(({ entry }) => entry),
  };
  return { register: deepFreeze(register), problems };
}

/** Files whose rows state an energy in a medium. */
type RowFile =
  | "axialGroups.yaml"
  | "ringPositions.yaml"
  | "anomeric.yaml"
  | "nitrogen.yaml"
  | "vicinalGauche.yaml"
  | "synAxial.yaml"
  | "geminal.yaml";

function rowsOf<F extends RowFile>(
  file: F,
  read: ReadFile<F>,
  kind: RegisterRow["kind"],
  where: (entry: Entry<F>) => Pick<RegisterRow, "ring" | "locants" | "groups">,
): readonly { row: RegisterRow; file: RegisterFile; line: number }[] {
  return read.entries.map(({ entry, line }) => ({
    file,
    line,
    row: withoutUndefined({
      id: entry.id,
      kind,
      ...where(entry),
      value: entry.value,
      u: entry.u,
      unit: "kcal/mol" as const,
      solvent: entry.solvent,
      solvents: entry.solvents ?? [],
      media: entry.media,
      temperature_K: entry.temperature_K,
      entropy: "entropy" in entry ? entry.entropy : undefined,
      sources: entry.sources,
      standing: entry.standing,
      note: entry.note,
    }) as RegisterRow,
  }));
}

function readFile<F extends RegisterFile>(
  file: F,
  text: string | undefined,
  problems: Diagnostic[],
): ReadFile<F> {
  if (text === undefined) {
    problems.push(problem(file, 1, "missing-file", `The register lacks its file ${file}.`));
    return { entries: [] };
  }
  const counter = new LineCounter();
  const document = parseDocument(text, {
    lineCounter: counter,
    version: "1.2",
    schema: "core",
    uniqueKeys: true,
    merge: false,
    prettyErrors: false,
  });
  const lineOf = (node: { range?: readonly [number, number, number] | null } | null | undefined) =>
    node?.range == null ? 1 : counter.linePos(node.range[0]).line;
  for (const error of document.errors) {
    problems.push(problem(file, counter.linePos(error.pos[0]).line, "broken-yaml", error.message));
  }
  const list = document.contents as ParsedNode | null;
  if (list === null || !("items" in list)) {
    problems.push(problem(file, 1, "not-a-list", `${file} must hold a list of entries.`));
    return { entries: [] };
  }
  const schema = REGISTER_FILES[file];
  const entries = (list as YAMLSeq.Parsed).items.flatMap((node) => {
    const line = lineOf(node);
    const result = schema.safeParse(node.toJS(document));
    if (result.success) return [{ entry: result.data as Entry<F>, line }];
    for (const issue of result.error.issues) {
      problems.push(
        problem(file, line, "bad-entry", `${issue.path.join(".") || "entry"}: ${issue.message}.`),
      );
    }
    return [];
  });
  return { entries };
}

function problem(file: string, line: number, code: string, message: string): Diagnostic {
  return { code, severity: "error", place: { file: `register/${file}`, line, column: 1 }, message };
}

function unique(file: string, keys: readonly { key: string; line: number }[], problems: Diagnostic[]): void {
  uniqueAcross(
    keys.map((entry) => ({ ...entry, file })),
    problems,
  );
}

function uniqueAcross(
  keys: readonly { key: string; file: string; line: number }[],
  problems: Diagnostic[],
): void {
  const first = new Map<string, { file: string; line: number }>();
  for (const { key, file, line } of keys) {
    const before = first.get(key);
    if (before === undefined) first.set(key, { file, line });
    else
      problems.push(
        problem(file, line, "duplicate-key", `"${key}" stands already at ${before.file}:${before.line}.`),
      );
  }
}

function withoutUndefined<T extends object>(value: T): { [K in keyof T]: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(value).filter(([, entry]) => entry !== undefined)) as {
    [K in keyof T]: Exclude<T[K], undefined>;
  };
}
