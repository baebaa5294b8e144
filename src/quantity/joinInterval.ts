/**
 * Two end points already set for print, as one range: `94.1–95.7`.
 * A minus, `<` or `>` beside an en dash cannot be read, so those ranges take the word: `−1.2 to 3.4`.
 */
export function joinInterval(low: string, high: string): string {
  const clash = /^[\u2212<>-]/;
  const spelled = clash.test(low) || clash.test(high) || /\u00d7/.test(low + high);
  return spelled ? `${low}\u00a0to\u00a0${high}` : `${low}\u2013${high}`;
}
