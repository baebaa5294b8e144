/** The part of Eleventy's programmatic interface that is used here; the package ships no types. */
declare module "@11ty/eleventy" {
  export interface EleventyConfig {
    on(event: string, handler: (event: never) => unknown): void;
    addGlobalData(name: string, value: unknown): void;
    addTemplate(path: string, template: (data: never) => string, data: Record<string, unknown>): void;
    addPassthroughCopy(paths: Record<string, string>): void;
    addWatchTarget(path: string): void;
    addPlugin(plugin: unknown, options?: unknown): void | Promise<void>;
    addTemplateFormats(format: string): void;
    setTemplateFormats(formats: readonly string[]): void;
    setDataFileSuffixes(suffixes: readonly string[]): void;
    setUseGitIgnore(use: boolean): void;
    setFrontMatterParsingOptions(options: Record<string, unknown>): void;
    setServerOptions(options: Record<string, unknown>): void;
    setServerPassthroughCopyBehavior(behaviour: string): void;
    setQuietMode(quiet: boolean): void;
  }
  export default class Eleventy {
    constructor(input: string, output: string, options: Record<string, unknown>);
    init(): Promise<void>;
    write(): Promise<unknown>;
    watch(): Promise<(path: string) => Promise<void>>;
    serve(port: number): Promise<void>;
    stopWatch(): Promise<void>;
    disableLogger(): void;
    watcher?: { on(event: string, handler: (path: string) => void): void };
  }
}
