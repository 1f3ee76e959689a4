import { pascalPerMmHg } from "./mm-hg-from-kpa";
import { requireFinite } from "./require-finite";

/** A pressure in kPa from mmHg. Source: UCUM, mm[Hg] = 133.322 Pa. @example kpaFromMmHg(40) //=> 5.33288 */
export function kpaFromMmHg(mmHg: number): number {
  return (requireFinite("mmHg", mmHg) * pascalPerMmHg) / 1000;
}
