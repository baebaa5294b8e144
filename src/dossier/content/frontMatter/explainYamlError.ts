import type { ErrorCode } from "yaml";

/** A parser's complaint in an author's words. */
export interface YamlExplanation {
  readonly code: "broken-yaml" | "duplicate-key" | "two-groups-one-face" | "forbidden-tag";
  readonly message: string;
  readonly suggestion?: string;
  /** True when what follows in the file can still be trusted. */
  readonly local: boolean;
}

const broken = (message: string, suggestion?: string): YamlExplanation => ({
  code: "broken-yaml",
  message,
  ...(suggestion === undefined ? {} : { suggestion }),
  local: false,
});

const UNCLOSED_BRACKET = broken(
  "A bracket or brace is opened here and not closed, or a comma is missing between two items.",
);
const DIRECTIVE_LINE = broken("A line of front matter cannot begin with a percent sign.");
const OTHER = broken("This line is not valid YAML; check quotation marks, brackets, colons and indentation.");

/**
 * Puts a YAML parser's message into plain words.
 * @param code - the parser's own code.
 * @param text - the parser's message, used only to tell cases apart.
 * @param line - the source line that holds the error.
 * @param found - the text at the error.
 */
export function explainYamlError(
  code: ErrorCode,
  text: string,
  line: string,
  found: string,
): YamlExplanation {
  const bareBracket = /^(\s*(?:- )?[\w-]+:\s+)(\[[^\]]*\]\S.*)$/.exec(line);
  if (bareBracket !== null && code !== "DUPLICATE_KEY") {
    const value = bareBracket[2]!.trim();
    return broken(
      "A value that begins with a square bracket is read as a list; put a SMILES in quotation marks.",
      value.includes("'") ? undefined : `'${value}'`,
    );
  }
  switch (code) {
    case "DUPLICATE_KEY":
      return found === "up" || found === "down"
        ? {
            code: "two-groups-one-face",
            message: `The face \`${found}\` stands here a second time; one face of a ring atom carries one group.`,
            local: true,
          }
        : {
            code: "duplicate-key",
            message: `The key \`${found}\` stands here a second time; keep one of the two.`,
            local: true,
          };
    case "TAG_RESOLVE_FAILED":
      return {
        code: "forbidden-tag",
        message:
          "Tags (words after an exclamation mark) are not allowed: front matter is data, and nothing in it is run.",
        local: true,
      };
    case "BAD_DQ_ESCAPE":
      return broken(
        "In double quotation marks a backslash begins an escape; put the text in single quotation marks instead.",
      );
    case "TAB_AS_INDENT":
      return broken("A tab is used for indentation; YAML is indented with spaces only.");
    case "NON_STRING_KEY":
    case "BLOCK_IN_FLOW":
      return broken("A key must be plain text, and a block of keys cannot stand inside brackets or braces.");
    case "BAD_ALIAS":
    case "ALIAS_PROPS":
      return broken("A value that begins with * is read as an alias; put the text in quotation marks.");
    case "BAD_SCALAR_START":
      return broken("A value cannot begin with this character; put the text in quotation marks.");
    case "BAD_INDENT":
      if (/flow|end with/i.test(text)) return UNCLOSED_BRACKET;
      return broken(
        "The indentation does not fit the lines above: keys of one group must begin in the same column.",
      );
    case "MULTIPLE_DOCS":
      return broken("The front matter holds more than one YAML document (a line of dots ends the first).");
    case "RESOURCE_EXHAUSTION":
      return broken("Lists or keys are nested too deeply.");
    case "BLOCK_AS_IMPLICIT_KEY":
      return broken(
        "A second colon stands in this value. Put text that holds a colon and a space in quotation marks, or mend " +
          "the indentation if another key was meant.",
      );
    case "MISSING_CHAR":
      if (/quote/.test(text)) return broken("A quotation mark is opened and not closed.");
      if (/Implicit map keys/.test(text))
        return broken("A key must be followed by a colon and a space, then its value.");
      if (/flow|, items|expected to end|Missing ,/i.test(text)) {
        return UNCLOSED_BRACKET;
      }
      if (/directives-end/.test(text)) return DIRECTIVE_LINE;
      return broken("A punctuation mark is missing here.");
    case "MULTILINE_IMPLICIT_KEY":
      return broken("A key must stand on one line and be followed by a colon.");
    case "BAD_DIRECTIVE":
      return DIRECTIVE_LINE;
    case "UNEXPECTED_TOKEN":
      if (/^\s*[\w-]+:\s+- /.test(line)) return broken("A list begins on a line of its own below its key.");
      if (/:\s+['"]/.test(line)) {
        return broken(
          "Text follows a closing quotation mark; write a quotation mark inside quoted text twice, or use the other kind around it.",
        );
      }
      return OTHER;
    default:
      return OTHER;
  }
}
