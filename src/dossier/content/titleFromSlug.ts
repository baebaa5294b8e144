/** A title for a series whose file gives none: its folder name with spaces and a capital. */
export function titleFromSlug(slug: string): string {
  const words = slug.replace(/[-_]+/g, " ").trim();
  return words === "" ? "Series" : words.charAt(0).toUpperCase() + words.slice(1);
}
