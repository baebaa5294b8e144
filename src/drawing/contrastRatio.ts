/**
 * Contrast of two colours, from 1 to 21: (L1 + 0.05) / (L2 + 0.05) with the relative luminance L of the lighter
 * and the darker one (WCAG 2.2, definitions of contrast ratio and relative luminance).
 *
 * @param a - `#rrggbb`, sRGB.
 * @param b - `#rrggbb`, sRGB.
 */
export function contrastRatio(a: string, b: string): number {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

function luminance(colour: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}
