import type { Dossier } from "../dossier/Dossier.ts";
import { formatPopulation } from "../quantity/formatPopulation.ts";
import { boundsOf } from "./boundsOf.ts";
import { conformerLabelRuns } from "./conformerLabelRuns.ts";
import { growBox } from "./growBox.ts";
import { labelRuns } from "./labelRuns.ts";
import { CAP_HEIGHT, MARGIN, SMALL_SIZE } from "./measures.ts";
import { placeText } from "./placeText.ts";
import { plotLine } from "./plotLine.ts";
import { plotText } from "./plotText.ts";
import type { Scene, SceneItem } from "./Scene.ts";

const WIDTH = 230;
const ROW = 22;
const TICK = 4;
const DOT = 4;
const PERCENT_TICKS = [0, 25, 50, 75, 100];
const LONGEST = 130;

/**
 * The population of each compound's major conformer with its 95 % interval, one row a compound in the order
 * given. A hollow dot says that the major conformer is unresolved.
 */
export function seriesScene(dossiers: readonly Dossier[]): Scene {
  const bottom = dossiers.length * ROW;
  const x = (population: number) => WIDTH * population;
  const ticks = PERCENT_TICKS.flatMap((value): SceneItem[] => [
    plotLine({ x: x(value / 100), y: bottom }, { x: x(value / 100), y: bottom + TICK }, "axis"),
    plotText(String(value), { x: x(value / 100), y: bottom + 14 }, "middle", "tick label"),
  ]);
  const rows = dossiers.flatMap((dossier, index) => row(dossier, (index + 0.5) * ROW, x));
  const items: readonly SceneItem[] = [
    plotLine({ x: x(0.5), y: 0 }, { x: x(0.5), y: bottom }, "reference line", { ink: "muted", dash: [1, 3] }),
    plotLine({ x: 0, y: bottom }, { x: WIDTH, y: bottom }, "axis"),
    ...ticks,
    ...rows,
    plotText(
      "Population of the major conformer / %",
      { x: WIDTH / 2, y: bottom + 34 },
      "middle",
      "axis title",
    ),
  ];
  return {
    title: "Population of the major conformer of each compound",
    description: describe(dossiers),
    bounds: growBox(boundsOf(items)!, MARGIN),
    items,
  };
}

function row(dossier: Dossier, y: number, x: (population: number) => number): readonly SceneItem[] {
  const code = plotText(dossier.code, { x: -12, y }, "end", "row label");
  const guide = plotLine({ x: 0, y }, { x: WIDTH, y }, "axis", { ink: "rule" });
  const [major] = dossier.conformers;
  if (major === undefined) {
    return [
      guide,
      code,
      plotText("not analysed", { x: WIDTH + 12, y }, "start", "row label", { ink: "muted" }),
    ];
  }
  const [low, high] = major.population95;
  const unresolved = dossier.equilibria.some((each) => each.unresolved);
  const interval =
    high > low ? [plotLine({ x: x(low), y }, { x: x(high), y }, "interval", { width: 2 })] : [];
  const words = conformerLabelRuns(major.label, SMALL_SIZE);
  const last = words.at(-1);
  const fits = last !== undefined && last.x + last.width <= LONGEST;
  const name = placeText(fits ? words : labelRuns(major.id, { size: SMALL_SIZE, ink: "ink" }), {
    at: { x: WIDTH + 12, y: y + (CAP_HEIGHT * SMALL_SIZE) / 2 },
    anchor: "start",
    part: "row label",
    group: dossier.code,
  });
  return [
    guide,
    code,
    ...interval,
    {
      kind: "arc",
      part: "dot",
      atoms: [],
      group: dossier.code,
      centre: { x: x(major.population), y },
      radius: DOT,
      startAngle: 0,
      endAngle: 360,
      width: 1.5,
      ink: "ink",
      dash: [],
      fill: unresolved ? "paper" : "ink",
    },
    name,
  ];
}

function describe(dossiers: readonly Dossier[]): string {
  const sentences = dossiers.map((dossier) => {
    const [major] = dossier.conformers;
    if (major === undefined) return `${dossier.code}: not analysed.`;
    const doubt = dossier.equilibria.some((each) => each.unresolved) ? ", major conformer unresolved" : "";
    return `${dossier.code}: ${formatPopulation(major.population, major.population95)}${doubt}.`;
  });
  return ["Population of the major conformer with its 95 % interval.", ...sentences].join(" ");
}
