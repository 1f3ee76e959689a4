import { requireFinite } from "./require-finite";

/**
 * Height in cm from feet and inches; 1 in is 2.54 cm exactly (UCUM [in_i]). Feet 0 takes a height wholly in inches.
 * @throws RangeError for a negative part, or 12 inches and more beside feet
 * @example cmFromFeetInches({ feet: 5, inches: 10 }) //=> 177.8
 */
export function cmFromFeetInches({ feet, inches }: { feet: number; inches: number }): number {
  if (requireFinite("feet", feet) < 0) throw new RangeError(`feet ${feet} is below 0`);
  if (requireFinite("inches", inches) < 0) throw new RangeError(`inches ${inches} is below 0`);
  if (feet > 0 && inches >= 12) throw new RangeError(`inches ${inches} beside ${feet} feet: allowed 0 to under 12`);
  return (feet * 12 + inches) * 2.54;
}
