import { describe, expect, it } from "vitest";
import type { ChartEntry, VentilationEpisode } from "@/db/models";
import { SettingChange } from "@/db/models";
import { buildEntry } from "../factories";
import { call } from "../http/call";
import { signedInAs } from "../http/signed-in";
import { askers, buildWard, type Asker } from "../http/ward";
import { findHandlers, type Handler } from "./handlers";
import { namedOf, table, type Line, type Named } from "./table";

const handlers = await findHandlers();
const ward = await buildWard();

/** FiO2 alone: an entry that every role may correct. */
async function buildFio2Entry({ id: episodeId }: VentilationEpisode): Promise<ChartEntry> {
  const entry = await buildEntry({ episodeId });
  await SettingChange.create({ entryId: entry.id, fio2Percent: 40 });
  return entry;
}

const entries = { own: await buildFio2Entry(ward.episode), foreign: await buildFio2Entry(ward.foreignEpisode) };
const cookies = new Map<Asker, string>();
for (const asker of askers) cookies.set(asker, await signedInAs(ward.people[asker]));

const isWalked = (line: (typeof table)[string] | undefined): line is Line => line !== undefined && "own" in line;

/** What a person without a cookie, or with one, is answered at a row. */
async function statusOf(name: string, handler: Handler, place: "own" | "foreign", cookie?: string): Promise<number> {
  const [method = "", path = ""] = name.split(" ");
  const named: Named = namedOf(ward, place, entries[place]);
  const line = table[name];
  const body = isWalked(line) && line.body ? line.body(named) : {};
  const keys = [...path.matchAll(/:(\w+)/g)].map(([, key]) => key as keyof Named);
  const answer = await call(handler, {
    method: method as "GET",
    path: path.replace(/:(\w+)/g, (_, key: keyof Named) => named[key]),
    params: Object.fromEntries(keys.map((key) => [key, named[key]])),
    ...(cookie && { cookie }),
    ...(method !== "GET" && { body }),
  });
  return answer.status;
}

describe("the rights walk", () => {
  it("finds the handlers in the file system, and at least those of the first slice", () => {
    expect(handlers.size).toBeGreaterThanOrEqual(19);
  });

  it("has a line in the table for every method of every route, and a route for every line", () => {
    expect([...handlers.keys()].sort()).toEqual(Object.keys(table).sort());
  });

  for (const [name, handler] of handlers) {
    const line = table[name];
    if (!isWalked(line)) continue;

    it(`${name} answers each role in its own unit as the table says, and nobody`, async () => {
      for (const asker of askers) {
        expect(await statusOf(name, handler, "own", cookies.get(asker)), asker).toBe(line.own[asker]);
      }
      expect(await statusOf(name, handler, "own"), "nobody").toBe(line.nobody);
    });

    const { foreign } = line;
    if (foreign) {
      it(`${name} answers each role in a foreign unit as the table says`, async () => {
        for (const asker of askers) {
          expect(await statusOf(name, handler, "foreign", cookies.get(asker)), asker).toBe(foreign[asker]);
        }
      });
    }

    it(`${name} has a foreign answer exactly when its address or body names a row`, () => {
      const namesARow = /:patientId|:unitId/.test(name) || line.body !== undefined;
      expect(foreign !== undefined).toBe(namesARow);
    });
  }
});
