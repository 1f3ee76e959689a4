import { once } from "node:events";
import { createServer } from "node:net";
import { Refusal } from "./refusal.mjs";

async function listen(port) {
  const server = createServer((socket) => socket.destroy());
  server.listen({ host: "127.0.0.1", port });
  await once(server, "listening");
  return server;
}

function release(server) {
  return new Promise((resolve) => server.close(resolve));
}

/**
 * Takes a port of 127.0.0.1 now, so that nobody else has it by the time its server starts.
 * Answers the function that gives it up. Throws Refusal when it is taken.
 */
export async function reservePort(port, name) {
  try {
    const server = await listen(port);
    return () => release(server);
  } catch (error) {
    if (error.code === "EACCES")
      throw new Refusal(`Port ${port} is not open to this user. Set ${name} to another port.`);
    if (error.code !== "EADDRINUSE") throw error;
    throw new Refusal(`Port ${port} is taken by another program. Stop it, or set ${name} to another port.`);
  }
}

/** Whether nothing listens on that port of 127.0.0.1. */
export async function isFree(port) {
  try {
    await release(await listen(port));
    return true;
  } catch {
    return false;
  }
}

/** A port that nothing listens on. */
export async function freePort() {
  const server = await listen(0);
  const { port } = server.address();
  await release(server);
  return port;
}
