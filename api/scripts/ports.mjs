import { createServer } from "node:net";
import { Trouble } from "./project.mjs";

/** True where nobody listens on the port of this host. */
export function isFree(port, host = "127.0.0.1") {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once("error", () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** A port on which nobody listens. */
export function freePort(host = "127.0.0.1") {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once("error", reject);
    probe.listen(0, host, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}

/** The port asked for, or where none was, the first free one from the usual port on. */
export async function choosePort(asked, usual, host) {
  if (asked !== undefined) {
    const port = Number(asked);
    if (!Number.isInteger(port) || port < 1 || port > 65535) throw new Trouble(`${asked} is no port: 1 to 65535.`);
    if (!(await isFree(port, host))) throw new Trouble(`Port ${port} is taken. Choose another with --port.`);
    return port;
  }
  for (let port = usual; port < usual + 100; port += 1) if (await isFree(port, host)) return port;
  throw new Trouble(`Ports ${usual} to ${usual + 99} are all taken. Choose one with --port.`);
}
