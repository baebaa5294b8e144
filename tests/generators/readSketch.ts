import type { Sketch, SketchAtom, SketchBond } from "./Sketch.ts";

const TOKEN = /\[([^\]]+)\]|(Cl|Br|Si|[BCNOPSFI]|[cnos])|([-=#])|(\()|(\))|(\d)/y;

/** Reads the plain SMILES of a skeleton or group: branches and ring digits, no marks of stereochemistry. */
export function readSketch(text: string): Sketch {
  const atoms: SketchAtom[] = [];
  const bonds: SketchBond[] = [];
  const branches: number[] = [];
  const open = new Map<string, { atom: number; symbol: SketchBond["symbol"] }>();
  let last: number | null = null;
  let symbol: SketchBond["symbol"] = "";
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const found = TOKEN.exec(text);
    if (found === null) throw new Error(`${text} is more than a sketch can hold`);
    const [, bracketed, plain, bond, opening, closing, digit] = found;
    if (bracketed !== undefined || plain !== undefined) {
      atoms.push({ symbol: bracketed ?? plain!, bracket: bracketed !== undefined, sense: null });
      if (last !== null) bonds.push({ from: last, to: atoms.length - 1, symbol });
      last = atoms.length - 1;
      symbol = "";
    } else if (bond !== undefined) {
      symbol = bond as SketchBond["symbol"];
    } else if (opening !== undefined) {
      branches.push(last!);
    } else if (closing !== undefined) {
      last = branches.pop()!;
    } else if (open.has(digit!)) {
      const start = open.get(digit!)!;
      open.delete(digit!);
      bonds.push({ from: start.atom, to: last!, symbol: symbol === "" ? start.symbol : symbol });
      symbol = "";
    } else {
      open.set(digit!, { atom: last!, symbol });
      symbol = "";
    }
  }
  return { atoms, bonds };
}
