import { clipSegment } from "../../src/drawing/clipSegment.ts";
import type { Box, Part, Scene, SceneItem, SceneLine, SceneText } from "../../src/drawing/Scene.ts";

/** The lines of a scene that stand for one of the given parts. */
export const linesOf = (scene: Scene, ...parts: readonly Part[]): readonly SceneLine[] =>
  scene.items.filter((item): item is SceneLine => item.kind === "line" && parts.includes(item.part));

/** The texts of a scene, or those that stand for one of the given parts. */
export const textsOf = (scene: Scene, ...parts: readonly Part[]): readonly SceneText[] =>
  scene.items.filter(
    (item): item is SceneText => item.kind === "text" && (parts.length === 0 || parts.includes(item.part)),
  );

export const wordsOf = (item: SceneItem): string =>
  item.kind === "text" ? item.runs.map((run) => run.text).join("") : "";

/** Direction of a line in degrees, 0 to the right, 90 upwards. */
export const directionOf = ({ from, to }: SceneLine): number =>
  (Math.atan2(from.y - to.y, to.x - from.x) * 180) / Math.PI;

/** Angle between two directions regardless of sense, 0° to 90°. */
export function between(a: number, b: number): number {
  const difference = Math.abs(a - b) % 180;
  return Math.min(difference, 180 - difference);
}

export const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** Labels that touch each other or a line, in words; none in a good drawing. */
export function collisions(scene: Scene): readonly string[] {
  const texts = textsOf(scene);
  const lines = scene.items.filter((item): item is SceneLine => item.kind === "line");
  const found: string[] = [];
  for (const [index, text] of texts.entries()) {
    for (const other of texts.slice(0, index)) {
      if (overlap(text.box, other.box)) found.push(`${wordsOf(other)} on ${wordsOf(text)}`);
    }
    for (const line of lines) {
      if (clipSegment(line.from, line.to, text.box) !== null) {
        found.push(`${text.part} ${wordsOf(text)} on ${line.part} ${line.atoms.join("-")}`);
      }
    }
  }
  return found;
}
