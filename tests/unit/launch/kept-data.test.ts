import { mkdir, mkdtemp, readFile, rm, stat, writeFile } from "node:fs/promises";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { installMatchesLock } from "@/lib/launch/install.mjs";
import { askHolder, takeLock } from "@/lib/launch/lock.mjs";
import { freePort, isFree, reservePort } from "@/lib/launch/ports.mjs";
import { secret } from "@/lib/launch/secrets.mjs";
import { sourceHash } from "@/lib/launch/source-hash.mjs";

let folder: string;

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), "launch-"));
});

afterEach(() => rm(folder, { recursive: true }));

async function put(path: string, content: unknown) {
  const full = join(folder, path);
  await mkdir(join(full, ".."), { recursive: true });
  await writeFile(full, typeof content === "string" ? content : JSON.stringify(content));
}

describe("a secret", () => {
  it("is made once, random, and readable by its owner alone", async () => {
    const first = await secret(folder, "nextauth");
    expect(first).toMatch(/^[0-9a-f]{64}$/);
    expect(await secret(folder, "nextauth")).toBe(first);
    expect(await secret(folder, "other")).not.toBe(first);
    expect((await stat(join(folder, "secrets", "nextauth"))).mode & 0o777).toBe(0o600);
    expect(await readFile(join(folder, "secrets", "nextauth"), "utf8")).toBe(first);
  });
});

describe("the lock of a folder", () => {
  it("has one holder, who tells a second what it is", async () => {
    const held = await takeLock(folder, "data", () => "npm start");
    expect(await takeLock(folder, "data")).toBeNull();
    expect(await askHolder(folder, "data")).toBe("npm start");
    await held?.release();
    const next = await takeLock(folder, "data");
    expect(next).not.toBeNull();
    await next?.release();
  });

  it("leaves other folders free", async () => {
    const held = await takeLock(folder, "data");
    const other = await takeLock(`${folder}/test`, "data");
    expect(other).not.toBeNull();
    await Promise.all([held?.release(), other?.release()]);
  });
});

describe("ports", () => {
  it("a taken port is refused in a sentence that says how to choose another", async () => {
    const server = createServer();
    await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
    const address = server.address();
    const port = typeof address === "object" && address ? address.port : 0;
    await expect(reservePort(port, "PORT")).rejects.toThrow(`Port ${port} is taken by another program.`);
    expect(await isFree(port)).toBe(false);
    await new Promise((resolve) => server.close(resolve));
  });

  it("a reserved port is nobody else's until it is given up", async () => {
    const port = await freePort();
    const release = await reservePort(port, "PORT");
    expect(await isFree(port)).toBe(false);
    await release();
    expect(await isFree(port)).toBe(true);
  });
});

describe("installed packages", () => {
  const tool = { version: "1.0.0", integrity: "sha512-a" };
  const forOtherSystems = { version: "2.0.0", integrity: "sha512-b", optional: true };
  const wanted = { "": {}, "node_modules/tool": tool, "node_modules/other-system": forOtherSystems };

  async function install(packages: Record<string, object>) {
    await put("package-lock.json", { packages: wanted });
    await put("node_modules/.package-lock.json", { packages });
    await put("node_modules/tool/package.json", {});
    return installMatchesLock(folder);
  }

  it("match the lock without what is for other systems only", async () => {
    expect(await install({ "node_modules/tool": tool })).toBe(true);
  });

  it("do not match when a version or the content differs, or one is missing or too many", async () => {
    expect(await install({ "node_modules/tool": { ...tool, version: "1.0.1" } })).toBe(false);
    expect(await install({ "node_modules/tool": { ...tool, integrity: "sha512-c" } })).toBe(false);
    expect(await install({})).toBe(false);
    expect(await install({ "node_modules/tool": tool, "node_modules/stranger": tool })).toBe(false);
  });

  it("do not match when a folder was deleted", async () => {
    await install({ "node_modules/tool": tool });
    await rm(join(folder, "node_modules", "tool"), { recursive: true });
    expect(await installMatchesLock(folder)).toBe(false);
  });

  it("are none on a bare checkout", async () => {
    await put("package-lock.json", { packages: wanted });
    expect(await installMatchesLock(folder)).toBe(false);
  });
});

describe("whether a build is stale", () => {
  beforeEach(async () => {
    await put("app/page.tsx", "one");
    await put("package-lock.json", "{}");
    await put("tests/unit/a.test.ts", "test");
    await put("lib/launch/start.mjs", "launcher");
  });

  it.each(["app/page.tsx", "app/new/page.tsx", "lib/chart/x.ts", "public/icon.svg", "package-lock.json", "proxy.ts"])(
    "a change of %s makes it stale",
    async (path) => {
      const before = await sourceHash(folder);
      await put(path, "two");
      expect(await sourceHash(folder)).not.toBe(before);
    },
  );

  it.each(["tests/unit/a.test.ts", "lib/launch/start.mjs", "README.md", "lib/protocol/HAZARDS.md"])(
    "a change of %s does not",
    async (path) => {
      const before = await sourceHash(folder);
      await put(path, "two");
      expect(await sourceHash(folder)).toBe(before);
    },
  );
});
