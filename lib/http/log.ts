import { pino } from "pino";

/** One JSON line an event on standard output: request id, code and cause, never a name, an MRN or a charted value. */
export const log = pino({ base: null, timestamp: pino.stdTimeFunctions.isoTime });
