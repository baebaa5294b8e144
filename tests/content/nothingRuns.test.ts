import { afterEach, describe, expect, it } from "vitest";
import { readContent } from "../../src/dossier/content/readContent.ts";
import { contentFile } from "./contentFile.ts";
import { SMALL_REGISTER } from "./smallRegister.ts";

const ran = () => (globalThis as { contentRan?: boolean }).contentRan;
const read = (text: string) => readContent([contentFile(text)], [], SMALL_REGISTER);
const errors = (text: string) =>
  read(text)
    .diagnostics.filter(({ severity }) => severity === "error")
    .map(({ code }) => code);

afterEach(() => {
  delete (globalThis as { contentRan?: boolean }).contentRan;
});

describe("nothing in content is executed:", () => {
  it.each(["js", "javascript", "jsLegacy", "json", "coffee", "toml"])(
    "front matter in %s is refused",
    (language) => {
      expect(errors(`---${language}\n(globalThis.contentRan = true, { code: "TN-01" })\n---\n`)).toEqual([
        "executable-front-matter",
      ]);
      expect(ran()).toBeUndefined();
    },
  );

  it("a function tag is refused and its text stays text", () => {
    const text =
      "---\ncode: TN-01\nname: !!js/function 'globalThis.contentRan = true'\nstructure: C1CCCCC1\n---\n";
    expect(errors(text)).toEqual(["forbidden-tag"]);
    expect(ran()).toBeUndefined();
  });

  it("template syntax in front matter and prose stays text", () => {
    const attack = "{{ range.constructor('globalThis.contentRan = true')() }} {% include '/etc/passwd' %}";
    const { compounds, diagnostics } = read(
      `---\ncode: TN-01\nname: "{{ 7 * 7 }}"\nstructure: C1CCCCC1\n---\n${attack}\n`,
    );
    expect(diagnostics.filter(({ severity }) => severity === "error")).toEqual([]);
    expect(compounds[0]?.name).toBe("{{ 7 * 7 }}");
    expect(compounds[0]?.prose.markdown).toBe(`${attack}\n`);
    expect(ran()).toBeUndefined();
  });

  it.each(["permalink", "templateEngineOverride", "layout", "eleventyComputed", "eleventyNavigation"])(
    "the key %s, which a site generator might obey, is unknown",
    (key) => {
      expect(
        errors(`---\ncode: TN-01\nname: x\nstructure: C1CCCCC1\n${key}: ../escaped.html\n---\n`),
      ).toEqual(["unknown-key"]);
    },
  );

  it("raw HTML is pointed out, for it will be shown as text", () => {
    const { diagnostics } = read(
      "---\ncode: TN-01\nname: x\nstructure: C1CCCCC1\n---\n<script>globalThis.contentRan = true</script>\n",
    );
    expect(diagnostics.map(({ code, severity }) => [code, severity])).toEqual([
      ["missing-series-file", "caution"],
      ["raw-html", "caution"],
    ]);
  });
});
