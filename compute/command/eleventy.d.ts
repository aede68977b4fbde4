declare module "@11ty/eleventy" {
  /** The part of the site engine that the build uses; the package ships no types. */
  export default class Eleventy {
    constructor(input: string, output: string, options: { configPath: string; quietMode: boolean });
    disableLogger(): void;
    write(): Promise<unknown>;
  }
}
