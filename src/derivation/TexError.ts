/** A formula that cannot be set; `position` counts from 0 in the formula, null when KaTeX gives none. */
export class TexError extends Error {
  readonly position: number | null;

  constructor(message: string, position: number | null) {
    super(message);
    this.name = "TexError";
    this.position = position;
  }
}
