import { inspect, parseArgs } from "node:util";
import { nearestWord } from "../diagnostics/nearestWord.ts";
import { analyse } from "./analyse.ts";
import { build } from "./build.ts";
import { type Command, EXIT } from "./Command.ts";
import { check } from "./check.ts";
import { commandHelp, generalHelp } from "./help.ts";
import type { Io } from "./Io.ts";
import { schema } from "./schema.ts";
import { serve } from "./serve.ts";

/** Every command, in the order of the help. */
export const COMMANDS: readonly Command[] = [build, serve, check, analyse, schema];

/** Runs one command line and returns its exit code; nothing is thrown. */
export async function main(args: readonly string[], io: Io): Promise<number> {
  const debug = args.includes("--debug");
  const words = args.filter((word) => word !== "--debug");
  try {
    return await dispatch(words, io);
  } catch (error) {
    const known = error instanceof Error ? error : new Error(String(error));
    if ((known as NodeJS.ErrnoException).code === "EPIPE") return EXIT.done;
    io.errors.write(`ringfolio: ${debug ? inspect(known) : known.message}\n`);
    if (!debug) io.errors.write("Run again with --debug for the details.\n");
    return EXIT.unexpected;
  }
}

async function dispatch(words: readonly string[], io: Io): Promise<number> {
  const [first, ...rest] = words;
  if (first === undefined || first === "--help" || first === "-h" || first === "help") {
    const topic = COMMANDS.find(({ name }) => name === rest[0]);
    io.output.write(topic === undefined ? generalHelp(COMMANDS) : commandHelp(topic));
    return first === undefined ? EXIT.wrongUse : EXIT.done;
  }
  if (first === "--version" || first === "-v") {
    const { programVersion } = await import("../site/programVersion.ts");
    io.output.write(`${programVersion().version}\n`);
    return EXIT.done;
  }
  const command = COMMANDS.find(({ name }) => name === first);
  if (command === undefined) {
    return wrongUse(
      io,
      `"${first}" is not a command.`,
      first,
      COMMANDS.map(({ name }) => name),
    );
  }
  if (rest.includes("--help") || rest.includes("-h")) {
    io.output.write(commandHelp(command));
    return EXIT.done;
  }
  const allowed = command.options.map(({ name }) => name);
  let values: Record<string, string | boolean | undefined>;
  let positionals: string[];
  try {
    ({ values, positionals } = parseArgs({
      args: [...rest],
      allowPositionals: true,
      options: Object.fromEntries(
        command.options.map(({ name, value }) => [
          name,
          { type: value === undefined ? "boolean" : "string" } as const,
        ]),
      ),
    }));
  } catch (error) {
    const option = /'--?([\w-]+)/.exec(error instanceof Error ? error.message : "")?.[1] ?? "";
    const message = allowed.includes(option)
      ? `The option --${option} needs a value.`
      : `"--${option}" is not an option of ${command.name}; it has ${allowed.map((name) => `--${name}`).join(", ") || "none"}.`;
    return wrongUse(io, message, allowed.includes(option) ? "" : option, allowed, "--");
  }
  const empty = allowed.find((name) => values[name] === "");
  if (empty !== undefined) return wrongUse(io, `The option --${empty} needs a value.`, "", []);
  const { argument } = command;
  if (positionals.length > (argument === undefined ? 0 : 1)) {
    return wrongUse(io, `${command.name} does not take "${positionals.at(-1)}".`, "", []);
  }
  const given = positionals[0] ?? argument?.fallback ?? "";
  if (argument !== undefined && !argument.allowed.includes(given)) {
    return wrongUse(io, `"${given}" is not one of ${argument.allowed.join(", ")}.`, given, argument.allowed);
  }
  const options = Object.fromEntries(
    command.options.map(({ name, fallback }) => [name, String(values[name] ?? fallback ?? "")]),
  );
  return command.run({ options, argument: given }, io);
}

function wrongUse(io: Io, message: string, found: string, allowed: readonly string[], prefix = ""): number {
  const near = found === "" ? undefined : nearestWord(found, allowed);
  const suggestion = near === undefined ? "" : ` Did you mean "${prefix}${near}"?`;
  io.errors.write(`ringfolio: ${message}${suggestion}\nRun "ringfolio --help" for what there is.\n`);
  return EXIT.wrongUse;
}
