import type { SchemaMigration } from "./migration";
import { recordRules } from "./0001-record-rules";
import { unitsAndPeople } from "./0002-units-and-people";
import { episodesAndBedStays } from "./0003-episodes";
import { chart } from "./0004-chart";
import { audit } from "./0005-audit";

/** Every migration, in order. Forward only: one that has run somewhere is never edited. */
export const migrations: readonly SchemaMigration[] = [recordRules, unitsAndPeople, episodesAndBedStays, chart, audit];
