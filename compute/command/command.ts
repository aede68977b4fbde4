/** Where the program stands. */
export interface Place {
  /** Folder of the program itself: templates, schema, content. */
  readonly root: string;
  /** File of the running bundle, which the site engine loads as well. */
  readonly bundle: string;
}

/** What a command leaves behind; text goes to the two streams at the end, in order. */
export interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

export interface Command {
  /** One line for the list of commands. */
  readonly summary: string;
  /** The whole help text, ending in a new line. */
  readonly help: string;
  readonly run: (args: readonly string[], place: Place) => Outcome | Promise<Outcome>;
}

/** A command line that cannot be read: what is wrong, and where to look. */
export function usage(name: string, problem: string): Outcome {
  const sentence = /[.?]$/.test(problem) ? problem : `${problem}.`;
  return { code: 1, out: "", err: `${name}: ${sentence} See npm run ${name} -- --help\n` };
}
