import type { Sex } from "@/lib/physiology";

/** 'M' and 'F' of the tables; anything else goes on as it stands, to be refused. */
export function sexOf(value: unknown): Sex {
  if (value === "M") return "male";
  if (value === "F") return "female";
  return value as Sex;
}
