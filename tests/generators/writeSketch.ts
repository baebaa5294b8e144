import { bondsAt, hydrogensOn, otherEnd, type Sketch, type SketchBond } from "./Sketch.ts";
import type { SeededRandom } from "./seededRandom.ts";

/**
 * Writes a sketch as SMILES, from an atom and along branches that chance chooses. The mark of a centre is written
 * as it stands, so that it means another configuration when the order of writing is another one.
 */
export function writeSketch(sketch: Sketch, random: SeededRandom): string {
  // The first walk finds the bonds that close rings, the second one writes.
  const order = new Map<number, SketchBond[]>();
  const closing = new Map<SketchBond, number>();
  const seen = new Set<number>();
  const walk = (atom: number, via: SketchBond | null) => {
    seen.add(atom);
    const next = random.shuffle(bondsAt(sketch, atom)).filter((bond) => bond !== via);
    order.set(atom, next);
    for (const bond of next) {
      if (closing.has(bond)) continue;
      if (seen.has(otherEnd(bond, atom))) closing.set(bond, 0);
      else walk(otherEnd(bond, atom), bond);
    }
  };

  const free = Array.from({ length: 99 }, (_, index) => index + 1);
  const write = (atom: number): string => {
    const rings = order.get(atom)!.filter((bond) => closing.has(bond));
    const closed: number[] = [];
    const digits = rings.map((bond) => {
      const opened = closing.get(bond)!;
      const digit = opened === 0 ? free.shift()! : opened;
      if (opened === 0) closing.set(bond, digit);
      else closed.push(digit);
      return `${opened === 0 ? bond.symbol : ""}${digit > 9 ? `%${digit}` : digit}`;
    });
    // A digit is free again from the next atom on; `C11` would be legal and unkind.
    free.unshift(...closed);
    const branches = order
      .get(atom)!
      .filter((bond) => !closing.has(bond))
      .map((bond) => `${bond.symbol}${write(otherEnd(bond, atom))}`);
    const last = branches.pop() ?? "";
    return `${atomText(sketch, atom)}${digits.join("")}${branches.map((text) => `(${text})`).join("")}${last}`;
  };

  const first = random.whole(sketch.atoms.length);
  walk(first, null);
  return write(first);
}

function atomText(sketch: Sketch, index: number): string {
  const { symbol, bracket, sense } = sketch.atoms[index]!;
  if (sense === null && !bracket) return symbol;
  const [, element, charge] = /^(.*?)([+-]*)$/.exec(symbol)!;
  const hydrogens = hydrogensOn(sketch, index);
  const h = hydrogens === 0 ? "" : hydrogens === 1 ? "H" : `H${hydrogens}`;
  return `[${element}${sense ?? ""}${h}${charge}]`;
}
