import { createHash } from "node:crypto";
import { once } from "node:events";
import { connect, createServer } from "node:net";
import { text } from "node:stream/consumers";

// An abstract socket leaves no file behind and is released by the kernel, even after kill -9.
function address(folder, purpose) {
  const hash = createHash("sha256").update(`${purpose}:${folder}`).digest("hex").slice(0, 40);
  return `\0neaptide-${hash}`;
}

/** Takes the lock, or answers null when another launcher holds it. The holder tells who asks what `describe` says. */
export async function takeLock(folder, purpose, describe = () => "") {
  const server = createServer((socket) => {
    socket.on("error", () => undefined);
    socket.end(describe());
  });
  server.listen(address(folder, purpose));
  try {
    await once(server, "listening");
  } catch (error) {
    if (error.code !== "EADDRINUSE") throw error;
    return null;
  }
  server.unref();
  return { release: () => new Promise((resolve) => server.close(resolve)) };
}

/** What the holder of the lock says of itself; empty when it has just gone. */
export function askHolder(folder, purpose) {
  const socket = connect(address(folder, purpose));
  return text(socket).catch(() => "");
}
