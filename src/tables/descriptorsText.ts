import type { Identity } from "../dossier/Dossier.ts";

/** CIP descriptors as in a name: `(1S,3R)`; open centres are named as such, and a dash says that there are none. */
export function descriptorsText({ stereocentres, stereobonds }: Identity): string {
  const centres = [...stereocentres]
    .sort((a, b) => rank(a.locant) - rank(b.locant) || a.atom - b.atom)
    .map(({ locant, descriptor }) => `${locant ?? ""}${descriptor === "unspecified" ? "?" : descriptor}`);
  const bonds = stereobonds.map(({ descriptor }) => (descriptor === "unspecified" ? "?" : descriptor));
  const all = [...centres, ...bonds];
  if (all.length === 0) return "\u2013";
  const open = all.some((text) => text.endsWith("?")) ? ", ? not specified" : "";
  return `(${all.join(",")})${open}`;
}

/** Orders locants as printed, `2` before `10` before `1′`; centres outside analysed rings come last. */
function rank(locant: string | null): number {
  if (locant === null) return Number.MAX_SAFE_INTEGER;
  const primes = locant.length - locant.replace(/\u2032/g, "").length;
  return primes * 1000 + Number.parseInt(locant, 10);
}
