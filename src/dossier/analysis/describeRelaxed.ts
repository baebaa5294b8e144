import type { Arrangement } from "../../conformers/enumerateConformers.ts";
import { type Place, puckering } from "../../conformers/puckering.ts";
import type { RelaxedConformer } from "../../conformers/relaxConformer.ts";
import { nearestShape } from "../../conformers/ringShape.ts";
import { torsionAngle } from "../../conformers/torsionAngle.ts";
import { bondBetween, type Molecule } from "../../structure/Molecule.ts";
import type { AnalysedRing } from "../../structure/StructureAnalysis.ts";
import type { RelaxedGeometry, RingPuckering } from "../Dossier.ts";

/** A relaxed conformer as the Dossier records it: rounded coordinates, and each ring's shape in numbers. */
export function describeRelaxed(
  { molecule, chairs }: Arrangement,
  relaxed: RelaxedConformer,
): RelaxedGeometry {
  const at = (i: number): Place => ({
    x: relaxed.coordinates[3 * i]!,
    y: relaxed.coordinates[3 * i + 1]!,
    z: relaxed.coordinates[3 * i + 2]!,
  });
  return {
    method: relaxed.method,
    atoms: relaxed.points.map(({ element, atom }, i) => ({ element, atom, ...at(i) })),
    rotamers: relaxed.rotamers.map(({ torsions, energy_kJ_mol }) => ({
      torsions: torsions.map(({ atoms, degrees }) => ({ atoms: [...atoms], degrees })),
      energy_kJ_mol: Math.round(energy_kJ_mol * 1e3) / 1e3 + 0,
    })),
    puckering: chairs.map(({ ring }) => describeShape(molecule, ring, at)),
  };
}

function describeShape(molecule: Molecule, ring: AnalysedRing, at: (atom: number) => Place): RingPuckering {
  const sugar = sugarOrder(molecule, ring);
  // From locant 1 in the direction of rising locants, or from the ring oxygen where the ring has sugar numbering.
  const order = sugar ?? [1, 2, 3, 4, 5, 6].map((locant) => ring.atoms[ring.locants.indexOf(locant)]!);
  const places = order.map(at);
  const { Q, theta, phi } = puckering(places);
  const { shape, distance } = nearestShape(theta, phi);
  const round = (value: number, digits: number) => Math.round(value * 10 ** digits) / 10 ** digits + 0;
  return {
    ring: ring.index,
    locants: order.map((atom) => ring.names[ring.atoms.indexOf(atom)]!),
    torsions_deg: places.map((_, k) => {
      const next = (step: number) => places[(k + step + 6) % 6]!;
      return round(torsionAngle(next(-1), next(0), next(1), next(2)), 1);
    }),
    Q_A: round(Q, 3),
    theta_deg: round(theta, 1),
    phi_deg: phi === null ? null : round(phi, 1),
    symbol: sugar === null ? null : sugarSymbol(molecule, ring, sugar[1]!, shape.symbol),
    nearest: shape.word,
    distance_deg: round(distance, 1),
  };
}

/**
 * The symbol with the locants of the sugar. The anomeric carbon is C1 in an aldose and C2 in a ketose, where it
 * carries one more carbon (2-Carb-2; from memory): β-D-fructopyranose is ^2C_5. Behind a longer chain its locant is not
 * known from the ring alone, and there is no symbol. The choice of plane goes by order, so that the shift keeps it.
 */
function sugarSymbol(
  molecule: Molecule,
  ring: AnalysedRing,
  anomeric: number,
  symbol: string,
): string | null {
  const carbonsOf = (atom: number) =>
    molecule.atoms[atom]!.neighbours.filter((n) => molecule.atoms[n]!.element === "C");
  const chain = carbonsOf(anomeric).filter((n) => !ring.atoms.includes(n));
  if (chain.length === 0) return symbol;
  const single = chain.length === 1 && carbonsOf(chain[0]!).length === 1;
  return single ? symbol.replaceAll(/[1-5]/g, (digit) => String(Number(digit) + 1)) : null;
}

/**
 * Ring oxygen, then the five carbons from the anomeric one, where an oxane ring is a pyranose: just one of the two carbons
 * beside the oxygen, the anomeric one, carries another heteroatom (2-Carb-5; from memory).
 */
function sugarOrder(molecule: Molecule, ring: AnalysedRing): readonly number[] | null {
  if (ring.parent !== "oxane") return null;
  const oxygen = ring.elements.indexOf("O");
  const walk = (step: 1 | -1) => [0, 1, 2, 3, 4, 5].map((k) => ring.atoms[(oxygen + step * k + 6) % 6]!);
  const isAnomeric = (atom: number) =>
    molecule.atoms[atom]!.neighbours.some(
      (n) =>
        !ring.atoms.includes(n) &&
        ["O", "N", "S", "F", "Cl", "Br", "I"].includes(molecule.atoms[n]!.element) &&
        bondBetween(molecule, atom, n)!.order === 1,
    );
  const choices = ([1, -1] as const).map(walk).filter((order) => isAnomeric(order[1]!));
  return choices.length === 1 ? choices[0]! : null;
}
