/** Sets an ASCII number for reading: the hyphen before digits becomes the true minus sign. */
export function plainNumber(ascii: string): string {
  return ascii.replaceAll("-", "\u2212");
}
