/** V2, F6: kinds of change as bits, so that one entry's change carries several. */
export const changeKind = {
  volume: 1,
  pressure: 1 << 1,
  rate: 1 << 2,
  inspiratoryTime: 1 << 3,
  /** F6: rate up, inspiratory time longer, flow lower. */
  shorterExpiration: 1 << 4,
  peep: 1 << 5,
  fio2: 1 << 6,
  mode: 1 << 7,
  flow: 1 << 8,
  flowPattern: 1 << 9,
  position: 1 << 10,
  /** A prone or supine turn. */
  turn: 1 << 11,
  neuromuscularBlock: 1 << 12,
  recruitment: 1 << 13,
  tube: 1 << 14,
  event: 1 << 15,
  ecmo: 1 << 16,
  ecmoSweep: 1 << 17,
  ecmoFlow: 1 << 18,
  /** F3: ECMO switched on. */
  ecmoOn: 1 << 19,
  /** F3: a set rate or volume lowered by at least a fifth. */
  ventilationCut: 1 << 20,
} as const;

/** A change (V2) at its moment: what kinds it is of, and which entry made it. */
export interface Change {
  t: number;
  kinds: number;
  entryId: string;
  by: "settings" | "turn" | "therapy" | "event";
}
