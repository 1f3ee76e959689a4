/**
 * Inspiratory time (s, to 0.01) that gives I:E of 1 to `expiratoryParts` at a rate (/min).
 * Common practice: one breath lasts 60 / rate, shared in the ratio.
 * @example inspiratoryTimeFromIe({ respiratoryRate: 20, expiratoryParts: 2 }) //=> 1
 */
export function inspiratoryTimeFromIe(input: { respiratoryRate: number; expiratoryParts: number }): number {
  const { respiratoryRate, expiratoryParts } = input;
  return Math.round((60 / respiratoryRate / (1 + expiratoryParts)) * 100) / 100;
}

/** Parts of expiration to one of inspiration. @example expiratoryPartsOf({ respiratoryRate: 20, inspiratoryTimeS: 1 }) //=> 2 */
export function expiratoryPartsOf(input: { respiratoryRate: number; inspiratoryTimeS: number }): number {
  return 60 / input.respiratoryRate / input.inspiratoryTimeS - 1;
}
