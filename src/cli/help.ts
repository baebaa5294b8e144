import type { Command } from "./Command.ts";

const EXIT_CODES = `Exit codes
  0  done
  1  the content has errors; nothing was published
  2  wrong use of the command
  3  unexpected failure (add --debug for the details)
`;

/** What a newcomer reads first. */
export function generalHelp(commands: readonly Command[]): string {
  const width = Math.max(...commands.map(({ name }) => name.length)) + 2;
  return `ringfolio: conformational analysis dossiers of saturated six-membered rings, from Markdown files.

Use
  ringfolio <command> [options]

Commands
${commands.map(({ name, summary }) => `  ${name.padEnd(width)}${summary}`).join("\n")}

  ringfolio <command> --help tells more of each; ringfolio --version prints the version.

Start
  One Markdown file per compound stands at content/series/<series>/<file>.md and begins with
    ---
    code: AB-01
    name: trans-4-aminocyclohexan-1-ol
    structure: "N[C@H]1CC[C@H](O)CC1"
    ---
  "ringfolio check" tells whether it is right, "ringfolio build" writes the site to _site/.

${EXIT_CODES}`;
}

/** The help of one command. */
export function commandHelp(command: Command): string {
  const { argument } = command;
  const form = argument === undefined ? "" : ` [${argument.name}]`;
  const left = command.options.map(({ name, value }) => `--${name}${value === undefined ? "" : ` ${value}`}`);
  const width = Math.max(0, ...left.map((text) => text.length)) + 2;
  const options = command.options.map(
    ({ help, fallback }, i) =>
      `  ${left[i]!.padEnd(width)}${help}${fallback === undefined ? "" : ` (${fallback} when absent)`}`,
  );
  return [
    `ringfolio ${command.name}: ${command.summary}`,
    "",
    `Use\n  ringfolio ${command.name}${form}${command.options.length > 0 ? " [options]" : ""}`,
    "",
    command.details,
    "",
    ...(argument === undefined
      ? []
      : [`${argument.name}\n  ${argument.allowed.join(", ")} (${argument.fallback} when absent)`, ""]),
    ...(options.length === 0 ? [] : [`Options\n${options.join("\n")}`, ""]),
    EXIT_CODES,
  ].join("\n");
}
