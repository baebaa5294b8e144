/** A conformer's id, upright; only letters and digits pass. */
export function texConformer(id: string): string {
  return `\\mathrm{${id.replace(/[^A-Za-z0-9]/g, "")}}`;
}
