import type { ContentPath } from "../parseFrontMatter.ts";
import { quote } from "../values/quote.ts";
import { keyName } from "./keyName.ts";

/** Why a key is wrong where it stands, and which keys it may have been meant for. */
export function explainKey(
  path: ContentPath,
  key: string,
  allowed: readonly string[],
): { readonly code: string; readonly message: string; readonly candidates: readonly string[] } {
  const list = allowed.map((word) => `\`${word}\``).join(", ");
  if (path.at(-1) === "groups") {
    return {
      code: "wrong-locant",
      message: `${quote(key)} is not a locant of a six-membered ring; locants are 1 to 6.`,
      candidates: /^\d+$/.test(key) ? [] : allowed,
    };
  }
  if (path.at(-2) === "groups") {
    return {
      code: "wrong-face",
      message: `${quote(key)} is not a face of the ring; a group stands \`up\` or \`down\`.`,
      candidates: allowed,
    };
  }
  const colon = key.includes(":") ? " A colon must be followed by a space." : "";
  return {
    code: "unknown-key",
    message: `The key ${quote(key)} is not known${path.length === 0 ? "" : ` in ${keyName(path)}`}. Allowed: ${list}.${colon}`,
    candidates: allowed,
  };
}
