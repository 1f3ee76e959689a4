import type { Asker, Ward } from "../http/ward";

/** One answer's status for each person, in one of their own unit's rows. */
type Statuses = Record<Asker, number>;

export interface Named {
  patientId: string;
  unitId: string;
  entryId: string;
  submissionId: string;
}

export interface Line {
  own: Statuses;
  /** The same people at a row of a unit where they do not work; absent where the path and body name no row. */
  foreign?: Statuses;
  nobody: number;
  /** What is sent; `{}` unless said, so that whoever may go on is stopped by the schema (422) and changes nothing. */
  body?: (named: Named) => unknown;
}

/** Why a handler is not walked: it cannot be called outside a running server. */
export interface Unwalked {
  unwalked: string;
}

const each = (therapist: number, intensivist: number, nurse: number, administrator: number): Statuses => ({
  therapist,
  intensivist,
  nurse,
  administrator,
});

const everyone = (status: number) => each(status, status, status, status);
const nobody = 401;

// An administrator belongs to no unit: a patient's row answers like one that does not exist.
const readsPatients: Line = { own: each(200, 200, 200, 404), foreign: everyone(404), nobody };
const allChart: Line = { own: each(422, 422, 422, 404), foreign: everyone(404), nobody };
const settersChart: Line = { own: each(422, 422, 403, 404), foreign: everyone(404), nobody };

const patient = "/api/patients/:patientId";

/** Every method of every handler. One that is missing here fails the walk, and so does a line without its handler. */
export const table: Record<string, Line | Unwalked> = {
  "GET /api/health": { own: everyone(200), nobody: 200 },
  "GET /api/ready": { own: everyone(200), nobody: 200 },
  "GET /api/auth/:nextauth": { unwalked: "next-auth reads the running server's request; the browser tests sign in" },
  "POST /api/auth/:nextauth": { unwalked: "next-auth reads the running server's request; the browser tests sign in" },
  "GET /api/me": { own: everyone(200), nobody },
  "POST /api/session/activity": { own: everyone(200), nobody },
  "POST /api/session/unlock": { own: everyone(422), nobody },

  // The administrator knows the unit by name and may see none of its patients; another hospital's unit is not found.
  "GET /api/units/:unitId/beds": { own: each(200, 200, 200, 403), foreign: each(404, 404, 404, 403), nobody },

  "POST /api/patients": {
    own: each(422, 422, 403, 403),
    foreign: each(404, 404, 403, 403),
    nobody,
    body: ({ unitId }) => ({ unitId }),
  },
  [`GET ${patient}/worksheet`]: readsPatients,
  [`GET ${patient}/entries`]: readsPatients,
  [`POST ${patient}/settings`]: allChart,
  [`POST ${patient}/settings-checks`]: settersChart,
  [`POST ${patient}/mechanics`]: settersChart,
  [`POST ${patient}/observations`]: allChart,
  [`POST ${patient}/heights`]: allChart,
  [`POST ${patient}/bedside-entries`]: allChart,
  [`POST ${patient}/entries/:entryId/corrections`]: allChart,
  [`POST ${patient}/submissions/:submissionId/void`]: allChart,
};

export const namedOf = (ward: Ward, place: "own" | "foreign", entry: { id: string; submissionId: string }): Named => ({
  patientId: place === "own" ? ward.episode.patientId : ward.foreignEpisode.patientId,
  unitId: place === "own" ? ward.unit.id : ward.foreign.id,
  entryId: entry.id,
  submissionId: entry.submissionId,
});
