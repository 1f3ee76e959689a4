import type { AdmissionBody, HeightBody, MechanicsValues, ObservationsValues, SettingsValues } from "@/lib/contracts";
import type { PersonKey, UnitKey } from "./people";

/** Something that happened at the bedside, so many hours before now. */
export interface StoryEvent {
  hoursAgo: number;
  by: PersonKey;
  settings?: SettingsValues;
  mechanics?: MechanicsValues;
  observations?: ObservationsValues;
  height?: Pick<HeightBody, "method" | "sexForPbw" | "heightCm" | "ulnaCm">;
  /** 'Checked, unchanged'. */
  check?: true;
  /** A name by which a later event voids this one. */
  label?: string;
  voids?: string;
  reason?: string;
}

export interface Story {
  unit: UnitKey;
  bed: string;
  admittedBy: PersonKey;
  admittedHoursAgo: number;
  patient: Pick<AdmissionBody, "mrn" | "name" | "birthDate"> &
    Partial<Pick<AdmissionBody, "reasonForVentilation" | "ardsRiskFactor" | "tubeSizeMm" | "tubeDepthCm">>;
  intubatedHoursAgo: number;
  events: StoryEvent[];
}

/** Hours from hours and minutes. */
export const h = (hours: number, minutes = 0): number => hours + minutes / 60;
