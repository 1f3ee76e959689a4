import { changeKind as k, type Change } from "./change-kinds";

const pressures =
  k.volume |
  k.pressure |
  k.mode |
  k.peep |
  k.position |
  k.neuromuscularBlock |
  k.recruitment |
  k.tube |
  k.event |
  k.ecmo |
  k.shorterExpiration;

const breaths =
  k.volume |
  k.pressure |
  k.peep |
  k.rate |
  k.inspiratoryTime |
  k.mode |
  k.neuromuscularBlock |
  k.position |
  k.tube |
  k.ecmo;

const carbonDioxide =
  k.volume |
  k.pressure |
  k.rate |
  k.inspiratoryTime |
  k.mode |
  k.neuromuscularBlock |
  k.turn |
  k.tube |
  k.ecmo |
  k.ecmoSweep;

const oxygen = k.fio2 | k.peep | k.inspiratoryTime | k.mode | k.position | k.recruitment | k.tube | k.ecmo | k.ecmoFlow;

/** F6: which changes expire which results; F3: which make a gas due. */
const expiryRows = {
  /** Plateau, ΔP, static compliance, total and trapped PEEP. */
  pressures,
  /** Power: any rate too. */
  power: pressures | k.rate,
  /** Peak, resistance, dynamic compliance. */
  flow: pressures | k.flow | k.flowPattern,
  /** Exhaled and spontaneous volumes, minute volume, total rate, mean airway pressure, RSBI. */
  breaths,
  /** PaCO2, pH, ventilatory ratio. */
  carbonDioxide,
  /** PaO2, P/F, S/F, SpO2, indices, gradient. */
  oxygen,
  /** V5: pairs of a minute volume with a gas, and of a mean airway pressure with PaO2 or SpO2. */
  breathsAndCarbonDioxide: breaths | carbonDioxide,
  breathsAndOxygen: breaths | oxygen,
  /** F3 */
  gasAfterTurn: k.turn | k.ecmoOn,
  gasAfterCut: k.ventilationCut,
} as const;

export type ExpiryRow = keyof typeof expiryRows;

/** One ascending array of changes per row. */
export function changesPerRow(changes: readonly Change[]): Record<ExpiryRow, Change[]> {
  const rows = Object.entries(expiryRows) as [ExpiryRow, number][];
  return Object.fromEntries(
    rows.map(([row, kinds]) => [row, changes.filter((change) => (change.kinds & kinds) !== 0)]),
  ) as Record<ExpiryRow, Change[]>;
}
