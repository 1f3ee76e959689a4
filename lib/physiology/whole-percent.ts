import { requireCharted } from "./require-charted";

/**
 * FiO2 as the integer percent that every comparison and division here uses: 56 / 0.28 is 199.99999999999997 in binary
 * floats, 56 × 100 / 28 is 200.
 * @param fio2 fraction, 0.21 to 1, in whole percent
 * @throws RangeError outside that, or more than 1e-6 from a whole percent
 */
export function wholePercent(fio2: number): number {
  const exact = requireCharted("fio2", fio2) * 100;
  const percent = Math.round(exact);
  if (Math.abs(exact - percent) > 1e-6) {
    throw new RangeError(`fio2 ${fio2} is not a whole percent: allowed 0.21 to 1 in steps of 0.01`);
  }
  return percent;
}
