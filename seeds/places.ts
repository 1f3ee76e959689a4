import { Bed, Hospital, Unit, UnitPolicy } from "@/db/models";
import { targetsFromSet } from "@/lib/protocol";
import type { Cast, UnitKey } from "./people";

interface Place {
  name: string;
  timeZone: string;
  /** mmHg: sea level, and a town at about 1,500 m. */
  barometricPressureMmHg: number;
  gasUnit: "mmHg" | "kPa";
  beds: string[];
}

const numbered = (count: number, prefix = "") => Array.from({ length: count }, (_, place) => `${prefix}${place + 1}`);

const places: Record<UnitKey, Place> = {
  harbour: {
    name: "Harbour ICU",
    timeZone: "Europe/London",
    barometricPressureMmHg: 760,
    gasUnit: "mmHg",
    beds: numbered(12),
  },
  east: {
    name: "East ICU",
    timeZone: "America/Bogota",
    barometricPressureMmHg: 630,
    gasUnit: "kPa",
    beds: numbered(8, "E"),
  },
};

interface BuiltUnit {
  id: string;
  timeZone: string;
  bedIds: ReadonlyMap<string, string>;
}

export type BuiltUnits = Record<UnitKey, BuiltUnit>;

async function buildUnit(hospital: Hospital, { name, timeZone, beds }: Place): Promise<BuiltUnit> {
  const unit = await Unit.create({ hospitalId: hospital.id, name });
  const made = await Bed.bulkCreate(
    beds.map((label, place) => ({ unitId: unit.id, label, sortOrder: place + 1 })),
    { returning: true },
  );
  return { id: unit.id, timeZone, bedIds: new Map(made.map(({ label, id }) => [label, id])) };
}

export async function buildUnits(hospital: Hospital): Promise<BuiltUnits> {
  return { harbour: await buildUnit(hospital, places.harbour), east: await buildUnit(hospital, places.east) };
}

const setBy = { harbour: "intensivist", east: "eastIntensivist" } as const;

/** Each unit's first policy, older than any of its stories. Gases are as needed until they can be charted. */
export async function setPolicies(units: BuiltUnits, cast: Cast, recordedAt: Date): Promise<void> {
  for (const key of ["harbour", "east"] as const) {
    const { timeZone, barometricPressureMmHg, gasUnit } = places[key];
    const lead = cast[setBy[key]].userId;
    await UnitPolicy.create({
      unitId: units[key].id,
      recordedAt,
      authorId: lead,
      timeZone,
      barometricPressureMmHg,
      gasUnit,
      defaultTargets: { ...targetsFromSet("unit-default"), gasIntervalH: "as-needed" },
      shifts: [
        { name: "Day", startsAt: "07:00" },
        { name: "Night", startsAt: "19:00" },
      ],
      nextStepsEnabledBy: lead,
      nextStepsEnabledAt: recordedAt,
    });
  }
}
