import { describe, expect, test } from "vitest";
import { runRingfolio } from "../runRingfolio.ts";

describe("The help a newcomer meets", () => {
  test("names every command, the exit codes and one example", () => {
    const { status, stdout } = runRingfolio(["--help"]);
    expect(status).toBe(0);
    for (const command of ["build", "serve", "check", "analyse", "schema"]) expect(stdout).toContain(command);
    expect(stdout).toMatch(/exit/i);
    expect(stdout).toContain("ringfolio ");
  });

  test.each(["build", "serve", "check", "analyse", "schema"])("is there for %s", (command) => {
    const { status, stdout } = runRingfolio([command, "--help"]);
    expect(status).toBe(0);
    expect(stdout).toContain(command);
  });

  test("stays short when a command is misspelt, and suggests the right one", () => {
    const { status, stderr } = runRingfolio(["biuld"]);
    expect(status).toBe(2);
    expect(stderr).toContain("build");
    expect(stderr).not.toMatch(/\n\s+at /);
  });

  test("refuses an unknown option by name", () => {
    const { status, stderr } = runRingfolio(["build", "--outptu", "x"]);
    expect(status).toBe(2);
    expect(stderr).toContain("--outptu");
  });

  test("prints JSON Schemas for editors and for the batch command", () => {
    const { status, stdout } = runRingfolio(["schema"]);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toHaveProperty("$schema");
  });
});
