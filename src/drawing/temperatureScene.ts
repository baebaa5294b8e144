import type { Dossier } from "../dossier/Dossier.ts";
import { formatTemperature } from "../quantity/formatTemperature.ts";
import { boundsOf } from "./boundsOf.ts";
import { curveLabels } from "./curveLabels.ts";
import { curveStyle } from "./curveStyle.ts";
import { describeTemperatures } from "./describeTemperatures.ts";
import type { FigureOptions } from "./FigureOptions.ts";
import { growBox } from "./growBox.ts";
import { MARGIN, MOST_CURVES } from "./measures.ts";
import { plotLine } from "./plotLine.ts";
import { plotText } from "./plotText.ts";
import type { Point, Scene, SceneItem } from "./Scene.ts";
import { tickValues } from "./tickValues.ts";

/** The plot's own area, px; axis text and curve labels stand outside it. */
const WIDTH = 300;
const HEIGHT = 190;
const TICK = 4;
const CURVE_WIDTH = 1.8;
const TINT = 0.15;
const PERCENT_TICKS = [0, 25, 50, 75, 100];

/** Populations against temperature with their 95 % bands, each curve labelled where it ends. */
export function temperatureScene(dossier: Dossier, _options: FigureOptions = {}): Scene {
  const rows = dossier.temperatures;
  const title = `Populations of ${dossier.name} against temperature`;
  const description = describeTemperatures(dossier);
  if (rows.length < 2) throw new RangeError(`${dossier.code} has no populations at several temperatures`);
  const [low, high] = [rows[0]!.temperature_K, rows.at(-1)!.temperature_K];
  const place = (temperature: number, population: number): Point => ({
    x: (WIDTH * (temperature - low)) / (high - low),
    y: HEIGHT * (1 - population),
  });
  const drawn = dossier.conformers.slice(0, MOST_CURVES);
  const series = drawn.map((conformer, index) => {
    const values = rows.flatMap((row) => {
      const found = row.populations.find((each) => each.conformer === conformer.id);
      return found === undefined ? [] : [{ temperature: row.temperature_K, ...found }];
    });
    return { conformer, values, style: curveStyle(drawn, index) };
  });
  const bands = series.map(({ conformer, values, style }): SceneItem => {
    const upper = values.map((value) => place(value.temperature, value.population95[1]));
    const lower = values.map((value) => place(value.temperature, value.population95[0])).reverse();
    return {
      ...shape([...upper, ...lower], "band", conformer.id),
      closed: true,
      ink: style.ink,
      opacity: TINT,
    };
  });
  const curves = series.map(
    ({ conformer, values, style }): SceneItem => ({
      ...shape(
        values.map((value) => place(value.temperature, value.population)),
        "curve",
        conformer.id,
      ),
      closed: false,
      ink: style.ink,
      opacity: 1,
      width: CURVE_WIDTH,
      dash: style.dash,
    }),
  );
  const ends = series.flatMap(({ conformer, values, style }) => {
    const end = values.at(-1);
    return end === undefined
      ? []
      : [{ conformer, at: place(end.temperature, end.population), ink: style.ink }];
  });
  const own = dossier.conditions.temperature_K;
  const marked =
    own < low || own > high
      ? []
      : [
          plotLine(place(own, 0), place(own, 1), "reference line", { ink: "muted" }),
          plotText(formatTemperature(own), { x: place(own, 1).x, y: -10 }, "middle", "reference label", {
            ink: "muted",
          }),
        ];
  const items: readonly SceneItem[] = [
    ...bands,
    plotLine(place(low, 0.5), place(high, 0.5), "reference line", { ink: "muted", dash: [1, 3] }),
    ...marked,
    ...axes(place, low, high),
    ...curves,
    ...curveLabels(ends, { left: WIDTH + 10, top: 0, bottom: HEIGHT }),
  ];
  return { title, description, bounds: growBox(boundsOf(items)!, MARGIN), items };
}

function axes(
  place: (temperature: number, population: number) => Point,
  low: number,
  high: number,
): readonly SceneItem[] {
  const temperatures = tickValues(low, high, 6).flatMap((value): SceneItem[] => {
    const { x, y } = place(value, 0);
    return [
      plotLine({ x, y }, { x, y: y + TICK }, "axis"),
      plotText(String(value), { x, y: y + 14 }, "middle", "tick label"),
    ];
  });
  const percents = PERCENT_TICKS.flatMap((value): SceneItem[] => {
    const { x, y } = place(low, value / 100);
    return [
      plotLine({ x: x - TICK, y }, { x, y }, "axis"),
      plotText(String(value), { x: x - 8, y }, "end", "tick label"),
    ];
  });
  return [
    plotLine(place(low, 0), place(high, 0), "axis"),
    plotLine(place(low, 0), place(low, 1), "axis"),
    ...temperatures,
    ...percents,
    plotText("Population / %", { x: -30, y: -26 }, "start", "axis title"),
    plotText("Temperature / K", { x: WIDTH, y: HEIGHT + 34 }, "end", "axis title"),
  ];
}

function shape(points: readonly Point[], part: "band" | "curve", group: string) {
  return { kind: "polygon", part, atoms: [], group, points, width: 0, dash: [] } as const;
}
