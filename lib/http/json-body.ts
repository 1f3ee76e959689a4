import { AppError } from "@/lib/contracts";

/** A bedside entry is under 4 kB; what is larger than this is no entry. */
export const MAX_BODY_BYTES = 256 * 1024;

export function refuseOtherMedia(request: Request): void {
  const type = request.headers.get("content-type")?.split(";")[0]?.trim().toLowerCase();
  if (type !== "application/json")
    throw new AppError("unsupported-media-type", "Send the body as Content-Type: application/json.");
}

function tooLarge(): AppError {
  return new AppError("payload-too-large", `A body has at most ${MAX_BODY_BYTES / 1024} kB.`);
}

/** Counts while reading: Content-Length may be absent or untrue. */
async function readBytes(request: Request): Promise<Uint8Array> {
  if (Number(request.headers.get("content-length") ?? 0) > MAX_BODY_BYTES) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  for await (const chunk of request.body ?? []) {
    bytes += chunk.byteLength;
    if (bytes > MAX_BODY_BYTES) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

/** The body as JSON, not yet checked against anything. */
export async function readJson(request: Request): Promise<unknown> {
  const bytes = await readBytes(request);
  try {
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes));
  } catch (cause) {
    throw new AppError("malformed-request", "The body is not JSON.", { cause });
  }
}
