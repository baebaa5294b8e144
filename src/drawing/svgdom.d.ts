/** svgdom ships no types; only the two things used are declared. */
declare module "svgdom" {
  interface SvgDocument {
    readonly documentElement: unknown;
  }
  export function createSVGWindow(): { readonly document: SvgDocument };
}
