/** What a scene's hand work gives: `expected.json`; values to three decimals, bands 63 Hz to 8 kHz in order. */
export interface HandScene {
  readonly figures: readonly { readonly key: string; readonly value: number; readonly unit: string }[];
  readonly terms: readonly HandTerms[];
  readonly shares: readonly {
    readonly rule: string;
    readonly activity: string;
    readonly item: string;
    readonly share: number;
  }[];
  readonly zones: readonly {
    readonly item: string;
    readonly printedM: number;
    readonly nearField: boolean;
    readonly crossings: readonly string[];
  }[];
  readonly notice: { readonly kind: string; readonly by: string; readonly reasons: readonly string[] };
}

export interface HandTerms {
  readonly activity: string;
  readonly item: string;
  readonly point: string;
  readonly powerDb: readonly number[];
  readonly controlLossDb: readonly number[];
  readonly divergenceDb: number;
  readonly airDb: readonly number[];
  readonly groundDb: readonly number[];
  readonly paths: readonly HandPath[];
  readonly levelDba: number;
}

export interface HandPath {
  readonly kind: "direct" | "over" | "left" | "right" | "left-then-over" | "right-then-over" | "through" | "reflected";
  /** What it passes, as the program names it. */
  readonly past: readonly string[];
  /** Terms of a reflected line. */
  readonly own?: {
    readonly divergenceDb: number;
    readonly airDb: readonly number[];
    readonly groundDb: readonly number[];
    readonly reflectionDb: readonly number[];
  };
  readonly screenDb: readonly number[];
  readonly capDb: readonly number[];
  readonly levelDb: readonly number[];
}
