import { requireFinite } from "./require-finite";

/** One mm[Hg] in pascal as UCUM defines it; NIST's 133.322387 differs by 3 in a million. */
export const pascalPerMmHg = 133.322;

/** A pressure in mmHg from kPa. Source: UCUM, mm[Hg] = 133.322 Pa. @example mmHgFromKpa(8) //=> 60.0051… */
export function mmHgFromKpa(kpa: number): number {
  return (requireFinite("kPa", kpa) * 1000) / pascalPerMmHg;
}
