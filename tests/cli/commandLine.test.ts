import { describe, expect, test } from "vitest";
import { COMMANDS } from "../../src/cli/main.ts";
import { runMain } from "./runMain.ts";

describe("The command line", () => {
  test("without a command prints the help and counts as wrong use", async () => {
    const { code, output } = await runMain([]);
    expect(code).toBe(2);
    expect(output).toContain("ringfolio <command> [options]");
  });

  test.each([["--help"], ["-h"], ["help"]])(
    "answers %s with every command and the exit codes",
    async (word) => {
      const { code, output, errors } = await runMain([word]);
      expect(code).toBe(0);
      expect(errors).toBe("");
      for (const { name } of COMMANDS) expect(output).toMatch(new RegExp(`^ {2}${name} `, "m"));
      for (const exit of ["0", "1", "2", "3"]) expect(output).toMatch(new RegExp(`^ {2}${exit} {2}\\w`, "m"));
    },
  );

  test.each(COMMANDS.map(({ name }) => name))("explains %s and each of its options", async (name) => {
    const command = COMMANDS.find((one) => one.name === name)!;
    const { code, output } = await runMain([name, "--help"]);
    expect(code).toBe(0);
    for (const option of command.options) expect(output).toContain(`--${option.name}`);
    expect((await runMain(["help", name])).output).toBe(output);
  });

  test("prints a version that is the package's", async () => {
    const { code, output } = await runMain(["--version"]);
    expect(code).toBe(0);
    expect(output).toMatch(/^\d+\.\d+\.\d+\n$/);
  });

  test.each([
    { args: ["biuld"], says: 'Did you mean "build"?' },
    { args: ["chekc"], says: 'Did you mean "check"?' },
    { args: ["build", "--ouput", "x"], says: 'Did you mean "--output"?' },
    { args: ["build", "--output"], says: "The option --output needs a value." },
    { args: ["build", "--output", "--content", "x"], says: "The option --output needs a value." },
    { args: ["build", "--content="], says: "The option --content needs a value." },
    { args: ["build", "here"], says: 'build does not take "here".' },
    {
      args: ["analyse", "--content", "x"],
      says: '"--content" is not an option of analyse; it has --mechanics.',
    },
    { args: ["schema", "compuond"], says: 'Did you mean "compound"?' },
    { args: ["serve", "--port", "http"], says: '"http" is not a port' },
    { args: ["serve", "--port", "70000"], says: '"70000" is not a port' },
  ])("refuses $args as wrong use and says: $says", async ({ args, says }) => {
    const { code, output, errors } = await runMain(args);
    expect(code).toBe(2);
    expect(output).toBe("");
    expect(errors).toContain(says);
    expect(errors).not.toMatch(/\n\s+at /);
  });

  test.each(["compound", "series", "site", "all", "analyse-input", "analyse-output"])(
    "prints the JSON Schema of %s",
    async (what) => {
      const { code, output } = await runMain(["schema", what]);
      expect(code).toBe(0);
      expect(JSON.parse(output)).toHaveProperty("$schema", "https://json-schema.org/draft/2020-12/schema");
    },
  );

  test("prints the schema of compounds when nothing is named", async () => {
    expect((await runMain(["schema"])).output).toBe((await runMain(["schema", "compound"])).output);
  });
});
