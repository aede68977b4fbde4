import { readFile } from "node:fs/promises";
import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import path from "node:path";

/** A running server of one folder. */
export interface SiteServer {
  /** Address of the folder, with a slash at its end. */
  readonly address: string;
  readonly close: () => Promise<void>;
}

const KINDS: Readonly<Record<string, string>> = {
  ".html": "text/html; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".svg": "image/svg+xml",
  ".woff2": "font/woff2",
  ".json": "application/json",
  ".csv": "text/csv; charset=utf-8",
};

/** Serves the files of a folder to this machine alone, by their names and nothing else. */
export async function serveSite(folder: string): Promise<SiteServer> {
  const server = createServer(async (request, response) => {
    const name = decodeURIComponent(new URL(request.url ?? "/", "http://localhost").pathname);
    const file = path.join(folder, path.posix.normalize(name));
    const body = await readFile(file).catch(() => undefined);
    response.writeHead(body ? 200 : 404, { "content-type": KINDS[path.extname(file)] ?? "application/octet-stream" });
    response.end(body);
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const { port } = server.address() as AddressInfo;
  return {
    address: `http://127.0.0.1:${port}/`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}
