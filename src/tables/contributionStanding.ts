import type { Contribution } from "../dossier/Dossier.ts";
import type { CellStanding } from "./TableModel.ts";

/**
 * Mark and words for what a contribution rests on. A register row that a curator judged is an estimate
 * although it is published in the register, and a stand-in never looks like a value somebody found.
 */
export function contributionStanding(contribution: Pick<Contribution, "basis" | "standing">): {
  readonly standing: CellStanding;
  readonly words: string;
} {
  switch (contribution.basis) {
    case "computed":
      return { standing: "computed", words: "computed" };
    case "not available":
      return { standing: "estimated", words: "not available, stand-in" };
    case "published":
      return publishedStanding(contribution.standing);
  }
}

function publishedStanding(standing: Contribution["standing"]): ReturnType<typeof contributionStanding> {
  if (standing === "estimate") return { standing: "estimated", words: "estimated" };
  return { standing: "published", words: standing === "memory" ? "published, from memory" : "published" };
}
