import { boundsOf } from "./boundsOf.ts";
import type { ConformerBlock } from "./conformerBlock.ts";
import type { Box } from "./Scene.ts";

/** The room a conformer takes across, chairs and words together; only left and right mean anything. */
export function blockColumn(block: ConformerBlock): Box {
  return boundsOf([...block.chairs, ...block.words])!;
}
