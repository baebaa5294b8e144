import type { Dossier, RingSystem } from "../dossier/Dossier.ts";
import type { ChairView } from "./ChairView.ts";
import { isFused } from "./isFused.ts";
import { layChair } from "./layChair.ts";
import { BOND } from "./measures.ts";
import { placeSystem } from "./placeSystem.ts";
import type { RingCamera } from "./RingCamera.ts";
import { ringAxis } from "./ringAxis.ts";
import type { SystemBody } from "./SystemBody.ts";
import { dot } from "./Vector.ts";
import { viewCost } from "./viewCost.ts";
import { viewSystem } from "./viewSystem.ts";

const ELEVATIONS = [14, 20, 26];
const AZIMUTHS = [7, 10, 14, 20, -7, -10, -14, -20];
/** Prices of departing from the plain camera: for each degree, and for stepping to the other side. */
const DEGREE = 0.25;
const OTHER_SIDE = 2;
/** Price of a leading ring that is no chair in every conformer, and of every ring that does not stand as it does. */
const NO_CHAIR = 3;
const TILTED = 2;
/** Cosine of the angle up to which two axes stand alike. */
const ALIKE = 0.97;
/**
 * Price of an angular group that hangs down, of a bridge below the ring it spans, and of a system that runs into the
 * depth or upwards rather than sideways, by the ratio of its extents.
 */
const HANGING = 4;
const BRIDGE_BELOW = 6;
const DEEP = 8;
const TALL = 4;
/**
 * Price of rings or locants on the side where they are not looked for; for rings, times the cube of the number of rings
 * after the first: the more rings, the more fixed is the picture that readers know.
 */
const WRONG_SIDE = 4;
/** Rings this near to the middle, px, are on neither side. */
const EVEN = 0.1 * BOND;
/** Conformers that are looked at, and those of which the best cameras' labels are laid out. */
const JUDGED = 6;
const LAID_OUT = 4;
/** Cameras whose labels are laid out. */
const SHORT_LIST = 10;

/**
 * The camera of a system of several rings. Each of its rings may lead, with either face above and any atom at the right
 * end, from a few azimuths and elevations; the bonds alone decide which few of these are worth laying out labels
 * for, and of those the least crowded drawing over all conformers is taken.
 */
export function chooseSystemCamera(dossier: Dossier, system: RingSystem, hydrogens: boolean): RingCamera {
  const judged = dossier.conformers
    .slice(0, JUDGED)
    .map((conformer) => placeSystem(dossier, conformer, system, hydrogens));
  const choices = cameras(system).flatMap((camera) => {
    const upright = judged.map((body) => viewSystem(body, camera));
    // Turned over, the drawing is the same one upside down: only what the trade is used to tells the two apart.
    const seen = mean(upright.map((view) => viewCost(view) + stanceCost(view))) + cameraCost(camera, judged);
    const over: RingCamera = { ...camera, above: "down" };
    const turned = judged.map((body) => viewSystem(body, over));
    return [
      { camera, cost: seen + mean(upright.map(customCost)), views: upright },
      { camera: over, cost: seen + mean(turned.map(customCost)), views: turned },
    ];
  });
  const listed = best(choices, SHORT_LIST).map(({ camera, cost, views }) => ({
    camera,
    cost: cost + mean(views.slice(0, LAID_OUT).map((view) => layChair(view).cost)),
  }));
  return best(listed, 1)[0]!.camera;
}

function cameraCost({ lead, azimuth, elevation }: RingCamera, judged: readonly SystemBody[]): number {
  const chairs = judged.every(({ analysed }) => analysed.find((each) => each.ring === lead)?.isChair);
  return (
    DEGREE * (Math.abs(azimuth) - AZIMUTHS[0]! + elevation - ELEVATIONS[0]!) +
    (azimuth < 0 ? OTHER_SIDE : 0) +
    (chairs ? 0 : NO_CHAIR)
  );
}

function cameras(system: RingSystem): readonly RingCamera[] {
  return system.rings.flatMap((lead) =>
    [0, 1, 2, 3, 4, 5].flatMap((rightEnd) =>
      AZIMUTHS.flatMap((azimuth) =>
        ELEVATIONS.map((elevation): RingCamera => ({ lead, above: "up", rightEnd, azimuth, elevation })),
      ),
    ),
  );
}

/**
 * What the trade is used to: angular groups up; five-membered and other rings that are not six-membered to the right, as
 * in steroids and hydrindanes, else the lowest locants to the left.
 */
function customCost(view: ChairView): number {
  const angular = view.branches.filter(
    (branch) => branch.atom !== null && isFused(branch.vertex, view.rings),
  );
  const hanging = angular.filter((branch) => branch.end.y > view.vertices[branch.vertex]!.at.y).length;
  const middle = (vertices: readonly number[]) => mean(vertices.map((vertex) => view.vertices[vertex]!.at.x));
  const odd = view.rings.filter((ring) => ring.length !== 6).flat();
  const low = view.vertices.flatMap(({ locant }, index) => (/^[12]$/.test(locant) ? [index] : []));
  const wrong =
    odd.length > 0
      ? (middle(odd) < -EVEN ? 1 : 0) * (view.rings.length - 1) ** 3
      : low.length > 0 && middle(low) > EVEN
        ? 1
        : 0;
  return (
    (angular.length === 0 ? 0 : (HANGING * hanging) / angular.length) +
    WRONG_SIDE * wrong +
    (hasBridgeBelow(view) ? BRIDGE_BELOW : 0)
  );
}

/** Whether the atoms of a bridged system that are not in its leading ring stand below that ring. */
function hasBridgeBelow({ vertices, rings, lead }: ChairView): boolean {
  const leading = rings[lead]!;
  const bridging = rings.some(
    (ring, index) => index !== lead && ring.filter((vertex) => leading.includes(vertex)).length > 2,
  );
  const height = (ring: readonly number[]) => mean(ring.map((vertex) => vertices[vertex]!.at.y));
  const others = [...vertices.keys()].filter((vertex) => !leading.includes(vertex));
  return bridging && height(others) > height(leading);
}

/**
 * How far a system runs into the depth of the drawing and upwards, compared with its width, where rings stand one behind
 * the other or look unlike chairs; and how many of its rings do not stand as the leading one does.
 */
function stanceCost({ vertices, rings, lead }: ChairView): number {
  const spread = (values: readonly number[]) => {
    const middle = mean(values);
    return Math.sqrt(mean(values.map((value) => (value - middle) ** 2)));
  };
  const width = spread(vertices.map(({ at }) => at.x)) + 1;
  const depth = spread(vertices.map(({ at }) => at.depth));
  const height = spread(vertices.map(({ at }) => at.y));
  const axes = rings.map((ring) =>
    ringAxis(ring.map((vertex) => vertices[vertex]!.at).map(({ x, y, depth: z }) => ({ x, y, z }))),
  );
  const tilted = axes.filter((axis) => Math.abs(dot(axis, axes[lead]!)) < ALIKE).length;
  return (DEEP * depth + TALL * height) / width + TILTED * tilted;
}

function best<Choice extends { readonly cost: number }>(choices: readonly Choice[], count: number): Choice[] {
  // The list is in a fixed order and the sort is stable, so that equal costs keep it.
  const rounded = (cost: number) => Math.round(cost * 1e4);
  return [...choices].sort((a, b) => rounded(a.cost) - rounded(b.cost)).slice(0, count);
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
