/** Tells how far a long command is: one line that renews itself on a terminal, plain lines in a pipe. */
export interface Progress {
  readonly tell: (text: string) => void;
  /** Clears the line on a terminal, so that the outcome stands alone. */
  readonly done: () => void;
}

/** A progress line on a stream, standard error unless another is given. */
export function progressOn(stream: Pick<NodeJS.WriteStream, "isTTY" | "write"> = process.stderr): Progress {
  if (stream.isTTY) return { tell: (text) => stream.write(`\r\x1b[K${text}`), done: () => stream.write("\r\x1b[K") };
  return { tell: (text) => stream.write(`${text}\n`), done: () => undefined };
}
