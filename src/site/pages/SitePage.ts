/** One file of the site that is made rather than copied. */
export interface SitePage {
  /** Path inside the site with forward slashes, made of validated slugs only. */
  readonly path: string;
  /** The whole text; pure, and the same every time. */
  readonly render: () => string;
}
