import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { printDiagnostic } from "../diagnostics/printDiagnostic.ts";
import { parseRegister } from "../register/parseRegister.ts";
import type { Register } from "../register/Register.ts";

const FOLDER = fileURLToPath(new URL("../register/data/", import.meta.url));
let kept: Register | undefined;

/**
 * The parameter register that ships with the program, read once per process.
 * @throws Error when its files are broken, which is a fault of the program and not of an author.
 */
export function readRegister(): Register {
  kept ??= read();
  return kept;
}

function read(): Register {
  const names = readdirSync(FOLDER)
    .filter((name) => name.endsWith(".yaml"))
    .sort();
  const digest = createHash("sha256");
  const texts: Record<string, string> = {};
  for (const name of names) {
    texts[name] = readFileSync(FOLDER + name, "utf8").replaceAll("\r\n", "\n");
    digest.update(`${name}\n${texts[name]}\n`, "utf8");
  }
  const { register, problems } = parseRegister(texts, digest.digest("hex"));
  if (problems.length > 0) {
    throw new Error(`the register is broken:\n${problems.map(printDiagnostic).join("\n")}`);
  }
  return register;
}
